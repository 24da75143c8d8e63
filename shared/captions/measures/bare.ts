import { follows, type Token } from '../tokens';
import { singular } from './counts';
import { type Quantity } from './quantity';
import { type Found } from './special';
import { near, type Talk, unitNear, wordBefore } from './talk';
import {
  angleWords,
  costs,
  dimensionWords,
  lumberNouns,
  money,
  namedNumbers,
  neverCounted,
  otherUnits,
  precise,
  sheetNouns,
  sizedNouns,
  watched,
} from './words.data';

const telling =
  "is|it's|says|say|reads|read|really|was|measures|measure|be|makes|are|that's|equals|called|got|get|gets|come|comes|came|actually|exactly|roughly|about|mine|around|just|only";
const arithmetic = 'plus|minus|less|off|leaves|add|subtract|equals|gives|leaving';

function sizedBefore(tokens: readonly Token[], at: number, reach: number): boolean {
  for (let k = at - 1; k >= Math.max(0, at - reach); k -= 1) {
    const w = tokens[k]?.w ?? '';
    if (sizedNouns.has(w) || sizedNouns.has(singular(w)) || dimensionWords.has(w)) return true;
  }
  return false;
}

/** Reasons against a bare number being a size. */
function ruledOut(tokens: readonly Token[], at: number, to: number, q: Quantity): boolean {
  const next = tokens[to]?.w ?? '';
  const before = tokens[at - 1]?.w ?? '';
  const ended = tokens[to - 1]?.end ?? false;
  if (!ended && (otherUnits.has(next) || money.has(next) || watched.has(next))) return true;
  if (
    !ended &&
    neverCounted.has(next) &&
    !sizedNouns.has(next) &&
    !dimensionWords.has(next) &&
    next !== 'more'
  )
    return true;
  if (namedNumbers.has(before) || money.has(before)) return true;
  if (follows(tokens, to, 'square feet|foot|inches|metres|meters|yards|mil')) return true;
  if (follows(tokens, to, 'of the|my|you|us|a|all|that|it')) return true;
  if (
    follows(
      tokens,
      to,
      'turn|turns|way|empty|full|price|asleep|past|decent|baked|hearted|round|star|dozen',
    )
  )
    return true;
  if (follows(tokens, to, 'more|or') && q.value <= 3 && q.form === 'whole') return true;
  if (
    near(tokens, at, to, costs, 3, 1) &&
    q.form === 'whole' &&
    near(tokens, at, to, money, 12, 12)
  )
    return true;
  if (q.form === 'whole' && q.value === 1) return true;
  if (
    q.form === 'whole' &&
    follows(tokens, at - 1, 'the|these|those|this|that|which|any|every') &&
    !dimensionWords.has(next)
  )
    return true;
  if (q.form === 'whole' && follows(tokens, at - 1, "who is|like|mark|was|age|aged|turned|i'm"))
    return true;
  return year(tokens, at, q);
}

function year(tokens: readonly Token[], at: number, q: Quantity): boolean {
  return (
    Number.isInteger(q.said) &&
    q.said >= 1900 &&
    q.said <= 2099 &&
    (q.form === 'hundreds' || q.form === 'written' || q.form === 'whole') &&
    follows(tokens, at - 1, 'in|since|from|until|till|about|around|of|back|by|was')
  );
}

/** How strongly the words say that a bare number is a size; 2 is enough. */
function evidence(talk: Talk, at: number, to: number, q: Quantity, lastLength: number): number {
  const { tokens } = talk;
  const next = tokens[to]?.w ?? '';
  let sum = formEvidence(q, talk, at);
  if (dimensionWords.has(next) && !tokens[to - 1]?.end) sum += 3;
  if (
    follows(tokens, to, 'from|up|off|down|back|short|in') &&
    follows(tokens, to + 1, 'the|each|from|one|this|that|either|both')
  )
    sum += 1.2;
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

/** A number without a unit that the words make a length or an angle. */
export function readBare(
  talk: Talk,
  at: number,
  q: Quantity,
  lastLength: number,
  known: ReadonlySet<number>,
): Found | null {
  const { tokens } = talk;
  const to = at + q.n;
  if (ruledOut(tokens, at, to, q)) return null;
  if (asAngle(tokens, at, to, q))
    return { from: at, n: q.n, values: [q.said], unit: 'deg', inferred: true };
  const thou = asThou(talk, at, to, q, known);
  if (evidence(talk, at, to, q, lastLength) + (thou ? 1.6 : 0) < 2) return null;
  if (thou)
    return {
      from: at,
      n: q.n,
      values: [Number((q.said / 1000).toFixed(6))],
      unit: 'in',
      inferred: true,
    };
  return { from: at, n: q.n, values: [q.value], unit: unitOf(talk, at, q), inferred: true };
}
