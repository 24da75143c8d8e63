import { displayValue, displayLength, displayMm, type DisplayPreference } from '../../measure';
import { type InstrumentName, type Kind } from '../document';
import { type ReadingJudgement } from './judge';
import { type PlanModel } from './model';
import { type CheckState, type PartState, type SizeState, type Stack } from './types';

const instrumentWords: Record<InstrumentName, string> = {
  tape: 'tape',
  rule: 'rule',
  calipers: 'calipers',
  micrometer: 'micrometer',
  square: 'square',
  'angle-gauge': 'angle gauge',
  feeler: 'feeler gauge',
  scale: 'scale',
  eye: 'eye',
};

/** A difference without its sign, fine enough to act on. */
const amountText = (x: number, kind: Kind, pref: DisplayPreference): string =>
  displayValue(Math.abs(x), kind, pref, true).text.replace(/^\+/, '');

/** A stack's nominal as a figure for the person's unit. */
export function figureOf(value: Stack, pref: DisplayPreference) {
  return value.exact ? displayLength(value.exact, pref) : displayMm(value.x, pref);
}

/** A length × width × thickness in the person's unit; a size with an error is a dash. */
export function formatParts(part: PartState, pref: DisplayPreference): string {
  const one = ({ value }: SizeState) => (value ? figureOf(value, pref).text : '–');
  const all = [part.length, part.width, part.thickness].filter((size) => size.value ?? size.error);
  return all.map(one).join(' × ');
}

/** What to do about a reading, such as `0.4 mm over: one more pass.` */
export function describeReading(judged: ReadingJudgement, pref: DisplayPreference): string {
  const { verdict, amount, cure, sense, kind } = judged;
  if (verdict === 'no-band') return 'Kept. This figure counts from here on.';
  if (verdict === 'inside') return 'Inside the band.';
  const work =
    sense === 'inside' ? 'open it up a little' : sense === 'form' ? 'true it up' : 'one more pass';
  const done =
    sense === 'inside'
      ? 'cannot be put back; what goes in can be made to suit'
      : 'cannot be put back; what it meets can be made to suit';
  const cures = {
    none: '',
    work,
    move: 'move it while it is not fixed',
    set: 'set it again',
    cannot: done,
  };
  return `${amountText(amount, kind, pref)} ${verdict}: ${cures[cure]}.`;
}

/** Says that an instrument is coarse for a tolerance, and what to reach for; empty when it is fine enough. */
export function describeCoarse(judged: ReadingJudgement, pref: DisplayPreference): string {
  if (!judged.coarse) return '';
  const { tolerance, uncertainty, finer } = judged.coarse;
  const better = finer[0]
    ? `Use a ${instrumentWords[finer[0]]}`.replace('a calipers', 'calipers')
    : 'Make a trial';
  return `This instrument reads to ±${amountText(uncertainty, judged.kind, pref)}; the tolerance is ±${amountText(tolerance, judged.kind, pref)}. ${better}${finer[0] ? ', or make a trial' : ''}.`;
}

const verdictWords = {
  holds: 'Holds',
  'at-risk': 'At risk',
  fails: 'Fails',
  'needs-a-reading': 'Needs a reading',
  'too-close': 'Too close to call',
} as const;

/** The verdict as a word. */
export const verdictWord = (state: CheckState): string => verdictWords[state.verdict];

function adviceText(model: PlanModel, state: CheckState, pref: DisplayPreference): string {
  const [first] = state.advice;
  if (!first) return '';
  if (first.do === 'try') return 'Make a trial.';
  if (first.do === 'look') return 'Take a look.';
  const dimension = model.dimensions.get(first.dimensionId)?.dimension;
  const kind = dimension?.kind ?? 'length';
  const name = (dimension?.name ?? dimension?.symbol ?? 'it').toLowerCase();
  if (first.do === 'read') return `Measure the ${name}.`;
  if (first.do === 'hold')
    return `Hold the ${name} to ±${amountText(first.tolerance, kind, pref)} and this holds.`;
  return `Make the ${name} ${amountText(first.by, kind, pref)} ${first.by < 0 ? 'smaller' : 'larger'} and this holds.`;
}

/** A check in a sentence or two: the margins, the share, and what would mend it. */
export function describeCheck(
  model: PlanModel,
  state: CheckState,
  pref: DisplayPreference,
): string {
  if (state.error) return `${state.error.message} ${state.error.cure}`;
  const advice = adviceText(model, state, pref);
  const { verdict, margin, worstMargin, share, kind } = state;
  if (state.answeredBy === 'trial')
    return verdict === 'holds' ? 'The trial fits.' : 'The trial does not fit.';
  if (state.answeredBy === 'look')
    return verdict === 'holds' ? 'Looked at, and good.' : 'Looked at, and not good.';
  if (verdict === 'needs-a-reading' || margin === null || worstMargin === null)
    return `Needs a reading. ${advice}`.trim();
  const room = amountText(margin, kind, pref);
  if (verdict === 'holds') {
    const spare = amountText(worstMargin, kind, pref);
    return /[1-9]/.test(spare)
      ? `Holds with ${spare} to spare at the worst.`
      : 'Holds, with nothing to spare at the worst.';
  }
  if (verdict === 'fails') return `Fails by ${room}. ${advice}`.trim();
  if (verdict === 'too-close')
    return `Too close to call: ${room} ${margin < 0 ? 'short' : 'to spare'}, less than the instrument can tell. Use a finer one, or make a trial.`;
  const part =
    share === null ? '' : ` About ${Math.round(share * 100)} % hold (normal model, three sigma).`;
  return `At risk: ${room} to spare, ${amountText(worstMargin, kind, pref)} short at the worst.${part} ${advice}`.trim();
}
