import { type ReactNode, type Ref } from 'react';
import { StyleSheet, View, type ViewStyle } from 'react-native';
import { useFormSubmit } from './form';
import { Icon, type IconName } from './icon';
import { Text } from './text';
import { PressArea, type ForcedLook, type PressLook } from './pressable';
import { colour, line, radius, touch, type ColourRole, type TypeSize } from './tokens';
import { webStyle } from './web-style';

export type ButtonKind = 'primary' | 'plain' | 'quiet' | 'danger';
/** 48 · 36 with a mouse (48 by touch) · 56 · 64. */
export type ButtonSize = 'touch' | 'small' | 'bench' | 'benchPrimary';

interface Face {
  ground: ColourRole | 'none';
  edge: ColourRole | 'none';
  ink: ColourRole;
}

/** How each kind looks at rest, hovered and pressed. */
const faces: Record<ButtonKind, Record<'rest' | 'hover' | 'pressed', Face>> = {
  primary: {
    rest: { ground: 'blue', edge: 'blue', ink: 'onBlue' },
    hover: { ground: 'bluePressed', edge: 'bluePressed', ink: 'onBlue' },
    pressed: { ground: 'bluePressed', edge: 'bluePressed', ink: 'onBlue' },
  },
  plain: {
    rest: { ground: 'none', edge: 'ink', ink: 'ink' },
    hover: { ground: 'well', edge: 'ink', ink: 'ink' },
    pressed: { ground: 'ink', edge: 'ink', ink: 'film' },
  },
  quiet: {
    rest: { ground: 'none', edge: 'none', ink: 'ink' },
    hover: { ground: 'well', edge: 'none', ink: 'ink' },
    pressed: { ground: 'well', edge: 'none', ink: 'ink' },
  },
  danger: {
    rest: { ground: 'none', edge: 'fails', ink: 'failsText' },
    hover: { ground: 'failsWash', edge: 'fails', ink: 'failsText' },
    pressed: { ground: 'failsText', edge: 'failsText', ink: 'film' },
  },
};
const disabledFace: Face = { ground: 'none', edge: 'ruleThin', ink: 'ink3' };

const sizes: Record<ButtonSize, { height: number; pad: number; text: TypeSize; icon: number }> = {
  small: { height: touch.mouseSmall, pad: 12, text: 'note', icon: 20 },
  touch: { height: touch.min, pad: 18, text: 'body', icon: 24 },
  bench: { height: touch.bench, pad: 18, text: 'lead', icon: 26 },
  benchPrimary: { height: touch.benchPrimary, pad: 20, text: 'lead', icon: 28 },
};

export interface ButtonProps {
  /** The words on it and its accessible name. */
  label: string;
  /** Drawn instead of `label`, e.g. with a Figure in it; the name stays `label`. */
  children?: ReactNode;
  onPress?: () => void;
  /** Sends the Form it stands in, as Enter does. */
  submit?: boolean;
  kind?: ButtonKind;
  size?: ButtonSize;
  icon?: IconName;
  iconAfter?: IconName;
  /** A shape or the like before the words. */
  before?: ReactNode;
  /** Working: true, or how far from 0 to 1. The press is ignored meanwhile. */
  busy?: boolean | number;
  /** Words while it works, e.g. `Sending`. */
  busyLabel?: string;
  disabled?: boolean;
  /** Takes the width it is given. */
  wide?: boolean;
  /** For a button that opens or holds something. */
  expanded?: boolean;
  pressed?: boolean;
  controls?: string;
  describedBy?: string;
  look?: ForcedLook;
  testID?: string;
  ref?: Ref<View>;
}

