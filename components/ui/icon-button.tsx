import { type Ref } from 'react';
import { StyleSheet, type View } from 'react-native';
import { Icon, type IconName } from './icon';
import { PressArea, type ForcedLook } from './pressable';
import { colour, line, radius, touch } from './tokens';
import { webStyle } from './web-style';

export interface IconButtonProps {
  icon: IconName;
  /** Accessible name; at the bench write it beside as well. */
  label: string;
  onPress?: () => void;
  /** `bare` has no frame: bars and rows. */
  kind?: 'plain' | 'bare';
  size?: 'touch' | 'small' | 'bench';
  disabled?: boolean;
  pressed?: boolean;
  expanded?: boolean;
  controls?: string;
  hasPopup?: 'menu' | 'dialog';
  look?: ForcedLook;
  ref?: Ref<View>;
}

const sides = { touch: touch.min, small: touch.mouseSmall, bench: touch.bench } as const;

/** A square button with an icon. */
export function IconButton({ ref, ...props }: IconButtonProps) {
  const { icon, label, kind = 'plain', size = 'touch', disabled, pressed } = props;
  const side = sides[size];
  return (
    <PressArea
      ref={ref}
      role="button"
      label={label}
      onPress={props.onPress}
      disabled={disabled}
      aria-pressed={pressed}
      aria-expanded={props.expanded}
      aria-controls={props.controls}
      aria-haspopup={props.hasPopup}
      look={props.look}
      dataSet={size === 'small' ? { small: 'square' } : undefined}
      style={(s) => [
        styles.box,
        { minWidth: side, minHeight: side },
        kind === 'plain' && styles.framed,
        disabled && styles.disabled,
        s.hovered && !disabled && { backgroundColor: colour.well },
        (s.pressed || pressed) && !disabled && { backgroundColor: colour.ink },
      ]}
    >
      {(s) => (
        <Icon
          name={icon}
          size={size === 'small' ? 20 : 24}
          tone={disabled ? 'ink3' : s.pressed || pressed ? 'film' : 'ink'}
          weight={size === 'bench' ? 2 : line.medium}
        />
      )}
    </PressArea>
  );
}

const styles = StyleSheet.create({
  box: webStyle({
    display: 'flex',
    alignItems: 'center',
    justifyContent: 'center',
    width: 'fit-content',
    borderRadius: radius.control,
    cursor: 'pointer',
  }),
  framed: { borderWidth: line.medium, borderColor: colour.ink },
  disabled: { borderColor: colour.ruleThin, borderStyle: 'dashed' },
});
