import { StyleSheet, View } from 'react-native';
import Svg, { Circle, G, Line, Path, Rect } from 'react-native-svg';
import { type Part } from '../../shared/plan/document';
import { Figure } from '../ui/figure';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { type PlanValues } from './plan-model';

const width = 300;
const tallest = 180;
const margin = 26;

interface Drawn {
  kind: 'hole' | 'strip' | 'patch';
  x: number;
  y: number;
  w: number;
  h: number;
  key: string;
}

/** The features of a part on its face, in drawing units; what cannot be worked out is left out. */
function drawnFeatures(
  part: Part,
  values: PlanValues,
  scale: number,
  length: number,
  breadth: number,
): Drawn[] {
  const mm = (text: string, otherwise: number) =>
    text.trim() === '' ? otherwise : (values.model.evaluate(text).value?.x ?? null);
  return part.features.flatMap((feature): Drawn[] => {
    const x = mm(feature.x, 0);
    const y = mm(feature.y, 0);
    const w = mm(feature.width, 0);
    const run = mm(feature.length, feature.along === 'length' ? length : breadth);
    if (x === null || y === null || w === null || run === null) return [];
    if (feature.kind === 'hole')
      return [
        { kind: 'hole', x: x * scale, y: y * scale, w: w * scale, h: w * scale, key: feature.id },
      ];
    const along = feature.along === 'length';
    return [
      {
        kind: feature.kind === 'notch' || feature.kind === 'slot' ? 'patch' : 'strip',
        x: x * scale,
        y: y * scale,
        w: (along ? Math.min(run, length - x) : w) * scale,
        h: (along ? w : Math.min(run, breadth - y)) * scale,
        key: feature.id,
      },
    ];
  });
}

/** A dimension line with its ticks; the figure stands beside the drawing, as text. */
function DimLine({ x1, y1, x2, y2 }: { x1: number; y1: number; x2: number; y2: number }) {
  const tick = (x: number, y: number) => `M${x - 4} ${y + 4}L${x + 4} ${y - 4}`;
  return (
    <G>
      <Line x1={x1} y1={y1} x2={x2} y2={y2} stroke={colour.blue} strokeWidth={1.5} />
      <Path d={tick(x1, y1) + tick(x2, y2)} stroke={colour.blue} strokeWidth={1.5} />
    </G>
  );
}

/** The part as a dimensioned elevation: outline, features, length and width; the thickness is said. */
export function PartElevation({ part, values }: { part: Part; values: PlanValues }) {
  const state = values.model.parts.get(part.id);
  const length = state?.length.value?.x;
  const breadth = state?.width.value?.x;
  if (!length || !breadth || length <= 0 || breadth <= 0) {
    return <Text tone="failsText">Its size cannot be worked out.</Text>;
  }
  const scale = Math.min((width - 2 * margin) / length, tallest / breadth);
  const w = length * scale;
  const h = Math.max(breadth * scale, 2);
  const features = drawnFeatures(part, values, scale, length, breadth);
  const figures = {
    length: values.length(length),
    width: values.length(breadth),
    thickness: values.length(state.thickness.value?.x),
  };
  return (
    <View style={styles.box}>
      <Svg
        width={width}
        height={h + 2 * margin}
        viewBox={`0 0 ${width} ${h + 2 * margin}`}
        aria-hidden
      >
        <Rect
          x={margin}
          y={margin}
          width={w}
          height={h}
          fill={colour.sheet}
          stroke={colour.ink}
          strokeWidth={line.medium}
        />
        {features.map((f) =>
          f.kind === 'hole' ? (
            <Circle
              key={f.key}
              cx={margin + f.x}
              cy={margin + h - f.y}
              r={Math.max(f.w / 2, 1.5)}
              fill="none"
              stroke={colour.ink}
              strokeWidth={1}
            />
          ) : (
            <Rect
              key={f.key}
              x={margin + f.x}
              y={margin + h - f.y - f.h}
              width={Math.max(f.w, 1)}
              height={Math.max(f.h, 1)}
              fill="none"
              stroke={colour.ink}
              strokeWidth={1}
              strokeDasharray={f.kind === 'strip' ? '4 3' : undefined}
            />
          ),
        )}
        <DimLine x1={margin} y1={12} x2={margin + w} y2={12} />
        <DimLine x1={12} y1={margin} x2={12} y2={margin + h} />
      </Svg>
      <Text size="note">
        {figures.length ? <Figure figure={figures.length} weight={600} /> : '?'} long,{' '}
        {figures.width ? <Figure figure={figures.width} weight={600} /> : '?'} wide
        {figures.thickness ? (
          <>
            , <Figure figure={figures.thickness} weight={600} /> thick
          </>
        ) : null}
        {part.grain === 'free' ? '' : `, grain along the ${part.grain}`}
      </Text>
      {part.features.map((feature) => (
        <Text key={feature.id} size="note" tone="ink2">
          {feature.name || feature.kind}
          {feature.depth ? ', to a depth' : ', through'}
        </Text>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({ box: { gap: 6 } });
