import { useId, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { arrowKeys, spacePresses } from './arrow-keys';
import { RadioShape } from './choice-shapes';
import { FieldError } from './field';
import { PressArea } from './pressable';
import { Text } from './text';
import { colour, line, touch } from './tokens';
import { webStyle } from './web-style';

export interface Choice<V extends string> {
  value: V;
  label: string;
  /** Drawn instead of the label, e.g. with a Figure. */
  children?: ReactNode;
  /** Small words beside a radio. */
  help?: string;
  disabled?: boolean;
}

export interface ChoiceGroupProps<V extends string> {
  /** Visible label and accessible name of the group. */
  label: string;
  hideLabel?: boolean;
  options: readonly Choice<V>[];
  value: V | null;
  onChange: (value: V) => void;
  help?: string;
  error?: string;
  disabled?: boolean;
}

/** One of several, listed. One tab stop; arrows choose, Space chooses the one in focus. */
export function RadioGroup<V extends string>(props: ChoiceGroupProps<V>) {
  return (
    <Group {...props} style={styles.list}>
      {(item, index) => (
        <Radio key={item.value} {...props} item={item} index={index}>
          {(on) => (
            <>
              <View style={styles.ring}>
                <RadioShape on={on} disabled={item.disabled ?? props.disabled} />
              </View>
              <Text
                weight={item.help ? 600 : 400}
                tone={item.disabled || props.disabled ? 'ink3' : 'ink'}
                style={item.help ? styles.name : styles.words}
              >
                {item.children ?? item.label}
              </Text>
              {item.help ? (
                <Text
                  size="small"
                  tone={item.disabled || props.disabled ? 'ink3' : 'ink2'}
                  style={styles.aside}
                >
                  {item.help}
                </Text>
              ) : null}
            </>
          )}
        </Radio>
      )}
    </Group>
  );
}

/** One of two to four, side by side in one frame. Same keys as RadioGroup. */
export function SegmentedControl<V extends string>(props: ChoiceGroupProps<V>) {
  return (
    <Group {...props} style={styles.frame}>
      {(item, index) => (
        <Radio key={item.value} {...props} item={item} index={index} segment>
          {(on) => (
            <Text weight={600} align="center" tone={on ? 'film' : 'ink'}>
              {item.children ?? item.label}
            </Text>
          )}
        </Radio>
      )}
    </Group>
  );
}

interface GroupProps<V extends string> extends Omit<ChoiceGroupProps<V>, 'value' | 'onChange'> {
  style: object;
  children: (item: Choice<V>, index: number) => ReactNode;
}

function Group<V extends string>({
  label,
  hideLabel,
  options,
  help,
  error,
  style,
  children,
}: GroupProps<V>) {
  const id = useId();
  const describedBy = [error && `${id}-error`, help && `${id}-help`].filter(Boolean).join(' ');
  return (
    <View style={styles.group}>
      {hideLabel ? null : (
        <Text size="note" weight={600} aria-hidden>
          {label}
        </Text>
      )}
      <View
        role="radiogroup"
        aria-label={label}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy || undefined}
        style={style}
      >
        {options.map(children)}
      </View>
      {help ? (
        <Text size="small" tone="ink2" nativeID={`${id}-help`}>
          {help}
        </Text>
      ) : null}
      <FieldError id={`${id}-error`} error={error} />
    </View>
  );
}

interface RadioProps<V extends string> extends ChoiceGroupProps<V> {
  item: Choice<V>;
  index: number;
  segment?: boolean;
  children: (on: boolean) => ReactNode;
}

function Radio<V extends string>({
  item,
  index,
  options,
  value,
  onChange,
  disabled,
  segment,
  children,
}: RadioProps<V>) {
  const on = item.value === value;
  const off = item.disabled ?? disabled ?? false;
  const chosen = options.some((o) => o.value === value && !o.disabled);
  const firstOpen = options.findIndex((o) => !o.disabled);
  const choose = () => onChange(item.value);
  return (
    <PressArea
      role="radio"
      label={item.help ? `${item.label}, ${item.help}` : item.label}
      aria-checked={on}
      disabled={off}
      tabIndex={(chosen ? on : index === firstOpen) ? 0 : -1}
      onPress={choose}
      onKeyDown={(event) => {
        spacePresses(event, choose);
        arrowKeys(event, {
          group: 'radiogroup',
          item: 'radio',
          axis: 'both',
          onMove: (element) => onChange(element.dataset.value as V),
        });
      }}
      dataSet={{ value: item.value, focusInside: segment ? 'yes' : undefined }}
      style={(s) =>
        segment
          ? [
              styles.segment,
              index > 0 && styles.divided,
              s.hovered && styles.hovered,
              on && styles.on,
            ]
          : styles.radio
      }
    >
      {children(on)}
    </PressArea>
  );
}

const styles = StyleSheet.create({
  group: { gap: 5, alignSelf: 'stretch' },
  list: { alignSelf: 'stretch' },
  radio: webStyle({
    display: 'flex',
    flexDirection: 'row',
    alignItems: 'center',
    gap: 8,
    minHeight: touch.min,
    cursor: 'pointer',
  }),
  ring: { minWidth: 22 },
  words: { flexShrink: 1 },
  name: { width: 112 },
  aside: { flexShrink: 1, flexGrow: 1 },
  frame: { flexDirection: 'row', borderWidth: line.medium, borderColor: colour.ink },
  segment: webStyle({
    flex: 1,
    display: 'flex',
    alignItems: 'center',
    justifyContent: 'center',
    minHeight: 45,
    paddingLeft: 10,
    paddingRight: 10,
    cursor: 'pointer',
  }),
  divided: { borderLeftWidth: line.thin, borderLeftColor: colour.ink },
  hovered: { backgroundColor: colour.well },
  on: { backgroundColor: colour.ink },
});
