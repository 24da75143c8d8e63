import { follows, type Token } from '../tokens';
import { singular } from './counts';
import { type Quantity } from './quantity';
import { type Found } from './special';
import { near, type Talk, unitNear, wordBefore } from './talk';
import { isTime } from './units';
import { ruledOut } from './ruled-out';
import {
  angleWords,
  dimensionWords,
  lumberNouns,
  precise,
  sheetNouns,
  sizedNouns,
} from './words.data';

const telling =
  "is|it's|says|say|reads|read|really|was|measures|measure|be|makes|are|that's|mine's|equals|called|got|get|gets|come|comes|came|actually|exactly|roughly|about|mine|around|just|only";
const arithmetic = 'plus|minus|less|off|leaves|add|subtract|equals|gives|leaving';

function sizedBefore(tokens: readonly Token[], at: number, reach: number): boolean {
  for (let k = at - 1; k >= Math.max(0, at - reach); k -= 1) {
    const w = tokens[k]?.w ?? '';
    if (sizedNouns.has(w) || sizedNouns.has(singular(w)) || dimensionWords.has(w)) return true;
  }
  return false;
}

const places = new Set(
  'top middle bottom end front back left right centre center skirting foot head side other narrow wide'.split(
    ' ',
  ),
);

/** How strongly the words say that a bare number is a size; 2 is enough. */
function evidence(talk: Talk, at: number, to: number, q: Quantity, lastLength: number): number {
  const { tokens } = talk;
  const ended = tokens[to - 1]?.end ?? false;
  const next = ended ? '' : (tokens[to]?.w ?? '');
  let sum = formEvidence(q, talk, at);
  if (dimensionWords.has(next)) sum += 3;
  if (!ended && follows(tokens, to, 'in diameter|width|length|depth|height|thickness|radius'))
    sum += 3;
  if (
    follows(tokens, to, 'from|up|off|down|back|short|in') &&
    follows(tokens, to + 1, 'the|each|from|one|this|that|either|both')
  )
    sum += 1.2;
  if (!ended && follows(tokens, to, 'between|across')) sum += 1.2;
  if (!ended && follows(tokens, to, 'at|in|on the') && places.has(tokens[to + 2]?.w ?? ''))
    sum += 1.2;
  if (follows(tokens, at - 1, 'over') && at - lastLength <= 10) sum += 1;
  const k = follows(tokens, at - 1, 'about|around|roughly|exactly|just|maybe|like|say|only|a')
    ? at - 2
    : at - 1;
  const sized = sizedBefore(tokens, k, 9);
  if (follows(tokens, k, 'at')) sum += sized ? 2 : 1;
  if (follows(tokens, k, 'to|down') && near(tokens, k, k, setVerbs, 7, 0)) sum += 2;
  if (follows(tokens, at - 1, telling)) sum += sized ? 2 : 0.4;
  if (follows(tokens, k, 'of') && sizedBefore(tokens, k, 2)) sum += 2;
  if (follows(tokens, k, arithmetic)) sum += 2;
  if (follows(tokens, k, 'between')) sum += 0.5;
  if (sizedBefore(tokens, at, 1)) sum += 1.2;
  if (at - lastLength <= 10) sum += 1;
  if (sheetNouns.has(next) || (lumberNouns.has(next) && q.form !== 'whole')) sum += 1;
  return sum;
}

const setVerbs = new Set(
  'set cut rip ripped trim plane planed planing sand adjust open opened move milled mill taken take bring brought down turn lower raise raised crosscut thickness sized up'.split(
    ' ',
  ),
);

function formEvidence(q: Quantity, talk: Talk, at: number): number {
  if (q.form === 'decimal') return 3;
  if (q.form === 'fraction') return fractionEvidence(q, talk.tokens, at);
  if (q.form === 'mixed') return (q.part ?? 2) >= 8 ? 3 : 2.2;
  return q.said >= 100 && unitNear(talk, at) === 'mm' ? 1 : 0;
}

function fractionEvidence(q: Quantity, tokens: readonly Token[], at: number): number {
  const part = q.part ?? 0;
  if (![2, 4, 8, 16, 32, 64].includes(part)) return -5;
  if (part >= 8) return follows(tokens, at - 1, 'the') ? 0 : 3;
  const next = tokens[at + q.n]?.w ?? '';
  if (part === 4) return q.value > 0.5 ? 2 : follows(tokens, at, 'a') ? 1 : 0.5;
  return dimensionWords.has(next) && next !== 'long' ? 0 : sheetNouns.has(next) ? 1 : -2;
}

const angles = new Set([15, 22.5, 30, 45, 60, 90, 82]);

