import { StyleSheet, View } from 'react-native';
import Svg, { Circle, G, Line, Path, Rect } from 'react-native-svg';
import { type Feature, type Part } from '../../shared/plan/document';
import { Figure, type FigureParts } from '../ui/figure';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { webStyle } from '../ui/web-style';
import { type PlanValues } from './plan-model';

const drawing = { width: 300, tallest: 180, left: 64, top: 34, rest: 12 } as const;

/** A feature worked out, millimetres from the lower left corner of its face. */
interface Placed {
  feature: Feature;
  x: number;
  y: number;
  /** Diameter of a hole, else across the run. */
  width: number;
  run: number;
  depth: number | null;
}

/** The features of a part worked out; what cannot be is left out. */
function placedFeatures(part: Part, values: PlanValues, length: number, breadth: number): Placed[] {
  const mm = (text: string, otherwise: number | null) =>
    text.trim() === '' ? otherwise : (values.model.evaluate(text).value?.x ?? null);
  return part.features.flatMap((feature): Placed[] => {
    const along = feature.along === 'length';
    const [x, y, width] = [mm(feature.x, 0), mm(feature.y, 0), mm(feature.width, 0)];
    const run = mm(feature.length, along ? length - (x ?? 0) : breadth - (y ?? 0));
    if (x === null || y === null || width === null || run === null) return [];
    return [{ feature, x, y, width, run, depth: mm(feature.depth, null) }];
  });
}

/** The part as a dimensioned elevation: outline, features, length and width on their lines; the rest is said. */
export function PartElevation({ part, values }: { part: Part; values: PlanValues }) {
  const state = values.model.parts.get(part.id);
  const length = state?.length.value?.x;
  const breadth = state?.width.value?.x;
  if (!length || !breadth || length <= 0 || breadth <= 0) {
    return <Text tone="failsText">Its size cannot be worked out.</Text>;
  }
  const { width, tallest, left, top, rest } = drawing;
  const scale = Math.min((width - left - rest) / length, tallest / breadth);
  const w = length * scale;
  const h = Math.max(breadth * scale, 2);
  const features = placedFeatures(part, values, length, breadth);
  const thickness = values.length(state.thickness.value?.x);
  return (
    <View style={styles.box}>
      <View style={styles.drawing}>
        <Svg
          width={width}
          height={h + top + rest}
          viewBox={`0 0 ${width} ${h + top + rest}`}
          aria-hidden
        >
          <Rect
            x={left}
            y={top}
            width={w}
            height={h}
            fill={colour.sheet}
            stroke={colour.ink}
            strokeWidth={line.medium}
          />
          {features.map((placed) => (
            <FeatureShape key={placed.feature.id} placed={placed} scale={scale} bottom={top + h} />
          ))}
          <DimLine x1={left} y1={top - 9} x2={left + w} y2={top - 9} />
          <DimLine x1={left - 9} y1={top} x2={left - 9} y2={top + h} />
        </Svg>
        <OnLine figure={values.length(length)} style={{ left, top: 0, width: w }} />
        <OnLine
          figure={values.length(breadth)}
          style={{ left: 0, top: top + h / 2 - 12, width: left - 14 }}
        />
      </View>
      <Text size="note">
        {thickness ? (
          <>
            <Figure figure={thickness} weight={600} /> thick
          </>
        ) : (
          'Its thickness cannot be worked out'
        )}
        {part.grain === 'free' ? '' : `, grain along the ${part.grain}`}
      </Text>
      {features.map((placed) => (
        <FeatureLine key={placed.feature.id} placed={placed} values={values} />
      ))}
    </View>
  );
}

function OnLine({
  figure,
  style,
}: {
  figure: FigureParts | null;
  style: { left: number; top: number; width: number };
}) {
  return (
    <View style={[styles.figure, style]}>
      <Text size="note" align="center">
        {figure ? <Figure figure={figure} weight={600} withoutUnit /> : '?'}
      </Text>
    </View>
  );
}

/** A dimension line with its ticks. */
function DimLine({ x1, y1, x2, y2 }: { x1: number; y1: number; x2: number; y2: number }) {
  const tick = (x: number, y: number) => `M${x - 4} ${y + 4}L${x + 4} ${y - 4}`;
  return (
    <G>
      <Line x1={x1} y1={y1} x2={x2} y2={y2} stroke={colour.blue} strokeWidth={1.5} />
      <Path d={tick(x1, y1) + tick(x2, y2)} stroke={colour.blue} strokeWidth={1.5} />
    </G>
  );
}

interface FeatureShapeProps {
  placed: Placed;
  scale: number;
  /** Where the part's lower edge is drawn. */
  bottom: number;
}

function FeatureShape({ placed, scale, bottom }: FeatureShapeProps) {
  const { feature, x, y, width, run } = placed;
  const pen = { fill: 'none', stroke: colour.ink, strokeWidth: 1 } as const;
  if (feature.kind === 'hole')
    return (
      <Circle
        {...pen}
        cx={drawing.left + x * scale}
        cy={bottom - y * scale}
        r={Math.max((width * scale) / 2, 1.5)}
      />
    );
  const [across, up] = feature.along === 'length' ? [run, width] : [width, run];
  const cutOut = feature.kind === 'notch' || feature.kind === 'slot';
  return (
    <Rect
      {...pen}
      x={drawing.left + x * scale}
      y={bottom - (y + up) * scale}
      width={Math.max(across * scale, 1)}
      height={Math.max(up * scale, 1)}
      // Broken where it does not go through.
      strokeDasharray={cutOut ? undefined : '4 3'}
    />
  );
}

/** A feature in words with its figures. */
function FeatureLine({ placed, values }: { placed: Placed; values: PlanValues }) {
  const { feature, x, y, width, depth } = placed;
  const figure = (mm: number) => {
    const parts = values.length(mm);
    return parts ? <Figure figure={parts} tone="ink" /> : '?';
  };
  return (
    <Text size="note" tone="ink2">
      {feature.name || feature.kind}, {figure(width)} {feature.kind === 'hole' ? 'across' : 'wide'},{' '}
      {figure(x)} from the left, {figure(y)} up,{' '}
      {depth === null ? 'through' : <>{figure(depth)} deep</>}
      {feature.face === 'front' ? '' : `, on the ${feature.face}`}
    </Text>
  );
}

const styles = StyleSheet.create({
  box: { gap: 6 },
  drawing: webStyle({ position: 'relative', width: drawing.width, maxWidth: '100%' }),
  figure: { position: 'absolute' },
});
