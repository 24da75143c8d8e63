import { follows, type Token } from '../tokens';
import { type Quantity } from './quantity';
import { near } from './talk';
import {
  costs,
  dimensionWords,
  money,
  namedNumbers,
  neverCounted,
  otherUnits,
  sizedNouns,
  watched,
} from './words.data';

/** The word after a number makes it something else than a size. */
function byNext(tokens: readonly Token[], to: number, q: Quantity): boolean {
  const next = tokens[to]?.w ?? '';
  if (otherUnits.has(next) || money.has(next) || watched.has(next)) return true;
  if (
    neverCounted.has(next) &&
    !sizedNouns.has(next) &&
    !dimensionWords.has(next) &&
    next !== 'more'
  )
    return true;
  if (follows(tokens, to, 'square feet|foot|inches|metres|meters|yards|mil')) return true;
  if (follows(tokens, to, 'of the|my|you|us|a|all|that|it')) return true;
  if (
    follows(
      tokens,
      to,
      'turn|turns|way|empty|full|price|asleep|past|decent|baked|hearted|round|star|dozen|doors',
    )
  )
    return true;
  return follows(tokens, to, 'more|or') && q.value <= 3 && q.form === 'whole';
}

function byBefore(tokens: readonly Token[], at: number, to: number, q: Quantity): boolean {
  const before = tokens[at - 1]?.w ?? '';
  if (namedNumbers.has(before) || money.has(before)) return true;
  if (q.form !== 'whole') return false;
  if (near(tokens, at, to, costs, 3, 1) && near(tokens, at, to, money, 12, 12)) return true;
  if (
    follows(tokens, at - 1, 'the|these|those|this|that|which|any|every') &&
    !dimensionWords.has(tokens[to]?.w ?? '')
  )
    return true;
  if (
    follows(
      tokens,
      at - 2,
      'she|he|who|lady|grandfather|mother|father|wife|mum|mom|dad|daughter|son is|was',
    )
  )
    return true;
  return follows(tokens, at - 1, "is|like|mark|was|age|aged|turned|i'm|she's|he's") &&
    follows(tokens, at - 2, 'who|lady|kid|boy|girl|dog')
    ? true
    : follows(tokens, at - 1, "i'm|age|aged|turned|mark|she's|he's");
}

/** "in twenty nineteen": a year. */
function year(tokens: readonly Token[], at: number, q: Quantity): boolean {
  return (
    Number.isInteger(q.said) &&
    q.said >= 1900 &&
    q.said <= 2099 &&
    q.unit === null &&
    follows(
      tokens,
      at - 1,
      'in|since|from|until|till|about|around|of|back|by|was|before|after|the|late|early',
    )
  );
}

/** Reasons against a bare number being a size. */
export function ruledOut(tokens: readonly Token[], at: number, to: number, q: Quantity): boolean {
  if (q.form === 'whole' && q.value === 1) return true;
  const ended = tokens[to - 1]?.end ?? false;
  return (!ended && byNext(tokens, to, q)) || byBefore(tokens, at, to, q) || year(tokens, at, q);
}
