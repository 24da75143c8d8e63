import { useId, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Text } from './text';
import { VerdictShape } from './verdict';
import { colour, line, radius, touch } from './tokens';
import { webStyle } from './web-style';

/** What every field takes. */
export interface FieldCommon {
  /** Visible label and accessible name. */
  label: string;
  help?: ReactNode;
  /** What is wrong and what to do; marks the field and is read out with it. */
  error?: string;
  /** Says `optional` beside the label. */
  optional?: boolean;
  disabled?: boolean;
  /** Label for screen readers only: in tables and toolbars. */
  hideLabel?: boolean;
}

/** The ids and states a control needs to belong to its label, help and error. */
export interface FieldLinks {
  inputId: string;
  labelId: string;
  describedBy: string | undefined;
  invalid: true | undefined;
}

interface FieldProps extends FieldCommon {
  /** Right end of the label's line, e.g. a counter. */
  aside?: ReactNode;
  children: (links: FieldLinks) => ReactNode;
}

/** Label above, control, help or error below. Bring your own control and give it the links. */
export function Field({ label, help, error, optional, hideLabel, aside, children }: FieldProps) {
  const id = useId();
  const links: FieldLinks = {
    inputId: `${id}-input`,
    labelId: `${id}-label`,
    describedBy:
      [error && `${id}-error`, help && `${id}-help`].filter(Boolean).join(' ') || undefined,
    invalid: error ? true : undefined,
  };
  return (
    <View style={styles.field}>
      <View style={[styles.labelRow, hideLabel && styles.hidden]}>
        <label htmlFor={links.inputId} id={links.labelId} style={labelReset}>
          <Text size="note" weight={600}>
            {label}
            {optional ? (
              <Text weight={400} tone="ink2">
                {' '}
                (optional)
              </Text>
            ) : null}
          </Text>
        </label>
        {aside}
      </View>
      {children(links)}
      {help ? (
        <Text size="small" tone="ink2" nativeID={`${id}-help`}>
          {help}
        </Text>
      ) : null}
      <FieldError id={`${id}-error`} error={error} />
    </View>
  );
}

/** The red square and the sentence. */
export function FieldError({ id, error }: { id: string; error?: string }) {
  if (!error) return null;
  return (
    <View style={styles.error}>
      <View style={styles.square}>
        <VerdictShape kind="fails" size={12} />
      </View>
      <Text size="note" tone="failsText" nativeID={id} style={styles.errorText}>
        {error}
      </Text>
    </View>
  );
}

const labelReset = { display: 'block' } as const;

const styles = StyleSheet.create({
  field: { gap: 5, alignSelf: 'stretch' },
  labelRow: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'baseline',
    gap: 12,
  },
  hidden: webStyle({
    position: 'absolute',
    width: 1,
    height: 1,
    overflow: 'hidden',
    clipPath: 'inset(50%)',
  }),
  error: { flexDirection: 'row', gap: 7 },
  square: { paddingTop: 5 },
  errorText: { flexShrink: 1 },
});

/** The frame of a control: at rest, marked (red with its thick edge), read only. */
export const controlStyles = StyleSheet.create({
  frame: webStyle({
    display: 'flex',
    flexDirection: 'row',
    alignItems: 'center',
    minHeight: touch.min,
    borderWidth: line.thin,
    borderStyle: 'solid',
    borderColor: colour.rule,
    borderRadius: radius.control,
    backgroundColor: colour.sheet,
  }),
  marked: webStyle({ borderColor: colour.fails, boxShadow: `inset 3px 0 0 ${colour.fails}` }),
  small: { minHeight: touch.mouseSmall },
  disabled: { borderStyle: 'dashed', borderColor: colour.ruleThin, backgroundColor: 'transparent' },
});
