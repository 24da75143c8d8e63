import Svg, { G, Path, Rect, Text as SvgText } from 'react-native-svg';
import { stickFigures as f } from '../../shared/plan/stick/figures';
import { type StickLayout, type StickMark } from '../../shared/plan/stick/layout';
import { colour, font, line } from '../ui/tokens';
import { VerdictDrawing } from '../ui/verdict';
import { StickDefs, stickIds, type StickIds } from './stick-defs';
import { Talk, Waits } from './stick-signs';

/** Where the horizontal stick lies in its picture, px. */
export const frame = { left: 2, right: 8, top: 24, bottom: 48 } as const;

/** Height of the picture with what hangs on it. */
export const pictureHeight = (layout: Pick<StickLayout, 'talk'>) => (layout.talk.length ? 78 : 62);

/** Paint of a stretch by its state. */
export const spanPaint = { done: colour.dye, current: colour.blueWash, open: 'none' } as const;

export interface StickDrawingProps {
  id: string;
  layout: StickLayout;
  /** px along the stick; null draws no pointer. */
  now: number | null;
}

/** The horizontal stick as a picture; pressing and reading belong to StoryStick. */
export function StickDrawing({ id, layout, now }: StickDrawingProps) {
  const ids = stickIds(id);
  const { length } = layout.scale;
  return (
    <Svg
      width={length + frame.left + frame.right}
      height={pictureHeight(layout)}
      aria-hidden
      style={{ overflow: 'visible' }}
    >
      <StickDefs ids={ids} body={{ x: frame.left, y: frame.top, width: length, height: f.body }} />
      <Body layout={layout} ids={ids} />
      <G>
        {layout.marks.map((mark, i) => (
          <LongMark key={mark.id} mark={mark} first={i === 0} dense={layout.dense} />
        ))}
      </G>
      <Hanging layout={layout} />
      <Waits layout={layout} ids={ids} now={now} />
      <Talk layout={layout} />
      {now === null ? null : <Pointer at={frame.left + now} />}
    </Svg>
  );
}

function Body({ layout, ids }: { layout: StickLayout; ids: StickIds }) {
  const { length } = layout.scale;
  const box = { x: frame.left, y: frame.top, height: f.body };
  return (
    <>
      <Rect {...box} width={length} fill={colour.sheet} />
      <G clipPath={`url(#${ids.clip})`}>
        {layout.spans.map((s) =>
          s.state === 'open' ? null : (
            <Rect
              key={s.id}
              x={frame.left + s.from}
              y={frame.top}
              width={s.to - s.from}
              height={f.body}
              fill={spanPaint[s.state]}
            />
          ),
        )}
      </G>
      <Rect {...box} width={f.zeroEnd} fill={colour.sheet} />
      <Rect {...box} width={f.zeroEnd} fill={`url(#${ids.endGrain})`} />
      <Path
        d={`M${frame.left + f.zeroEnd} ${frame.top}V${frame.bottom}`}
        stroke={colour.ink}
        strokeWidth={line.thin}
      />
      <Rect {...box} width={length} fill="none" stroke={colour.ink} strokeWidth={line.medium} />
    </>
  );
}

interface LongMarkProps {
  mark: StickMark;
  first: boolean;
  dense: boolean;
}

function LongMark({ mark, first, dense }: LongMarkProps) {
  const x = frame.left + mark.at;
  const current = mark.state === 'current';
  const weight = current ? line.thick : dense && !mark.numbered ? line.thin : line.medium;
  const ink = current ? colour.blue : colour.ink;
  const inside = mark.state === 'done' ? colour.scribe : ink;
  const depth = mark.numbered ? f.body : f.body * f.bareMark;
  return (
    <>
      {mark.numbered ? (
        <Path
          d={`M${x} ${frame.top - f.standOut}V${frame.top}`}
          stroke={ink}
          strokeWidth={weight}
        />
      ) : null}
      {first && !current ? null : (
        <Path d={`M${x} ${frame.top}V${frame.top + depth}`} stroke={inside} strokeWidth={weight} />
      )}
      {mark.numbered ? (
        <SvgText
          x={x}
          y={frame.top - 8}
          textAnchor={first ? 'start' : 'middle'}
          dx={first ? -3 : 0}
          fontFamily={font.figures}
          fontSize={12}
          fontWeight={current ? 700 : 400}
          fill={current ? colour.blue : colour.ink2}
        >
          {mark.number}
        </SvgText>
      ) : null}
    </>
  );
}

/** Short marks with their shapes, and the squares of failing steps. */
function Hanging({ layout }: { layout: StickLayout }) {
  const { bottom } = frame;
  return (
    <>
      {layout.dims.map((d, i) => {
        const x = frame.left + d.at;
        return (
          <G key={i}>
            <Path
              d={`M${x} ${bottom - f.shortInside}V${bottom}`}
              stroke={d.onDye ? colour.scribe : colour.ink}
              strokeWidth={line.thin}
            />
            {d.shape ? (
              <>
                <Path
                  d={`M${x} ${bottom}V${bottom + f.shortOutside}`}
                  stroke={colour.ink}
                  strokeWidth={line.thin}
                />
                <G
                  transform={`translate(${x - f.shape / 2},${bottom + f.shapeCentre - f.shape / 2}) scale(0.5)`}
                >
                  <VerdictDrawing kind={d.verdict} />
                </G>
              </>
            ) : null}
          </G>
        );
      })}
      {layout.failures.map((s, i) =>
        s.shape ? (
          <Rect
            key={i}
            x={frame.left + s.at - f.failing / 2}
            y={bottom + f.failingCentre - f.failing / 2}
            width={f.failing}
            height={f.failing}
            fill={colour.fails}
          />
        ) : null,
      )}
    </>
  );
}

function Pointer({ at }: { at: number }) {
  const half = f.pointerWidth / 2;
  const from = frame.top - 7;
  return (
    <>
      <Path
        d={`M${at} ${frame.top}V${frame.bottom + f.shortOutside}`}
        stroke={colour.blue}
        strokeWidth={line.thick}
      />
      <Path
        d={`M${at - half} ${from}h${f.pointerWidth}v3l${-half} 7 ${-half} -7z`}
        fill={colour.blue}
      />
    </>
  );
}
