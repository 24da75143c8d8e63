import { follows } from '../tokens';
import { type Found } from './special';
import { near, type Talk, wordBefore } from './talk';
import { isTime } from './units';
import {
  clampWords,
  costs,
  money,
  pastTalk,
  percentWords,
  temperatureWords,
  waiting,
} from './words.data';

const loadWords = new Set(
  'weigh weighs weight hold holds load loads carry carries force pressure clamp clamping cramp rated'.split(
    ' ',
  ),
);
const idle =
  'to find|to get|to figure|looking|trying|talking|arguing|fighting|wondering|cursing|laughing|of your|of my';

/** Is a stretch of time part of the work, and not of the maker's life or a figure of speech? */
function timeOfWork({ tokens }: Talk, found: Found): boolean {
  const to = found.from + found.n;
  if (
    follows(tokens, to, 'ago|old|later|earlier|or') &&
    !follows(tokens, to, 'or so|two|more|longer')
  )
    return false;
  if (follows(tokens, to, 'ago|old') || near(tokens, found.from, to, pastTalk, 3, 2)) return false;
  if (idle.split('|').some((phrase) => follows(tokens, to, phrase))) return false;
  if (follows(tokens, to, 'video|clip|drive|walk|trip|job|project|build|shift|weekend'))
    return false;
  const single = follows(tokens, found.from, 'a|an|one') && found.values[0] === 1;
  if (!single) return !follows(tokens, found.from - 2, 'last|past|these|those');
  const unit = tokens[found.from + 1]?.w ?? '';
  if (
    follows(tokens, found.from - 1, 'in|wait|just|got|give|hang|every|me|take|on|once|twice|times')
  ) {
    return (
      follows(tokens, found.from - 1, 'wait') &&
      near(tokens, found.from, to, waiting, 12, 0) &&
      unit !== 'second' &&
      unit !== 'minute'
    );
  }
  if (unit === 'second') return false;
  return unit === 'hour'
    ? true
    : near(tokens, found.from, to, waiting, 6, 5) || follows(tokens, to, 'per|for');
}

/** Keeps measures of the build and drops prices, ages, figures of speech. */
export function belongs(talk: Talk, found: Found): boolean {
  const { tokens } = talk;
  const to = found.from + found.n;
  if (isTime(found.unit)) return timeOfWork(talk, found);
  if (found.unit === 'percent') return near(tokens, found.from, to, percentWords, 6, 4);
  if (found.unit === 'lb' && near(tokens, found.from, to, costs, 5, 2)) return false;
  if (follows(tokens, to, 'lighter|heavier|richer|poorer')) return false;
  if (
    found.unit === 'lb' &&
    follows(tokens, to, 'a|per|each|for') &&
    !follows(tokens, to + 1, 'inch|foot|clamp|corner|side|wheel|shelf')
  )
    return false;
  if (
    found.unit === 'lb' &&
    talk.units === 'metric' &&
    !near(tokens, found.from, to, loadWords, 7, 6)
  )
    return false;
  const single = follows(tokens, found.from, 'a|an') && found.values[0] === 1;
  if (single && (found.unit === 'lb' || found.unit === 'kg')) return false;
  if (single && found.unit === 'ft')
    return (
      follows(tokens, to, 'or|from|off|long|wide|apart|tall|of|high|up|past|in') ||
      follows(tokens, found.from - 1, 'about|every|within|than|least|around|by')
    );
  if (single && found.unit === 'deg')
    return near(
      tokens,
      found.from,
      to,
      new Set(['off', 'out', 'angle', 'bevel', 'blade', 'within', 'about', 'than']),
      4,
      3,
    );
  if (found.unit === 'ft' && follows(tokens, found.from - 1, "i'm|he's|she's|am")) return false;
  if (
    found.unit === 'in' &&
    follows(tokens, found.from - 1, 'every|give|each|by') &&
    follows(tokens, found.from, 'inch')
  )
    return false;
  return !money.has(tokens[to]?.w ?? '') && !money.has(tokens[found.from - 1]?.w ?? '');
}

/** Degrees of heat are not an angle. */
export function asTemperature({ tokens, units }: Talk, found: Found): Found {
  if (
    found.unit !== 'deg' ||
    !near(tokens, found.from, found.from + found.n, temperatureWords, 5, 4)
  )
    return found;
  if (
    wordBefore(
      tokens,
      found.from,
      new Set(['blade', 'angle', 'bevel', 'miter', 'mitre', 'tilt']),
      6,
    ) >= 0
  )
    return found;
  return { ...found, unit: units === 'imperial' ? 'F' : 'C' };
}

/** Pounds that squeeze are a force, pounds that hang are a weight. */
export const isForce = ({ tokens }: Talk, found: Found): boolean =>
  (found.unit === 'lb' || found.unit === 'kg') &&
  near(tokens, found.from, found.from + found.n, clampWords, 6, 5);
