import { StyleSheet, View } from 'react-native';
import Svg, { Circle, Path, Rect } from 'react-native-svg';
import { Text, type TextTone } from './text';
import { colour } from './tokens';

/** The five verdicts; their order of seriousness is `verdictOrder` in shared/plan/stick/shapes. */
export type VerdictKind = 'holds' | 'risk' | 'fails' | 'need' | 'close';

const kinds: Record<string, VerdictKind> = {
  holds: 'holds',
  'at-risk': 'risk',
  risk: 'risk',
  fails: 'fails',
  'needs-a-reading': 'need',
  need: 'need',
  'too-close-to-call': 'close',
  'too-close': 'close',
  close: 'close',
};

/** The kind for a verdict as the check sheet and the readings name it (`at-risk`, `needs-a-reading` …). */
export const verdictKind = (name: string): VerdictKind => kinds[name] ?? 'need';

/** Shape, colour and word always go together; the words are the product's. */
export const verdictLook: Record<VerdictKind, { word: string; tone: TextTone }> = {
  holds: { word: 'holds', tone: 'holdsText' },
  risk: { word: 'at risk', tone: 'riskText' },
  fails: { word: 'fails', tone: 'failsText' },
  need: { word: 'needs a reading', tone: 'needText' },
  close: { word: 'too close to call', tone: 'needText' },
};

/** The shape's drawing on a 16 grid, to be put into any Svg. */
export function VerdictDrawing({ kind }: { kind: VerdictKind }) {
  switch (kind) {
    case 'holds':
      return <Circle cx={8} cy={8} r={6.5} fill={colour.holds} />;
    case 'risk':
      return <Path d="M8 1.2 15.3 14H.7Z" fill={colour.risk} />;
    case 'fails':
      return <Rect x={1.8} y={1.8} width={12.4} height={12.4} fill={colour.fails} />;
    case 'need':
      return <Circle cx={8} cy={8} r={5.6} fill="none" stroke={colour.need} strokeWidth={2} />;
    case 'close':
      return (
        <>
          <Circle cx={8} cy={8} r={5.6} fill="none" stroke={colour.need} strokeWidth={2} />
          <Path d="M8 2.4A5.6 5.6 0 0 0 8 13.6Z" fill={colour.need} />
        </>
      );
  }
}

/**
 * The shape of a verdict alone: disc, triangle, square, ring, half-filled ring. Give `label` when
 * the word does not stand beside it.
 */
export function VerdictShape({
  kind,
  size = 16,
  label,
}: {
  kind: VerdictKind;
  size?: number;
  label?: string;
}) {
  const named = label ? { role: 'img' as const, 'aria-label': label } : { 'aria-hidden': true };
  return (
    <View {...named}>
      <Svg width={size} height={size} viewBox="0 0 16 16">
        <VerdictDrawing kind={kind} />
      </Svg>
    </View>
  );
}

export interface VerdictProps {
  kind: VerdictKind;
  size?: 'small' | 'note';
  /** Instead of the usual word, e.g. `14 hold`. */
  word?: string;
}

/** A verdict: shape and word, in the verdict's own ink. */
export function Verdict({ kind, size = 'note', word }: VerdictProps) {
  const look = verdictLook[kind];
  return (
    <View style={styles.row}>
      <VerdictShape kind={kind} size={size === 'small' ? 12 : 16} />
      <Text size={size} weight={600} tone={look.tone}>
        {word ?? look.word}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: 6 },
});
