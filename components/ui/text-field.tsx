import { useState, type ReactNode, type Ref } from 'react';
import { StyleSheet, TextInput, View, type TextInputProps, type TextStyle } from 'react-native';
import { controlStyles, Field, type FieldCommon } from './field';
import { Icon } from './icon';
import { PressArea } from './pressable';
import { Text, textStyle } from './text';
import { colour } from './tokens';
import { webStyle } from './web-style';

type InputPass = Pick<
  TextInputProps,
  | 'placeholder'
  | 'autoComplete'
  | 'autoCapitalize'
  | 'autoCorrect'
  | 'autoFocus'
  | 'spellCheck'
  | 'inputMode'
  | 'maxLength'
  | 'onKeyPress'
  | 'onSelectionChange'
  | 'selection'
  | 'testID'
>;

/** Named as react-hook-form's `field`, so `<TextField {...field} label="…" />` works. */
export interface TextFieldProps extends FieldCommon, InputPass {
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  onFocus?: () => void;
  /** Enter; without it Enter sends the Form around. */
  onEnter?: () => void;
  type?: 'text' | 'email' | 'url' | 'search';
  /** Symbols, expressions, codes. */
  mono?: boolean;
  readOnly?: boolean;
  small?: boolean;
  /** Inside the frame at the left, e.g. an Icon. */
  before?: ReactNode;
  /** Inside the frame at the right: a unit, a button. */
  after?: ReactNode;
  name?: string;
  ref?: Ref<TextInput>;
}

const inputModes = { text: 'text', email: 'email', url: 'url', search: 'search' } as const;

/** One line of text. */
export function TextField({ ref, ...props }: TextFieldProps) {
  return (
    <Field {...props}>
      {(links) => (
        <ControlFrame {...props} invalid={links.invalid}>
          <TextInput
            {...inputProps(props)}
            ref={ref}
            id={links.inputId}
            inputMode={props.inputMode ?? inputModes[props.type ?? 'text']}
            aria-describedby={links.describedBy}
            aria-invalid={links.invalid}
            onSubmitEditing={props.onEnter}
            style={inputStyle(props)}
          />
        </ControlFrame>
      )}
    </Field>
  );
}

export interface TextAreaProps extends Omit<TextFieldProps, 'type' | 'before' | 'after'> {
  /** Lines shown at least; default 4. */
  lines?: number;
  /** Longest text; with it a counter shows what is left from nine tenths on. */
  limit?: number;
}

/** Several lines, with a counter once the end is near. */
export function TextArea({ ref, ...props }: TextAreaProps) {
  const { lines = 4, limit, value } = props;
  const left = limit === undefined ? Infinity : limit - value.length;
  const near = limit !== undefined && value.length >= limit * 0.9;
  const over =
    left < 0 ? `${-left} too many. Shorten the text to ${limit ?? 0} characters.` : undefined;
  const counter = near ? (
    <Text size="small" tone="ink2" aria-live="polite">
      {left < 0 ? `${-left} too many` : `${left} left`}
    </Text>
  ) : undefined;
  return (
    <Field {...props} error={props.error ?? over} aside={counter}>
      {(links) => (
        <ControlFrame {...props} invalid={links.invalid}>
          <TextInput
            {...inputProps(props)}
            ref={ref}
            id={links.inputId}
            multiline
            rows={lines}
            aria-describedby={links.describedBy}
            aria-invalid={links.invalid}
            style={[inputStyle(props), styles.area]}
          />
        </ControlFrame>
      )}
    </Field>
  );
}

