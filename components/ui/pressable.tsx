import { type ReactNode, type Ref } from 'react';
import {
  Pressable as RawPressable,
  type PressableProps,
  type StyleProp,
  type View,
  type ViewStyle,
} from 'react-native';

/** What a pressable looks like now; the gallery forces one with `look`. */
export interface PressLook {
  hovered: boolean;
  pressed: boolean;
}
export type ForcedLook = 'hover' | 'pressed' | 'focus';

export interface PressAreaProps extends Omit<
  PressableProps,
  'children' | 'style' | 'aria-label' | 'accessibilityLabel' | 'role'
> {
  /** Accessible name, always. `labelledByContent` keeps the content as the name and this unused. */
  label: string;
  /** The content is text that already says `label` (and more): let it be the name. */
  labelledByContent?: boolean;
  role: 'button' | 'link' | 'checkbox' | 'radio' | 'switch' | 'tab' | 'menuitem' | 'option';
  look?: ForcedLook;
  children: ReactNode | ((look: PressLook) => ReactNode);
  style?: StyleProp<ViewStyle> | ((look: PressLook) => StyleProp<ViewStyle>);
  ref?: Ref<View>;
}

/** The one pressable under all others; use it for rows and things the other primitives don't draw. */
export function PressArea({
  label,
  labelledByContent,
  look,
  children,
  style,
  dataSet,
  ...rest
}: PressAreaProps) {
  const now = (s: { hovered?: boolean; pressed: boolean }): PressLook => ({
    hovered: look === 'hover' || (s.hovered ?? false),
    pressed: look === 'pressed' || s.pressed,
  });
  return (
    <RawPressable
      {...rest}
      aria-label={labelledByContent ? undefined : label}
      dataSet={look === 'focus' ? { ...dataSet, focus: 'yes' } : dataSet}
      style={typeof style === 'function' ? (s) => style(now(s)) : style}
    >
      {typeof children === 'function' ? (s) => children(now(s)) : children}
    </RawPressable>
  );
}
