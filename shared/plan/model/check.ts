import { type CheckNode, factsOf, type Node } from '../../measure';
import { type Check, type Kind } from '../document';
import { type FitWord } from '../document-dimensions';
import { type Compiled } from './compile';
import { evaluateFlow, type Graph } from './graph';
import { marginsOf } from './margins';
import { normalShare } from './normal';
import { stackOf } from './stack';
import {
  type Advice,
  type CheckState,
  type CheckVerdict,
  type Contributor,
  type ModelReadings,
  type Stack,
} from './types';
import { type Source } from './source';

export interface CheckEntry {
  check: Check;
  compiled: Compiled<CheckNode>;
  kind: Kind;
  inputs: readonly string[];
  mentions: ReadonlySet<string>;
}

const slack = 1e-6;

/** Gap in mm as a word; common practice, no source. */
export function fitWord(gap: number): FitWord {
  if (gap < -slack) return "won't go";
  if (gap < 0.05) return 'tight';
  if (gap < 0.2) return 'snug';
  return gap < 0.5 ? 'running' : 'free';
}

interface Room {
  stack: Stack;
  slopes: ReadonlyMap<Source, number>;
}

function room(
  graph: Graph,
  node: Node,
): Room | Extract<ReturnType<typeof evaluateFlow>, { ok: false }> {
  const facts = factsOf(node);
  const found = evaluateFlow(graph, node, facts, true);
  if (!found.ok) return found;
  const root = { node, inputs: facts.inputs, made: true };
  return { stack: stackOf(graph, root, found.flow), slopes: found.flow.slopes };
}

/** What could be done, for the margin that is shortest. */
function adviceFor(graph: Graph, tight: Room, verdict: CheckVerdict): Advice[] {
  const { stack, slopes } = tight;
  if (verdict === 'at-risk') {
    const short = -stack.low;
    return stack.contributors.flatMap((c): Advice[] => {
      const left = c.tolerance - short / Math.abs(c.slope);
      return !c.read && left > slack
        ? [{ do: 'hold', dimensionId: c.dimensionId, tolerance: left }]
        : [];
    });
  }
  if (verdict !== 'fails') return [];
  const moves = [...slopes].filter(([, slope]) => Math.abs(slope) > 1e-9);
  return moves
    .map(([source, slope]) => ({ source, by: -stack.x / slope }))
    .filter(({ source, by }) => {
      const sense = graph.entries.get(source.dimensionId)?.dimension.sense;
      if (!source.read) return true;
      return sense === 'outside' ? by < 0 : sense === 'inside' ? by > 0 : true;
    })
    .sort((a, b) => Math.abs(a.by) - Math.abs(b.by))
    .slice(0, 4)
    .map(({ source, by }) => ({ do: 'move', dimensionId: source.dimensionId, by }));
}

function verdictOf(check: Check, tight: Stack, strict: boolean): CheckVerdict {
  const unsure = tight.contributors.filter((c) => c.read).reduce((sum, c) => sum + c.share, 0);
  if (check.level === 'must' && unsure > slack && Math.abs(tight.x) < unsure) return 'too-close';
  const breaks = (margin: number) => (strict ? margin <= 1e-9 : margin < -slack);
  if (breaks(tight.x)) return 'fails';
  return breaks(tight.low) ? 'at-risk' : 'holds';
}

/** Share that holds, by root-sum-square under a normal model with three sigma to the tolerance. */
function shareOf(rooms: readonly Room[]): number {
  let out = 0;
  for (const { stack } of rooms) {
    const sigma = stack.rss / 3;
    out += sigma === 0 ? (stack.centre < 0 ? 1 : 0) : normalShare(-stack.centre / sigma);
  }
  return Math.max(0, 1 - out);
}

/** A trial or a look that answers the check, if the check takes one and it was made. */
function answered(
  check: Check,
  given: ModelReadings | null,
): Pick<CheckState, 'verdict' | 'answeredBy'> | null {
  const trial = check.answeredBy.includes('trial') ? given?.trials?.get(check.id) : undefined;
  if (trial) return { verdict: trial.result === 'fits' ? 'holds' : 'fails', answeredBy: 'trial' };
  const look = check.answeredBy.includes('look') ? given?.looks?.get(check.id) : undefined;
  if (look) return { verdict: look.result === 'good' ? 'holds' : 'fails', answeredBy: 'look' };
  return null;
}