/** A number alone that is an angle: "at a forty five", "metric flat heads are ninety". */
function asAngle(tokens: readonly Token[], at: number, to: number, q: Quantity): boolean {
  if (!angles.has(q.said) || dimensionWords.has(tokens[to]?.w ?? '')) return false;
  const said = near(tokens, at, to, angleWords, 5, 3);
  const article = follows(tokens, at - 1, 'a|your|an');
  if (article && (q.said === 45 || said)) return true;
  if (said && follows(tokens, at - 1, 'to|at|is|are')) return true;
  return (
    wordBefore(tokens, at, new Set(['degree', 'degrees']), 12) >= 0 &&
    follows(tokens, at - 1, 'are|is|be|at|to') &&
    !follows(tokens, to, 'by')
  );
}

/** Thousandths said as a bare three figure number beside a caliper: "two forty two". */
function asThou(
  talk: Talk,
  at: number,
  to: number,
  q: Quantity,
  known: ReadonlySet<number>,
): boolean {
  if (
    talk.units === 'metric' ||
    q.said < 100 ||
    q.said > 999 ||
    !Number.isInteger(q.said) ||
    q.form === 'written'
  )
    return false;
  return (
    known.has(q.said / 1000) ||
    (q.form === 'hundreds' && near(talk.tokens, at, to, precise, 70, 40))
  );
}

function unitOf(talk: Talk, at: number, q: Quantity): 'in' | 'mm' {
  const part = q.part ?? 0;
  if (q.form === 'decimal' && part >= 3 && talk.units !== 'metric') return 'in';
  if ((q.form === 'fraction' || q.form === 'mixed') && part >= 4 && talk.units !== 'metric')
    return 'in';
  const local = unitNear(talk, at);
  // A size over a hundred is rarely inches in a talk that uses both.
  return talk.units === 'mixed' && q.said >= 100 ? 'mm' : local;
}

/** What was read so far, as far as a number without a unit needs it. */
export interface Heard {
  /** Place after the last length. */
  lastLength: number;
  /** The measure before. */
  last: Found | null;
  /** Sizes said as exact decimals, so that "two forty two" is known again. */
  known: ReadonlySet<number>;
}

const labels = new Set(['bottle', 'label', 'tin', 'can', 'instructions', 'packet', 'box', 'tub']);

/** A number that goes on in the unit of the measure just before: an angle read again, minutes on the bottle, a speed. */
function carried(
  talk: Talk,
  at: number,
  to: number,
  q: Quantity,
  last: Found | null,
): Found | null {
  if (!last || dimensionWords.has(talk.tokens[to]?.w ?? '')) return null;
  const away = at - last.from - last.n;
  const before = last.values[0] ?? 0;
  const same = { from: at, n: q.n, values: [q.said], unit: last.unit, inferred: true as const };
  if (last.unit === 'deg' && away <= 18 && Math.abs(q.said - before) <= 2 && q.said > 3)
    return same;
  if (last.unit === 'rpm' && away <= 14 && q.said >= 100) return same;
  if (isTime(last.unit) && away <= 8 && near(talk.tokens, at, at, labels, 4, 0)) return same;
  return null;
}

const speedWords = new Set([
  'running',
  'run',
  'runs',
  'speed',
  'router',
  'spin',
  'spinning',
  'dial',
  'rpm',
  'lathe',
  'revs',
]);

/** "running at eighteen thousand": a speed, for no size of a build is as large. */
const asSpeed = (talk: Talk, at: number, to: number, q: Quantity): boolean =>
  (q.said >= 5000 && q.said <= 40_000 && near(talk.tokens, at, to, speedWords, 8, 5)) ||
  (q.said >= 200 &&
    q.said <= 40_000 &&
    follows(talk.tokens, at - 2, 'spinning|running|turning|speed|spins|runs at|to|about|of'));

/** A number without a unit that the words make a length, an angle or a speed. */
export function readBare(talk: Talk, at: number, q: Quantity, heard: Heard): Found | null {
  const { tokens } = talk;
  const to = at + q.n;
  const faster = heard.last?.unit === 'rpm' ? carried(talk, at, to, q, heard.last) : null;
  if (faster) return faster;
  if (ruledOut(tokens, at, to, q)) return null;
  const base = { from: at, n: q.n, values: [q.said], inferred: true as const };
  const same = carried(talk, at, to, q, heard.last);
  if (same) return same;
  if (asAngle(tokens, at, to, q)) return { ...base, unit: 'deg' };
  if (asSpeed(talk, at, to, q)) return { ...base, unit: 'rpm' };
  const thou = asThou(talk, at, to, q, heard.known);
  if (evidence(talk, at, to, q, heard.lastLength) + (thou ? 1.6 : 0) < 2) return null;
  if (thou) return { ...base, values: [Number((q.said / 1000).toFixed(6))], unit: 'in' };
  const unit = unitOf(talk, at, q);
  // Nothing in a shop is that long.
  return q.value > (unit === 'in' ? 400 : 12_000) ? null : { ...base, values: [q.value], unit };
}
