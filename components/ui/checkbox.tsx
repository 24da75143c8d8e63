import { useId, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { spacePresses } from './arrow-keys';
import { CheckShape, SwitchShape } from './choice-shapes';
import { FieldError } from './field';
import { PressArea } from './pressable';
import { Text } from './text';
import { touch } from './tokens';
import { webStyle } from './web-style';

export interface CheckboxProps {
  /** Accessible name, and the words beside it unless `children` draw them. */
  label: string;
  /** Words with links in them; the box is still named by `label`. */
  children?: ReactNode;
  /** `mixed`: some of what is below. */
  value: boolean | 'mixed';
  onChange: (value: boolean) => void;
  onBlur?: () => void;
  help?: string;
  error?: string;
  disabled?: boolean;
}

/** A checkbox. Space and Enter turn it over. */
export function Checkbox({ children, ...props }: CheckboxProps) {
  const { value, onChange, disabled } = props;
  return (
    <Toggle
      {...props}
      words={children}
      role="checkbox"
      checked={value}
      toggle={() => onChange(value !== true)}
      shape={<CheckShape state={value} disabled={disabled} />}
    />
  );
}

export interface SwitchProps extends Omit<CheckboxProps, 'value'> {
  value: boolean;
}

/** A switch for what takes effect at once. Space and Enter turn it over. */
export function Switch({ children, ...props }: SwitchProps) {
  const { value, onChange, disabled } = props;
  return (
    <Toggle
      {...props}
      words={children}
      role="switch"
      checked={value}
      toggle={() => onChange(!value)}
      shape={<SwitchShape on={value} disabled={disabled} />}
    />
  );
}

interface ToggleProps extends Pick<
  CheckboxProps,
  'label' | 'help' | 'error' | 'disabled' | 'onBlur'
> {
  role: 'checkbox' | 'switch';
  checked: boolean | 'mixed';
  toggle: () => void;
  shape: ReactNode;
  words: ReactNode;
}

function Toggle({
  label,
  help,
  error,
  disabled,
  onBlur,
  role,
  checked,
  toggle,
  shape,
  words,
}: ToggleProps) {
  const id = useId();
  const describedBy = [error && `${id}-error`, help && `${id}-help`].filter(Boolean).join(' ');
  const text = (
    <Text tone={disabled ? 'ink3' : 'ink'} style={styles.words}>
      {words ?? label}
    </Text>
  );
  return (
    <View style={styles.column}>
      <View style={styles.row}>
        <PressArea
          role={role}
          label={label}
          aria-checked={checked}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy || undefined}
          disabled={disabled}
          onPress={toggle}
          onBlur={onBlur}
          onKeyDown={(event) => spacePresses(event, toggle)}
          style={styles.target}
        >
          <View style={styles.shape}>{shape}</View>
          {/* Links can't stand inside a control, so own words go beside it. */}
          {words === undefined ? text : null}
        </PressArea>
        {words === undefined ? null : text}
      </View>
      {help ? (
        <Text size="small" tone="ink2" nativeID={`${id}-help`} style={styles.under}>
          {help}
        </Text>
      ) : null}
      <FieldError id={`${id}-error`} error={error} />
    </View>
  );
}

const styles = StyleSheet.create({
  column: { gap: 4 },
  row: { flexDirection: 'row', gap: 10 },
  target: webStyle({
    display: 'flex',
    flexDirection: 'row',
    minHeight: touch.min,
    minWidth: 24,
    flexShrink: 1,
    gap: 10,
    cursor: 'pointer',
  }),
  shape: { height: touch.min, justifyContent: 'center', minWidth: 24, alignSelf: 'flex-start' },
  words: { flexShrink: 1, paddingVertical: 11 },
  under: { marginTop: -6 },
});