/** What is still to be read, tried or looked at before the bench can say. */
function wanting(graph: Graph, entry: CheckEntry, given: ModelReadings | null): Advice[] {
  const { check, inputs } = entry;
  const ways: Advice[] = [];
  if (check.answeredBy.includes('trial')) ways.push({ do: 'try' });
  if (check.answeredBy.includes('look')) ways.push({ do: 'look' });
  if (!given || check.asked === 'design') return [];
  if (!check.answeredBy.includes('figures')) return ways;
  const results = inputs.map((id) => [id, graph.results.get(id)] as const);
  const unread = new Set(results.flatMap(([, result]) => result?.unread ?? []));
  if (check.asked === 'bench')
    for (const [id, result] of results)
      if (!result?.readings && !isFixed(graph, id)) unread.add(id);
  if (unread.size === 0) return [];
  return [...[...unread].map((dimensionId): Advice => ({ do: 'read', dimensionId })), ...ways];
}

/** A bare figure without tolerance, such as a clearance asked for, has nothing to read. */
const isFixed = (graph: Graph, id: string): boolean => {
  const entry = graph.entries.get(id);
  return (
    entry?.inputs.length === 0 &&
    entry.dimension.origin === 'given' &&
    entry.dimension.tolerance.form === 'none'
  );
};

const blank = {
  margin: null,
  worstMargin: null,
  share: null,
  contributors: [],
  advice: [],
  answeredBy: null,
  error: null,
};

function merged(rooms: readonly Room[]): Contributor[] {
  const by = new Map<string, Contributor>();
  for (const { stack } of rooms)
    for (const c of stack.contributors) {
      const known = by.get(c.dimensionId);
      if (!known || known.share < c.share) by.set(c.dimensionId, c);
    }
  return [...by.values()].sort((a, b) => b.share - a.share);
}

function judged(graph: Graph, entry: CheckEntry, node: CheckNode): CheckState {
  const { check } = entry;
  const { nodes, strict, gap } = marginsOf(node);
  const rooms: Room[] = [];
  for (const margin of nodes) {
    const found = room(graph, margin);
    if ('ok' in found)
      return {
        id: check.id,
        check,
        kind: entry.kind,
        ...blank,
        verdict: 'needs-a-reading',
        error: { in: 'expression', ...found.fault },
      };
    rooms.push(found);
  }
  const order: CheckVerdict[] = ['fails', 'too-close', 'at-risk', 'holds'];
  const verdicts = rooms.map(({ stack }) => verdictOf(check, stack, strict));
  const verdict = order.find((v) => verdicts.includes(v)) ?? 'holds';
  const tight = rooms.reduce((a, b) => (b.stack.low < a.stack.low ? b : a));
  const between = gap && room(graph, gap);
  return {
    id: check.id,
    check,
    kind: entry.kind,
    verdict,
    margin: Math.min(...rooms.map(({ stack }) => stack.x)),
    worstMargin: tight.stack.low,
    share: shareOf(rooms),
    ...(between &&
      !('ok' in between) && { fit: { gap: between.stack.x, word: fitWord(between.stack.x) } }),
    contributors: merged(rooms),
    advice: adviceFor(graph, tight, verdict),
    answeredBy: 'figures',
    error: null,
  };
}

/** The verdict of a check. Symbols stand for what was made where a reading exists. */
export function evaluateCheck(
  graph: Graph,
  entry: CheckEntry,
  given: ModelReadings | null,
): CheckState {
  const { check, compiled } = entry;
  const plain = { id: check.id, check, kind: entry.kind, ...blank };
  const byHand = !check.answeredBy.includes('figures');
  const state: CheckState = compiled.ok
    ? judged(graph, entry, compiled.node)
    : byHand && check.expression.trim() === ''
      ? { ...plain, verdict: 'needs-a-reading' }
      : { ...plain, verdict: 'needs-a-reading', error: { in: 'expression', ...compiled.fault } };
  const answer = answered(check, given);
  if (answer)
    return { ...state, ...answer, advice: answer.verdict === 'holds' ? [] : state.advice };
  const advice = wanting(graph, entry, given);
  if (advice.length > 0) return { ...state, verdict: 'needs-a-reading', advice, answeredBy: null };
  return state;
}