/** A button: primary once on a screen, plain, quiet (underlined words) or danger. */
export function Button({ ref, ...props }: ButtonProps) {
  const { kind = 'plain', size = 'touch', label, disabled = false, busy = false, look } = props;
  const working = busy !== false;
  const submit = useFormSubmit();
  const press = () => {
    if (working) return;
    if (props.submit) submit();
    props.onPress?.();
  };
  return (
    <PressArea
      ref={ref}
      role="button"
      label={label}
      labelledByContent={props.children === undefined && !working}
      onPress={press}
      disabled={disabled}
      aria-busy={working || undefined}
      aria-expanded={props.expanded}
      aria-pressed={props.pressed}
      aria-controls={props.controls}
      aria-describedby={props.describedBy}
      look={look}
      testID={props.testID}
      dataSet={size === 'small' ? { small: 'yes' } : undefined}
      style={(state) => boxStyle(props, state)}
    >
      {(state) => <ButtonContent {...props} kind={kind} size={size} state={state} />}
    </PressArea>
  );
}

/** The face for a state, from the table. */
function faceOf({ kind = 'plain', disabled, pressed }: ButtonProps, state: PressLook): Face {
  if (disabled) return disabledFace;
  const look = state.pressed || pressed ? 'pressed' : state.hovered ? 'hover' : 'rest';
  return faces[kind][look];
}

function boxStyle(props: ButtonProps, state: PressLook): ViewStyle[] {
  const { kind = 'plain', size = 'touch', disabled, wide } = props;
  const face = faceOf(props, state);
  const { height, pad } = sizes[size];
  return [
    styles.box,
    {
      minHeight: height,
      paddingHorizontal: kind === 'quiet' ? 8 : pad,
      backgroundColor: face.ground === 'none' ? 'transparent' : colour[face.ground],
      borderColor: face.edge === 'none' ? 'transparent' : colour[face.edge],
      borderStyle: disabled ? 'dashed' : 'solid',
    },
    wide ? styles.wide : styles.own,
    disabled ? webStyle({ cursor: 'not-allowed' }) : {},
  ];
}

type ContentProps = ButtonProps & { kind: ButtonKind; size: ButtonSize; state: PressLook };

function ButtonContent(props: ContentProps) {
  const { size, kind, icon, iconAfter, before, busy = false, label, busyLabel, children } = props;
  const face = faceOf(props, props.state);
  const { text, icon: side } = sizes[size];
  const weight = size === 'bench' || size === 'benchPrimary' ? line.thick : line.medium;
  const ink = { color: colour[face.ink] };
  return (
    <>
      {busy !== false ? <BusyBar done={busy === true ? undefined : busy} tone={face.ink} /> : null}
      {busy === false && icon ? (
        <Icon name={icon} size={side} tone={face.ink} weight={weight} />
      ) : null}
      {busy === false ? before : null}
      <Text size={text} weight={600} style={[styles.words, ink, kind === 'quiet' && styles.quiet]}>
        {busy !== false ? (busyLabel ?? label) : (children ?? label)}
      </Text>
      {iconAfter ? <Icon name={iconAfter} size={side} tone={face.ink} weight={weight} /> : null}
    </>
  );
}

/** A measured bar: how far, or a still part-filled bar while nobody knows. */
function BusyBar({ done = 0.42, tone }: { done?: number; tone: ColourRole }) {
  const ink = colour[tone];
  return (
    <View style={[styles.bar, { borderColor: ink }]} aria-hidden>
      <View style={{ width: `${Math.round(done * 100)}%`, height: 8, backgroundColor: ink }} />
    </View>
  );
}

const styles = StyleSheet.create({
  box: webStyle({
    display: 'flex',
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 8,
    borderWidth: line.medium,
    borderRadius: radius.control,
    paddingTop: 4,
    paddingBottom: 4,
    cursor: 'pointer',
    userSelect: 'none',
  }),
  own: webStyle({ width: 'fit-content', maxWidth: '100%' }),
  wide: { alignSelf: 'stretch' },
  words: { textAlign: 'center', flexShrink: 1 },
  quiet: webStyle({
    textDecorationLine: 'underline',
    textUnderlineOffset: 4,
    textDecorationThickness: 1,
  }),
  bar: { width: 64, height: 12, borderWidth: line.medium, padding: 0.5 },
});