/** A password with Show; the password manager's hint is `current-password` unless said otherwise. */
export function PasswordField({ ref, ...props }: Omit<TextFieldProps, 'type' | 'after'>) {
  const [shown, setShown] = useState(false);
  return (
    <Field {...props}>
      {(links) => (
        <ControlFrame
          {...props}
          invalid={links.invalid}
          after={
            <PressArea
              role="button"
              label={shown ? 'Hide password' : 'Show password'}
              onPress={() => setShown(!shown)}
              style={styles.show}
            >
              <Text size="note" tone="blue" style={styles.showWord}>
                {shown ? 'Hide' : 'Show'}
              </Text>
            </PressArea>
          }
        >
          <TextInput
            {...inputProps(props)}
            ref={ref}
            id={links.inputId}
            secureTextEntry={!shown}
            autoComplete={props.autoComplete ?? 'current-password'}
            autoCapitalize="none"
            spellCheck={false}
            aria-describedby={links.describedBy}
            aria-invalid={links.invalid}
            style={inputStyle(props)}
          />
        </ControlFrame>
      )}
    </Field>
  );
}

export interface NumberFigureFieldProps extends Omit<TextFieldProps, 'type' | 'after' | 'mono'> {
  /** Unit shown at the right end, e.g. `mm`; read out with the label. */
  unit?: string;
}

/** A figure typed in Mono: `2 3/4`, `18.2`. Taking it apart is the measure engine's. */
export function NumberFigureField({ unit, ...props }: NumberFigureFieldProps) {
  const after = unit ? (
    <Text size="note" tone="ink2" style={styles.unit}>
      {unit}
    </Text>
  ) : undefined;
  return (
    <TextField
      {...props}
      mono
      after={after}
      autoCapitalize="none"
      spellCheck={false}
      autoCorrect={false}
    />
  );
}

interface FrameProps extends Pick<
  TextFieldProps,
  'before' | 'after' | 'readOnly' | 'small' | 'disabled'
> {
  invalid?: boolean;
  children: ReactNode;
}

function ControlFrame({ before, after, readOnly, small, disabled, invalid, children }: FrameProps) {
  return (
    <View
      dataSet={{ control: 'yes' }}
      style={[
        controlStyles.frame,
        small && controlStyles.small,
        invalid && controlStyles.marked,
        disabled && controlStyles.disabled,
      ]}
    >
      {before ? <View style={styles.before}>{before}</View> : null}
      {children}
      {after}
      {readOnly ? (
        <View style={styles.lock}>
          <Icon name="lock" size={18} />
        </View>
      ) : null}
    </View>
  );
}

/** What every input gets alike. */
function inputProps(p: TextFieldProps | TextAreaProps): TextInputProps {
  const {
    placeholder,
    autoComplete,
    autoCapitalize,
    autoCorrect,
    autoFocus,
    spellCheck,
    maxLength,
  } = p;
  const { onKeyPress, onSelectionChange, selection, testID, value, onChange, onBlur, onFocus } = p;
  return {
    ...{ placeholder, autoComplete, autoCapitalize, autoCorrect, autoFocus, spellCheck, maxLength },
    ...{ onKeyPress, onSelectionChange, selection, testID, value, onBlur, onFocus },
    onChangeText: onChange,
    readOnly: p.readOnly,
    editable: p.readOnly || p.disabled ? false : undefined,
    placeholderTextColor: colour.ink3,
  };
}

function inputStyle(p: { mono?: boolean; disabled?: boolean }): TextStyle[] {
  return [
    textStyle({ size: 'body', mono: p.mono, tone: p.disabled ? 'ink3' : 'ink' }),
    styles.input,
  ];
}

const styles = StyleSheet.create({
  input: webStyle({
    flex: 1,
    alignSelf: 'stretch',
    minWidth: 0,
    paddingTop: 10,
    paddingBottom: 10,
    paddingLeft: 12,
    paddingRight: 12,
    borderWidth: 0,
    fontVariantNumeric: 'tabular-nums',
  }),
  area: webStyle({ resize: 'vertical' }),
  before: { paddingLeft: 12 },
  lock: { paddingRight: 12 },
  unit: { paddingRight: 12 },
  show: webStyle({
    minHeight: 44,
    minWidth: 64,
    alignItems: 'center',
    justifyContent: 'center',
    cursor: 'pointer',
  }),
  showWord: webStyle({ textDecorationLine: 'underline', textUnderlineOffset: 3 }),
});
