import { createContext, useContext, type ReactNode, type Ref } from 'react';
import {
  StyleSheet,
  Text as RawText,
  type StyleProp,
  type TextProps,
  type TextStyle,
} from 'react-native';
import { colour, font, typeScale, type TypeSize } from './tokens';

export type TextTone = 'ink' | 'ink2' | 'ink3' | 'blue' | 'onBlue' | 'film' | VerdictTone;
type VerdictTone = 'holdsText' | 'riskText' | 'failsText' | 'needText';
export type TextWeight = 400 | 600 | 700;

export interface TextStyleProps {
  size?: TypeSize;
  tone?: TextTone;
  weight?: TextWeight;
  /** Set in the figures' face: figures, symbols, codes, times. */
  mono?: boolean;
  italic?: boolean;
  align?: 'left' | 'right' | 'center';
}

/** The style of a text variant; what is left out is inherited. */
export function textStyle(p: TextStyleProps): TextStyle {
  const scale = p.size ? typeScale[p.size] : undefined;
  return {
    fontFamily: p.mono ? font.figures : font.text,
    ...(scale && {
      fontSize: scale.size,
      lineHeight: scale.line,
      letterSpacing: scale.tight * scale.size,
    }),
    ...(p.tone && { color: colour[p.tone] }),
    ...(p.weight && { fontWeight: p.weight }),
    ...(p.italic && { fontStyle: 'italic' }),
    ...(p.align && { textAlign: p.align }),
  };
}

export interface TextBlockProps
  extends
    TextStyleProps,
    Pick<
      TextProps,
      'numberOfLines' | 'role' | 'nativeID' | 'lang' | 'dataSet' | 'tabIndex' | 'testID'
    > {
  children?: ReactNode;
  style?: StyleProp<TextStyle>;
  'aria-live'?: 'polite' | 'assertive' | 'off';
  'aria-hidden'?: boolean;
  'aria-level'?: number;
  'aria-label'?: string;
  ref?: Ref<RawText>;
}

const InsideText = createContext(false);

/** True inside a Text: what stands there takes over size, tone and face unless it names its own. */
export const useInsideText = () => useContext(InsideText);

/** Text. On its own it is body size in ink; inside another Text it changes only what is named. */
export function Text({
  size,
  tone,
  weight,
  mono,
  italic,
  align,
  style,
  children,
  ...rest
}: TextBlockProps) {
  const inside = useInsideText();
  const own = inside
    ? textStyle({ size, tone, weight, mono, italic, align })
    : textStyle({
        size: size ?? 'body',
        tone: tone ?? 'ink',
        weight: weight ?? 400,
        mono,
        italic,
        align,
      });
  const family = inside && mono === undefined ? styles.inherit : undefined;
  return (
    <RawText {...rest} style={[styles.base, own, family, style]}>
      {inside ? children : <InsideText value={true}>{children}</InsideText>}
    </RawText>
  );
}

const styles = StyleSheet.create({
  base: { fontVariant: ['tabular-nums'] },
  inherit: { fontFamily: 'inherit' },
});
