import { type KindScope } from '../../measure';
import { type Dimension, type Kind, type Part, type Stock } from '../document';
import { compileField, type Compiled } from './compile';
import { inputsOf, mentionsOf } from './entry';
import { evaluateFlow, type Graph } from './graph';
import { stackOf } from './stack';
import { type PartState, type SizeState } from './types';

export interface PartEntry {
  part: Part;
  stock: Stock | undefined;
  length: Compiled;
  width: Compiled;
  /** One, or the layers of a lamination. */
  thickness: Compiled[];
  inputs: readonly string[];
  mentions: ReadonlySet<string>;
}

export function compilePart(
  part: Part,
  stock: Stock | undefined,
  symbols: ReadonlyMap<string, Dimension>,
  scope: KindScope,
): PartEntry {
  const field = (text: string) => compileField(text, 'length', scope);
  const own = part.thickness.trim();
  // Layers are named by the symbols of their thicknesses; other names count as the stock's.
  const layers =
    own === ''
      ? part.layers.map((layer) => (symbols.has(layer) ? layer : (stock?.thickness ?? '')))
      : [];
  const texts = layers.length > 0 ? layers : [own === '' ? (stock?.thickness ?? '') : own];
  const [length, width] = [field(part.length), field(part.width)];
  const thickness = texts.map(field);
  const all = [length, width, ...thickness];
  return {
    part,
    stock,
    length,
    width,
    thickness,
    inputs: inputsOf(all, symbols),
    mentions: mentionsOf(all),
  };
}

/** A compiled size evaluated; nominal, with what it can vary. */
export function sizeOf(graph: Graph, compiled: Compiled, where: string): SizeState {
  if (!compiled.ok) return { value: null, error: { in: where, ...compiled.fault } };
  const found = evaluateFlow(graph, compiled.node, compiled.facts);
  if (!found.ok) return { value: null, error: { in: where, ...found.fault } };
  const root = { node: compiled.node, inputs: compiled.facts.inputs, made: false };
  const value = stackOf(graph, root, found.flow);
  if (value.x > 0 || where === 'value') return { value, error: null };
  return {
    value,
    error: {
      in: where,
      at: 0,
      code: 'negative',
      message: `The ${where} is not above zero.`,
      cure: 'Check the expression.',
    },
  };
}

function thickness(graph: Graph, entry: PartEntry): SizeState {
  const [first, ...rest] = entry.thickness;
  if (!first) return { value: null, error: null };
  let sum = first;
  for (const layer of rest) {
    if (!sum.ok || !layer.ok) break;
    const inputs = [...sum.facts.inputs, ...layer.facts.inputs];
    sum = {
      ok: true,
      node: { t: 'bin', op: '+', a: sum.node, b: layer.node, at: 0 },
      facts: { inputs, curved: sum.facts.curved || layer.facts.curved },
    };
  }
  const broken = entry.thickness.find((layer) => !layer.ok);
  return sizeOf(graph, broken ?? sum, 'thickness');
}

export function evaluatePart(graph: Graph, entry: PartEntry): PartState {
  return {
    id: entry.part.id,
    length: sizeOf(graph, entry.length, 'length'),
    width: sizeOf(graph, entry.width, 'width'),
    thickness: thickness(graph, entry),
  };
}

/** Any expression of the plan, such as a feature's position or a stock size. */
export function evaluateText(graph: Graph, text: string, kind: Kind, scope: KindScope): SizeState {
  return sizeOf(graph, compileField(text, kind, scope), 'value');
}
