import { bounds, type Interval } from '../../measure';
import { flowOf, type Graph, type Root, sampler } from './graph';
import { type Flow, type Source } from './source';
import { type Contributor, type Stack } from './types';

/** More contributors than this and corners give way to interval bounds. */
const cornersUpTo = 10;
/** A function counts as strongly curved when it leaves its tangent by this share of the worst case. */
const curvedFrom = 0.02;
const slack = 1e-6;

/** What varies in a flow, largest first. */
export function contributorsOf(flow: Flow): Contributor[] {
  const all: Contributor[] = [];
  for (const [source, slope] of flow.slopes) {
    const share = Math.abs(slope) * source.tolerance;
    if (share === 0) continue;
    const { dimensionId, symbol, name, read, tolerance, setting } = source;
    all.push({ dimensionId, symbol, name, read, slope, tolerance, share, setting });
  }
  return all.sort((a, b) => b.share - a.share);
}

/** Root-sum-square; what shares a stop setting adds in line first. */
export function rootSumSquare(contributors: readonly Contributor[]): number {
  const groups = new Map<string, number>();
  let sum = 0;
  for (const { setting, share } of contributors) {
    if (setting) groups.set(setting, (groups.get(setting) ?? 0) + share);
    else sum += share * share;
  }
  for (const share of groups.values()) sum += share * share;
  return Math.sqrt(sum);
}

/** Lowest and highest over the corners of the sources' bands, or null when the tangent is good enough. */
function corners(graph: Graph, root: Root, flow: Flow): Interval | null {
  const sources = [...flow.slopes].filter(([source]) => source.tolerance > 0);
  if (sources.length === 0) return null;
  const at = sampler(graph, root);
  const worst = sources.reduce((sum, [s, slope]) => sum + Math.abs(slope) * s.tolerance, 0);
  const straight = (off: ReadonlyMap<Source, number>) => {
    let x = flow.x;
    for (const [source, move] of off) x += (flow.slopes.get(source) ?? 0) * move;
    return x;
  };
  const seen: number[] = [];
  const bends = (off: ReadonlyMap<Source, number>) => {
    const x = at(off);
    seen.push(x);
    return Math.abs(x - straight(off)) > Math.max(slack, curvedFrom * worst);
  };
  const moved = (signs: (i: number) => number) =>
    new Map(
      sources.map(([s, slope], i) => [s, s.shift + signs(i) * (slope < 0 ? -1 : 1) * s.tolerance]),
    );
  const probes = [() => 1, () => -1, ...sources.flatMap((_, k) => [one(k, 1), one(k, -1)])];
  if (!probes.slice(0, 22).some((signs) => bends(moved(signs)))) return null;
  if (sources.length > cornersUpTo) return wideBounds(graph, root, seen);
  for (let corner = 0; corner < 2 ** sources.length; corner += 1)
    seen.push(at(moved((i) => ((corner >> i) & 1 ? 1 : -1))));
  seen.push(at(moved(() => 0)));
  return range(seen);
}

const one = (k: number, sign: number) => (i: number) => (i === k ? sign : 0);
const range = (seen: readonly number[]): Interval => {
  const values = seen.filter(Number.isFinite);
  return [Math.min(...values), Math.max(...values)];
};

function wideBounds(graph: Graph, root: Root, seen: readonly number[]): Interval {
  const [low, high] = bounds(root.node, (symbol, made) => {
    const id = graph.symbols.get(symbol)?.id ?? '';
    const flow = flowOf(graph, symbol, made || root.made);
    const value = graph.results.get(id)?.state.value;
    if (!flow) return [NaN, NaN];
    if (value && flow === graph.results.get(id)?.nominal) return [value.low, value.high];
    const { centre, worst } = tangent(flow, contributorsOf(flow));
    return [centre - worst, centre + worst];
  });
  return Number.isFinite(low) && Number.isFinite(high) ? [low, high] : range(seen);
}

function tangent(flow: Flow, contributors: readonly Contributor[]) {
  let centre = flow.x;
  for (const [source, slope] of flow.slopes) centre += slope * source.shift;
  return { centre, worst: contributors.reduce((sum, c) => sum + c.share, 0) };
}

/**
 * Worst case, root-sum-square and contributors of a value: `Σ|∂f/∂x|·t` and `√Σ(∂f/∂x·t)²` about the recentred
 * middle (Budynas & Nisbett, Shigley's Mechanical Engineering Design, 9th ed., 1-13). Where the function bends
 * across the bands, the corners too; the wider counts.
 */
export function stackOf(graph: Graph, root: Root, flow: Flow): Stack {
  const contributors = contributorsOf(flow);
  const { centre, worst } = tangent(flow, contributors);
  let [low, high] = [centre - worst, centre + worst];
  const corner = flow.curved ? corners(graph, root, flow) : null;
  if (corner && Number.isFinite(corner[0])) {
    low = Math.min(low, corner[0]);
    high = Math.max(high, corner[1]);
  }
  return {
    x: flow.x,
    exact: flow.q,
    centre,
    worst: corner ? Math.max(high - centre, centre - low) : worst,
    low,
    high,
    rss: rootSumSquare(contributors),
    contributors,
  };
}
