import { evaluate, type ExpressionFault, type Lookup, type Node } from '../../measure';
import { type Dimension } from '../document';
import { type Entry, type Result } from './entry';
import { type Flow, type Source } from './source';

/** What evaluating an expression needs of the plan: symbols, compiled dimensions, results so far. */
export interface Graph {
  symbols: ReadonlyMap<string, Dimension>;
  entries: ReadonlyMap<string, Entry>;
  results: ReadonlyMap<string, Result>;
}

const nothing: ReadonlyMap<Source, number> = new Map();
/** What a fault in an input makes of whatever needs it. */
const inputFault = (symbol: string): ExpressionFault => ({
  at: 0,
  code: 'input',
  message: `${symbol} has an error.`,
  cure: `Mend ${symbol} first.`,
});

export function flowOf(graph: Graph, symbol: string, made: boolean): Flow | null {
  const id = graph.symbols.get(symbol)?.id;
  const result = id === undefined ? undefined : graph.results.get(id);
  return (made ? result?.made : result?.nominal) ?? null;
}

/** The flows that enter a tree, in one place per symbol and way. */
function intake(graph: Graph, inputs: readonly { symbol: string; made: boolean }[], made: boolean) {
  const flows: Flow[] = [];
  const place = new Map<string, number>();
  for (const input of inputs) {
    const asMade = made || input.made;
    const flow = flowOf(graph, input.symbol, asMade);
    if (!flow) return { missing: input.symbol, flows, place };
    place.set(asMade ? `!${input.symbol}` : input.symbol, flows.length);
    flows.push(flow);
  }
  return { missing: null, flows, place };
}

/**
 * Evaluates a tree over the plan: its value, exact when it can be, and its slopes by every source,
 * chained through the dimensions. `made` asks for every symbol as it was made.
 */
export function evaluateFlow(
  graph: Graph,
  node: Node,
  facts: { inputs: readonly { symbol: string; made: boolean }[]; curved: boolean },
  made = false,
): { ok: true; flow: Flow } | { ok: false; fault: ExpressionFault } {
  if (node.t === 'qty')
    return {
      ok: true,
      flow: { x: node.value.toNumber(), q: node.value, slopes: nothing, curved: false },
    };
  const taken = intake(graph, facts.inputs, made);
  if (taken.missing !== null) return { ok: false, fault: inputFault(taken.missing) };
  const { flows, place } = taken;
  const lookup: Lookup = (symbol, asMade) => {
    const i = place.get(made || asMade ? `!${symbol}` : symbol) ?? 0;
    const g = flows.map((_, k) => (k === i ? 1 : 0));
    return { x: flows[i]?.x ?? NaN, q: flows[i]?.q ?? null, g };
  };
  const found = evaluate(node, lookup);
  if (!found.ok) return found;
  const { x, q, g } = found.value;
  const curved = facts.curved || flows.some((flow) => flow.curved);
  return { ok: true, flow: { x, q, slopes: chain(flows, g), curved } };
}

function chain(flows: readonly Flow[], g: readonly number[] | null): ReadonlyMap<Source, number> {
  if (flows.length === 1 && g?.[0] === 1) return flows[0]?.slopes ?? nothing;
  const slopes = new Map<Source, number>();
  flows.forEach((flow, i) => {
    const slope = g?.[i] ?? 0;
    for (const [source, inner] of flow.slopes)
      slopes.set(source, (slopes.get(source) ?? 0) + slope * inner);
  });
  return slopes;
}

/** A tree that can be evaluated again with its sources moved. */
export interface Root {
  node: Node;
  inputs: readonly { symbol: string; made: boolean }[];
  made: boolean;
}

/** Dimensions under a tree whose value flows through them, inputs before those that need them. */
function cone(graph: Graph, root: Root): Entry[] {
  const order: Entry[] = [];
  const state = new Map<string, 'open' | 'done'>();
  const own = (entry: Entry) => graph.results.get(entry.dimension.id)?.nominal?.curved !== true;
  const stack = root.inputs.map((input) => graph.symbols.get(input.symbol)?.id);
  while (stack.length > 0) {
    const id = stack.at(-1);
    const entry = id === undefined ? undefined : graph.entries.get(id);
    if (!entry || id === undefined || state.get(id) === 'done' || own(entry)) {
      stack.pop();
    } else if (state.get(id) === 'open') {
      state.set(id, 'done');
      order.push(entry);
      stack.pop();
    } else {
      state.set(id, 'open');
      stack.push(...entry.inputs);
    }
  }
  return order;
}

/** A function of how far each source is off its nominal; NaN where the tree has no value. */
export function sampler(graph: Graph, root: Root): (off: ReadonlyMap<Source, number>) => number {
  const order = cone(graph, root);
  return (off) => {
    const values = new Map<string, number>();
    const lookup =
      (allMade: boolean): Lookup =>
      (symbol, made) => {
        const id = graph.symbols.get(symbol)?.id ?? '';
        const flow = flowOf(graph, symbol, made || allMade);
        const known = flow === graph.results.get(id)?.nominal ? values.get(id) : undefined;
        return { x: known ?? (flow ? straight(flow, off) : NaN), q: null, g: null };
      };
    for (const { dimension, compiled } of order) {
      const found = compiled.ok && evaluate(compiled.node, lookup(false));
      values.set(dimension.id, found && found.ok ? found.value.x : NaN);
    }
    const found = evaluate(root.node, lookup(root.made));
    return found.ok ? found.value.x : NaN;
  };
}

/** A flow along its tangent. */
function straight(flow: Flow, off: ReadonlyMap<Source, number>): number {
  let x = flow.x;
  for (const [source, slope] of flow.slopes) x += slope * (off.get(source) ?? 0);
  return x;
}
