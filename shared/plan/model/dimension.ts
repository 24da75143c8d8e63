import {
  angularTolerance,
  evaluate,
  exact,
  type ExpressionFault,
  linearTolerance,
} from '../../measure';
import { type Dimension } from '../document';
import { type Entry, type Result } from './entry';
import { evaluateFlow, flowOf, type Graph } from './graph';
import { readTolerance, summarise } from './readings';
import { type Flow, type Source } from './source';
import { stackOf } from './stack';
import { type ModelFault, type ModelReadings, type ReadingSummary, type Stack } from './types';

const inside = (where: string, fault: ExpressionFault): ModelFault => ({ in: where, ...fault });

/** Half the band and its middle off the nominal; null without a tolerance. */
type Band = { tolerance: number; shift: number } | null;

function toleranceValues(graph: Graph, entry: Entry): number[] | ModelFault {
  const values: number[] = [];
  for (const compiled of entry.tolerance) {
    if (!compiled.ok) return inside('tolerance', compiled.fault);
    const found = evaluate(compiled.node, (symbol, made) => {
      const flow = flowOf(graph, symbol, made);
      return flow?.q ? exact(flow.q) : { x: flow?.x ?? NaN, q: null, g: null };
    });
    if (!found.ok) return inside('tolerance', found.fault);
    values.push(found.value.x);
  }
  return values;
}

function classBand(dimension: Dimension, x: number, of: 'f' | 'm' | 'c' | 'v'): Band | ModelFault {
  // Without a side stated, an angle takes the widest step: the shortest side.
  const half =
    dimension.kind === 'angle' ? angularTolerance(0, of) : linearTolerance(Math.abs(x), of);
  if (half !== null && (dimension.kind === 'length' || dimension.kind === 'angle'))
    return { tolerance: half, shift: 0 };
  return inside('tolerance', {
    at: 0,
    code: 'domain',
    message: `Class ${of} states nothing for this size.`,
    cure: 'Give the tolerance as ±.',
  });
}

function ownBand(graph: Graph, entry: Entry, x: number): Band | ModelFault {
  const { tolerance } = entry.dimension;
  if (tolerance.form === 'none') return null;
  if (tolerance.form === 'iso2768') return classBand(entry.dimension, x, tolerance.class);
  const values = toleranceValues(graph, entry);
  if (!Array.isArray(values)) return values;
  const [a = 0, b = a] = values;
  const band =
    tolerance.form === 'limits'
      ? { tolerance: (b - a) / 2, shift: (a + b) / 2 - x }
      : { tolerance: (a + b) / 2, shift: (a - b) / 2 };
  if (band.tolerance >= 0 && !Number.isNaN(band.tolerance)) return band;
  return inside('tolerance', {
    at: 0,
    code: 'negative',
    message: 'The lower limit lies above the upper one.',
    cure: 'Swap the limits, or leave the minus out.',
  });
}

function source(dimension: Dimension, band: Band, read: boolean): Source {
  const { id, symbol, name, setting } = dimension;
  return {
    key: read && dimension.origin !== 'taken' ? `!${id}` : id,
    dimensionId: id,
    symbol,
    name,
    read,
    tolerance: band?.tolerance ?? 0,
    shift: band?.shift ?? 0,
    setting,
  };
}

const single = (x: number, q: Flow['q'], from: Source): Flow => ({
  x,
  q,
  slopes: new Map([[from, 1]]),
  curved: false,
});

const readFlow = (dimension: Dimension, readings: ReadingSummary): Flow => {
  const band = { tolerance: readTolerance(readings), shift: 0 };
  return single(readings.value.toNumber(), readings.value, source(dimension, band, true));
};

function failed(entry: Entry, error: ModelFault, readings: ReadingSummary | null): Result {
  const { dimension } = entry;
  return {
    nominal: null,
    made: null,
    readings,
    unread: [],
    state: {
      id: dimension.id,
      dimension,
      kind: dimension.kind,
      value: null,
      band: null,
      tolerance: null,
      readings,
      standIn: dimension.origin === 'taken' && !readings,
      error,
    },
  };
}

function bandOf(value: Stack, band: Band): Result['state']['band'] {
  if (band) {
    const middle = value.x + band.shift;
    return { low: middle - band.tolerance, high: middle + band.tolerance, own: true };
  }
  return value.worst > 0 ? { low: value.low, high: value.high, own: false } : null;
}

function unreadOf(graph: Graph, entry: Entry, read: boolean): readonly string[] {
  const { dimension } = entry;
  if (dimension.origin === 'taken') return read ? [] : [dimension.id];
  if (entry.inputs.length === 0) return [];
  const all = new Set(entry.inputs.flatMap((id) => graph.results.get(id)?.unread ?? []));
  return [...all].slice(0, 5);
}

/** A result that carries a loop, spelled out. */
export function loopResult(entry: Entry, loop: string[]): Result {
  const shown = loop.length > 12 ? [...loop.slice(0, 8), '…', ...loop.slice(-3)] : loop;
  const many = loop.length > 12 ? ` (${loop.length - 1} dimensions)` : '';
  const message = `This goes round in a loop: ${shown.join(' → ')}${many}.`;
  const cure = `Give one of them a figure of its own.`;
  return failed(entry, { in: 'expression', at: 0, code: 'loop', message, cure, loop }, null);
}

/** Material and openings that are given or taken have no size below zero; a position may. */
function negativeSize({ kind, origin, sense }: Dimension, x: number): ModelFault | null {
  const size =
    kind === 'length' && origin !== 'derived' && (sense === 'outside' || sense === 'inside');
  if (!size || x >= 0) return null;
  const message = 'A size cannot be below zero.';
  return { in: 'expression', at: 0, code: 'negative', message, cure: 'Leave the minus out.' };
}

/**
 * Evaluates one dimension over those before it. A reading replaces the stand-in of a taken one; of others it is
 * what was made. A tolerance of its own makes a derived dimension vary by itself, whatever its inputs do.
 */
export function evaluateDimension(graph: Graph, entry: Entry, given: ModelReadings | null): Result {
  const { dimension, compiled } = entry;
  const readings = summarise(dimension, given);
  if (entry.symbolFault) return failed(entry, entry.symbolFault, readings);
  if (!compiled.ok) return failed(entry, inside('expression', compiled.fault), readings);
  const found = evaluateFlow(graph, compiled.node, compiled.facts);
  if (!found.ok) return failed(entry, inside('expression', found.fault), readings);
  const below = negativeSize(dimension, found.flow.x);
  if (below) return failed(entry, below, readings);
  const band = ownBand(graph, entry, found.flow.x);
  if (band && 'in' in band) return failed(entry, band, readings);
  const { x, q } = found.flow;
  const independent = dimension.origin !== 'derived' && entry.inputs.length === 0;
  const drawn = band || independent ? single(x, q, source(dimension, band, false)) : found.flow;
  const taken = dimension.origin === 'taken' && readings;
  const nominal = taken ? readFlow(dimension, readings) : drawn;
  const made = readings && !taken ? readFlow(dimension, readings) : nominal;
  const root = { node: compiled.node, inputs: compiled.facts.inputs, made: false };
  const value = stackOf(graph, root, nominal);
  const limits = bandOf(value, taken ? null : band);
  return {
    nominal,
    made,
    readings,
    unread: unreadOf(graph, entry, readings !== null),
    state: {
      id: dimension.id,
      dimension,
      kind: dimension.kind,
      value,
      band: limits,
      tolerance: limits && (limits.high - limits.low) / 2,
      readings,
      standIn: dimension.origin === 'taken' && !readings,
      error: null,
    },
  };
}
