import { type CSSProperties } from 'react';
import { StyleSheet, View } from 'react-native';
import { controlStyles, Field, type FieldCommon } from './field';
import { Icon } from './icon';
import { colour, font, typeScale } from './tokens';
import { webStyle } from './web-style';

export interface SelectOption<V extends string> {
  value: V;
  label: string;
  disabled?: boolean;
}

export interface SelectProps<V extends string> extends FieldCommon {
  options: readonly SelectOption<V>[];
  value: V | '';
  onChange: (value: V) => void;
  onBlur?: () => void;
  /** First line while nothing is chosen, e.g. `Choose a rule`. */
  placeholder?: string;
  small?: boolean;
}

/** One of many: the browser's own list, in our frame. */
export function Select<V extends string>(props: SelectProps<V>) {
  const { options, value, onChange, placeholder, disabled, small } = props;
  return (
    <Field {...props}>
      {(links) => (
        <View
          dataSet={{ control: 'yes' }}
          style={[
            controlStyles.frame,
            small && controlStyles.small,
            links.invalid && controlStyles.marked,
            disabled && controlStyles.disabled,
          ]}
        >
          <select
            id={links.inputId}
            value={value}
            disabled={disabled}
            aria-describedby={links.describedBy}
            aria-invalid={links.invalid}
            onChange={(event) => onChange(event.currentTarget.value as V)}
            onBlur={props.onBlur}
            style={{ ...look, color: disabled ? colour.ink3 : colour.ink }}
          >
            {value === '' || placeholder ? (
              <option value="" disabled={value !== ''}>
                {placeholder ?? ''}
              </option>
            ) : null}
            {options.map((o) => (
              <option key={o.value} value={o.value} disabled={o.disabled}>
                {o.label}
              </option>
            ))}
          </select>
          <View style={styles.arrow}>
            <Icon name="down" size={20} tone={disabled ? 'ink3' : 'ink'} />
          </View>
        </View>
      )}
    </Field>
  );
}

const look: CSSProperties = {
  appearance: 'none',
  flex: 1,
  alignSelf: 'stretch',
  minWidth: 0,
  border: 0,
  margin: 0,
  padding: '0 40px 0 12px',
  background: 'transparent',
  fontFamily: font.text,
  fontSize: typeScale.body.size,
  lineHeight: `${typeScale.body.line}px`,
  textOverflow: 'ellipsis',
  cursor: 'pointer',
};

const styles = StyleSheet.create({
  arrow: webStyle({ position: 'absolute', right: 12, pointerEvents: 'none' }),
});
