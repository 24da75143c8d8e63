import { useId, useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { G, Path, Rect, Text as SvgText } from 'react-native-svg';
import { benchNumberAt } from '../../shared/plan/stick/bench';
import { stickFigures as f } from '../../shared/plan/stick/figures';
import { layoutStick, type StickLayout } from '../../shared/plan/stick/layout';
import { currentStep } from '../../shared/plan/stick/scale';
import { stickValueText } from '../../shared/plan/stick/spoken';
import { type StickInput } from '../../shared/plan/stick/types';
import { colour, font, line } from '../ui/tokens';
import { VerdictDrawing } from '../ui/verdict';
import { webStyle } from '../ui/web-style';
import { BlankStick } from './blank-stick';
import { StickDefs, stickIds } from './stick-defs';
import { spanPaint } from './stick-drawing';
import { stickKey } from './stick-keys';
import { useLength } from './use-length';

export interface BenchStickProps {
  input: StickInput;
  /** Accessible name, e.g. `Story stick, your bench copy`. */
  label: string;
  /** Place in the clip, seconds. */
  now?: number | null;
  /** The step on screen. */
  selected?: string;
  onStep: (id: string) => void;
  /** px, if known; otherwise the height it is given is measured. */
  height?: number;
}

/** The body's left and right edge in the column of 52, and the air above and below. */
const x = { from: f.benchShapes, to: f.benchShapes + f.benchBody } as const;
const air = 4;

/** The stick down the left edge of the bench: shapes 16, body 22, pointer 14. */
export function BenchStick(props: BenchStickProps) {
  const { length, onLayout } = useLength('height', props.height);
  return (
    <View
      onLayout={onLayout}
      style={[styles.column, props.height !== undefined && { height: props.height }]}
    >
      {length > 0 && props.input.steps.length > 0 ? (
        <MeasuredBenchStick {...props} height={length} />
      ) : (
        <BlankStick tall height="100%" />
      )}
    </View>
  );
}

function MeasuredBenchStick({
  input,
  label,
  now = null,
  selected,
  onStep,
  height,
}: BenchStickProps & { height: number }) {
  const id = useId();
  const length = height - 2 * air;
  const layout = useMemo(() => layoutStick(input, length), [input, length]);
  const at = input.steps.find((s) => s.id === selected) ?? currentStep(input);
  return (
    <View
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-orientation="vertical"
      aria-valuemin={1}
      aria-valuemax={input.steps.length}
      aria-valuenow={at?.number ?? 1}
      aria-valuetext={at ? stickValueText(at, input.steps.length) : undefined}
      onKeyDown={(event) => void stickKey(event, { steps: input.steps, at: at?.id, onStep })}
      onClick={(event) => {
        const top = event.currentTarget.getBoundingClientRect().top;
        const seconds = layout.scale.timeAt(event.clientY - top - air);
        const step = input.steps.findLast((s) => s.start <= seconds) ?? input.steps[0];
        if (step) onStep(step.id);
      }}
      style={styles.target}
    >
      <BenchDrawing
        id={id}
        layout={layout}
        now={now === null ? null : layout.scale.at(now)}
        height={height}
      />
    </View>
  );
}

interface DrawingProps {
  id: string;
  layout: StickLayout;
  now: number | null;
  height: number;
}

function BenchDrawing({ id, layout, now, height }: DrawingProps) {
  const ids = stickIds(id);
  const { length } = layout.scale;
  const body = { x: x.from, y: air, width: f.benchBody, height: length };
  return (
    <Svg width={f.benchColumn} height={height} aria-hidden>
      <StickDefs ids={ids} body={body} />
      <Rect {...body} fill={colour.sheet} />
      <G clipPath={`url(#${ids.clip})`}>
        {layout.spans.map((s) =>
          s.state === 'open' ? null : (
            <Rect
              key={s.id}
              x={x.from}
              y={air + s.from}
              width={f.benchBody}
              height={s.to - s.from}
              fill={spanPaint[s.state]}
            />
          ),
        )}
      </G>
      <Rect {...body} height={f.zeroEnd} fill={colour.sheet} />
      <Rect {...body} height={f.zeroEnd} fill={`url(#${ids.endGrain})`} />
      <Path
        d={`M${x.from} ${air + f.zeroEnd}h${f.benchBody}`}
        stroke={colour.ink}
        strokeWidth={line.thin}
      />
      <Rect {...body} fill="none" stroke={colour.ink} strokeWidth={line.medium} />
      <BenchMarks layout={layout} now={now} />
      <BenchShapes layout={layout} />
      <BenchWaits layout={layout} hatch={ids.running} />
      {now === null ? null : <BenchPointer at={air + now} />}
    </Svg>
  );
}

function BenchMarks({ layout, now }: { layout: StickLayout; now: number | null }) {
  return layout.spans.map((s, i) => {
    const number = benchNumberAt(s, now, layout.waits);
    const current = s.state === 'current';
    const ink = current ? colour.blue : colour.ink;
    const stroke = s.state === 'done' ? colour.scribe : ink;
    return (
      <G key={s.id}>
        {i === 0 && !current ? null : (
          <Path
            d={`M${x.from} ${air + s.from}h${f.benchBody}`}
            stroke={stroke}
            strokeWidth={current ? line.thick : layout.dense ? line.thin : line.medium}
          />
        )}
        {number === null ? null : (
          <SvgText
            x={(x.from + x.to) / 2}
            y={air + number + 4.5}
            textAnchor="middle"
            fontFamily={font.figures}
            fontSize={13}
            fontWeight={current ? 700 : 600}
            fill={s.state === 'done' ? colour.scribe : ink}
          >
            {s.number}
          </SvgText>
        )}
      </G>
    );
  });
}

function BenchShapes({ layout }: { layout: StickLayout }) {
  return (
    <>
      {layout.dims.map((d, i) => (
        <G key={i}>
          <Path
            d={`M${x.from} ${air + d.at}h7`}
            stroke={d.onDye ? colour.scribe : colour.ink}
            strokeWidth={line.thin}
          />
          {d.shape ? (
            <>
              <Path d={`M${x.from} ${air + d.at}h-4`} stroke={colour.ink} strokeWidth={line.thin} />
              <G transform={`translate(${x.from - 12},${air + d.at - 4}) scale(0.5)`}>
                <VerdictDrawing kind={d.verdict} />
              </G>
            </>
          ) : null}
        </G>
      ))}
      {layout.failures.map((s, i) =>
        s.shape ? (
          <Rect
            key={i}
            x={x.from - 14}
            y={air + s.at - f.failing / 2}
            width={f.failing}
            height={f.failing}
            fill={colour.fails}
          />
        ) : null,
      )}
    </>
  );
}

/** The break across the column, zigzag in the middle. */
function BenchWaits({ layout, hatch }: { layout: StickLayout; hatch: string }) {
  const across = f.benchBody;
  const run = across * 0.3;
  const zig = (beyond: number) =>
    `h${beyond + run}l${across * 0.13} -4 ${across * 0.14} 8 ${across * 0.13} -4h${beyond + run}`;
  const back = (beyond: number) =>
    `h${-(beyond + run)}l${-across * 0.13} 4 ${-across * 0.14} -8 ${-across * 0.13} 4h${-(beyond + run)}`;
  return layout.waits.map((w, i) => {
    const y = air + w.at;
    const gap = `M${x.from - 2} ${y}${zig(2)}v${f.waitGap}${back(2)}z`;
    return (
      <G key={i}>
        <Path d={gap} fill={w.running ? colour.blueWash : colour.film} />
        {w.running ? <Path d={gap} fill={`url(#${hatch})`} /> : null}
        {[y, y + f.waitGap].map((edge) => (
          <Path
            key={edge}
            d={`M${x.from - f.waitBeyond} ${edge}${zig(f.waitBeyond)}`}
            fill="none"
            stroke={colour.ink}
            strokeWidth={line.thin}
          />
        ))}
      </G>
    );
  });
}

function BenchPointer({ at }: { at: number }) {
  return (
    <>
      <Path d={`M${x.from - 4} ${at}H${x.to}`} stroke={colour.blue} strokeWidth={line.thick} />
      <Path d={`M${x.to + 8} ${at - 6}v12h-3l-7 -6 7 -6z`} fill={colour.blue} />
    </>
  );
}

const styles = StyleSheet.create({
  column: { width: f.benchColumn, alignSelf: 'stretch', flexGrow: 1, minHeight: 120 },
  target: webStyle({
    position: 'absolute',
    left: 0,
    top: 0,
    cursor: 'pointer',
    touchAction: 'pan-y',
    userSelect: 'none',
  }),
});
