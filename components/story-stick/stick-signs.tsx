import { G, Path, Text as SvgText } from 'react-native-svg';
import { stickFigures as f } from '../../shared/plan/stick/figures';
import { type StickLayout, type StickWait } from '../../shared/plan/stick/layout';
import { clockTime } from '../../shared/plan/stick/spoken';
import { colour, font, line } from '../ui/tokens';
import { type StickIds } from './stick-defs';

const top = 24;
const bottom = 48;
const left = 2;

/** One side of a break, from beyond one edge to beyond the other; the zigzag lies at 30–70 % of the body. */
const zigzag = (beyond: number) =>
  `v${beyond + f.body * 0.3}l-4 ${f.body * 0.13} 8 ${f.body * 0.14} -4 ${f.body * 0.13}v${beyond + f.body * 0.3}`;

const back = (beyond: number) =>
  `v${-(beyond + f.body * 0.3)}l4 ${-f.body * 0.13} -8 ${-f.body * 0.14} 4 ${-f.body * 0.13}v${-(beyond + f.body * 0.3)}`;

interface WaitsProps {
  layout: StickLayout;
  ids: StickIds;
  now: number | null;
}

/** Broken-stick signs; hatched blue while they run, with the time left beside them where there is room. */
export function Waits({ layout, ids, now }: WaitsProps) {
  return layout.waits.map((w, i) => {
    const x = left + w.at;
    const label = w.left === null ? null : labelPlace(w, layout, now);
    return (
      <G key={i}>
        <Path
          d={`M${x} ${top - 2}${zigzag(2)}h${f.waitGap}${back(2)}z`}
          fill={w.running ? colour.blueWash : colour.film}
        />
        {w.running ? (
          <Path
            d={`M${x} ${top - 2}${zigzag(2)}h${f.waitGap}${back(2)}z`}
            fill={`url(#${ids.running})`}
          />
        ) : null}
        {[x, x + f.waitGap].map((edge) => (
          <Path
            key={edge}
            d={`M${edge} ${top - f.waitBeyond}${zigzag(f.waitBeyond)}`}
            fill="none"
            stroke={colour.ink}
            strokeWidth={line.thin}
          />
        ))}
        {label ? (
          <SvgText
            x={left + label.at}
            y={top + 12.5}
            textAnchor={label.anchor}
            fontFamily={font.figures}
            fontSize={11}
            fontWeight={600}
            fill={label.onDye ? colour.scribe : colour.blue}
          >
            {clockTime(w.left ?? 0)}
          </SvgText>
        ) : null}
      </G>
    );
  });
}

const labelRoom = 46;

/** Left of the gap inside its stretch, else right of it; null where neither has room. */
function labelPlace(w: StickWait, layout: StickLayout, now: number | null) {
  const own = layout.spans.find((s) => s.from <= w.at && w.at < s.to + f.waitGap);
  const blocked = now !== null && own && now > own.from && now < w.at ? now + 4 : (own?.from ?? 0);
  if (own && w.at - blocked >= labelRoom) {
    return { at: w.at - 7, anchor: 'end' as const, onDye: own.state === 'done' };
  }
  const next = layout.spans.find((s) => s.from > w.at);
  const from = w.at + f.waitGap;
  const to = next?.to ?? layout.scale.length;
  if (to - from < labelRoom + 6) return null;
  return { at: from + 8, anchor: 'start' as const, onDye: next?.state === 'done' };
}

/** Notes with their counts, hanging from the far side. */
export function Talk({ layout }: { layout: StickLayout }) {
  const y = bottom + f.talkFrom;
  return layout.talk.map((t, i) => (
    <G key={i}>
      <Path
        d={`M${left + t.at} ${y}h${f.noteWidth}v${f.noteHeight}h-6l-4 4z`}
        fill={colour.film}
        stroke={colour.ink}
        strokeWidth={line.thin}
      />
      <SvgText
        x={left + t.at + f.noteWidth + 3}
        y={y + f.noteHeight}
        fontFamily={font.figures}
        fontSize={11}
        fill={colour.ink2}
      >
        {t.count}
      </SvgText>
    </G>
  ));
}
