import { StyleSheet, View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { colour, line, type ColourRole } from './tokens';
import { webStyle } from './web-style';

/** The line a heading stands on: full width, a tick across each end. */
export function RuledLine({ tone = 'ruleThick' }: { tone?: ColourRole }) {
  const ink = { backgroundColor: colour[tone] };
  return (
    <View style={[styles.rule, ink]} aria-hidden>
      <View style={[styles.tick, styles.left, ink]} />
      <View style={[styles.tick, styles.right, ink]} />
    </View>
  );
}

export interface DimensionLineProps {
  /** Length in px between the extension lines. */
  length: number;
  /** How far the extension lines reach back to the object, in px; 0 leaves them out. */
  reach?: number;
  tone?: ColourRole;
  weight?: number;
}

/** A drawn dimension: line with ticks at both ends, extension lines below. The figure is put above it by the caller. */
export function DimensionLine({
  length,
  reach = 0,
  tone = 'blue',
  weight = line.medium,
}: DimensionLineProps) {
  const t = 5;
  const y = t + weight;
  const ticks = [t, length + t].map((x) => `M${x - t} ${y + t}L${x + t} ${y - t}`).join('');
  const extensions = reach
    ? [t, length + t].map((x) => `M${x} ${y - t}V${y + reach}`).join('')
    : '';
  return (
    <Svg width={length + 2 * t} height={y + Math.max(t + weight, reach)} aria-hidden>
      <Path d={`M${t} ${y}H${length + t}`} stroke={colour[tone]} strokeWidth={weight} fill="none" />
      <Path d={ticks} stroke={colour[tone]} strokeWidth={weight + 0.5} fill="none" />
      {extensions ? (
        <Path d={extensions} stroke={colour[tone]} strokeWidth={line.thin} fill="none" />
      ) : null}
    </Svg>
  );
}

const styles = StyleSheet.create({
  rule: { height: 1, alignSelf: 'stretch' },
  tick: webStyle({
    position: 'absolute',
    top: -5,
    width: 1.5,
    height: 11,
    transform: 'rotate(45deg)',
  }),
  left: { left: 0 },
  right: { right: 0 },
});
