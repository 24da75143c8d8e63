import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { G, Line, Path, Text as SvgText } from 'react-native-svg';
import { colour, font, line } from '../ui/tokens';

/** The sheet of every drawing: 320 × 190, as wide as the column up to 480. What it shows is said beside it in words. */
export const sheet = { width: 320, height: 190 } as const;

export function Sheet({ children }: { children: ReactNode }) {
  return (
    <View style={styles.sheet} aria-hidden>
      <Svg width="100%" height="100%" viewBox={`0 0 ${sheet.width} ${sheet.height}`}>
        {children}
      </Svg>
    </View>
  );
}

type Anchor = 'start' | 'middle' | 'end';

/** Small words in a drawing. */
export function Label({
  x,
  y,
  children,
  anchor = 'middle',
  blue,
}: {
  x: number;
  y: number;
  children: string;
  anchor?: Anchor;
  blue?: boolean;
}) {
  return (
    <SvgText
      x={x}
      y={y}
      fontFamily={font.text}
      fontSize={12}
      fontWeight={blue ? '600' : '400'}
      fill={blue ? colour.blue : colour.ink}
      textAnchor={anchor}
    >
      {children}
    </SvgText>
  );
}

export interface DimProps {
  x1: number;
  y1: number;
  x2: number;
  y2: number;
  text: string;
  /** Where the words stand beside the line: above it, or to its right. */
  side?: 'above' | 'right' | 'left' | 'below';
}

/** A dimension line with its ticks and its figure. */
export function Dim({ x1, y1, x2, y2, text, side = 'above' }: DimProps) {
  const tick = (x: number, y: number) => `M${x - 4} ${y + 4}L${x + 4} ${y - 4}`;
  const [mx, my] = [(x1 + x2) / 2, (y1 + y2) / 2];
  const place: Record<NonNullable<DimProps['side']>, [number, number, Anchor]> = {
    above: [mx, my - 6, 'middle'],
    below: [mx, my + 16, 'middle'],
    right: [mx + 7, my + 4, 'start'],
    left: [mx - 7, my + 4, 'end'],
  };
  const [x, y, anchor] = place[side];
  return (
    <G>
      <Line x1={x1} y1={y1} x2={x2} y2={y2} stroke={colour.blue} strokeWidth={line.medium} />
      <Path d={tick(x1, y1) + tick(x2, y2)} stroke={colour.blue} strokeWidth={2} />
      <Label x={x} y={y} anchor={anchor} blue>
        {text}
      </Label>
    </G>
  );
}

const styles = StyleSheet.create({
  sheet: { width: '100%', maxWidth: 480, aspectRatio: sheet.width / sheet.height },
});
