import { kindPowers, type KindScope, reservedWords } from '../../measure';
import { type Dimension, type PlanDocument } from '../document';
import { symbolPattern } from '../document-dimensions';
import { compileField, type Compiled } from './compile';
import { type Flow } from './source';
import { type DimensionState, type ModelFault, type ReadingSummary } from './types';

/** A dimension compiled against the plan's symbols. */
export interface Entry {
  dimension: Dimension;
  compiled: Compiled;
  /** The tolerance's own expressions: `by`, or `plus minus`, or `low high`, or none. */
  tolerance: Compiled[];
  symbolFault: ModelFault | null;
  /** Ids it needs, each once; unknown symbols left out. */
  inputs: readonly string[];
  /** Every symbol it mentions, known or not. */
  mentions: ReadonlySet<string>;
}

/** A dimension evaluated. */
export interface Result {
  /** What its symbol and `made()` of it give; null with an error. */
  nominal: Flow | null;
  made: Flow | null;
  readings: ReadingSummary | null;
  /** Taken dimensions it stands on that nobody has read yet; a few are enough. */
  unread: readonly string[];
  state: DimensionState;
}

/** Symbols of a plan: the first dimension of a name has it. */
export function symbolTable(document: PlanDocument): Map<string, Dimension> {
  const table = new Map<string, Dimension>();
  for (const dimension of document.dimensions)
    if (dimension.symbol !== '' && !table.has(dimension.symbol))
      table.set(dimension.symbol, dimension);
  return table;
}

export const scopeOf = (
  symbols: ReadonlyMap<string, Dimension>,
  unit: PlanDocument['units'],
): KindScope => ({
  powers: (name) => {
    const kind = symbols.get(name)?.kind;
    return kind && kindPowers(kind);
  },
  names: () => symbols.keys(),
  unit,
});

function symbolFault(
  dimension: Dimension,
  symbols: ReadonlyMap<string, Dimension>,
): ModelFault | null {
  const { symbol } = dimension;
  const say = (code: ModelFault['code'], message: string, cure: string): ModelFault => ({
    in: 'symbol',
    at: 0,
    code,
    message,
    cure,
  });
  if (symbol === '') return null;
  if (reservedWords.has(symbol))
    return say(
      'reserved',
      `${symbol} is a unit or a function.`,
      `Use ${symbol}_1 or a longer name.`,
    );
  if (!symbolPattern.test(symbol))
    return say(
      'syntax',
      `${symbol} cannot be used in an expression.`,
      'Use letters, digits and underscores, a letter first.',
    );
  if (symbols.get(symbol)?.id !== dimension.id)
    return say(
      'duplicate',
      `Two dimensions have the symbol ${symbol}.`,
      'Give one another symbol.',
    );
  return null;
}

function toleranceTexts({ tolerance }: Dimension): string[] {
  if (tolerance.form === 'plus-minus') return [tolerance.by];
  if (tolerance.form === 'unequal') return [tolerance.plus, tolerance.minus];
  if (tolerance.form === 'limits') return [tolerance.low, tolerance.high];
  return [];
}

/** The ids behind the symbols of some compiled expressions, each once. */
export function inputsOf(
  all: readonly Pick<Compiled, 'facts'>[],
  symbols: ReadonlyMap<string, Dimension>,
): string[] {
  const ids = new Set<string>();
  for (const { facts } of all)
    for (const { symbol } of facts.inputs) {
      const id = symbols.get(symbol)?.id;
      if (id !== undefined) ids.add(id);
    }
  return [...ids];
}

/** Every symbol some compiled expressions mention. */
export const mentionsOf = (all: readonly Pick<Compiled, 'facts'>[]): Set<string> =>
  new Set(all.flatMap(({ facts }) => facts.inputs.map((input) => input.symbol)));

export function compileEntry(
  dimension: Dimension,
  symbols: ReadonlyMap<string, Dimension>,
  scope: KindScope,
): Entry {
  const compiled = compileField(dimension.expression, dimension.kind, scope);
  const tolerance = toleranceTexts(dimension).map((text) =>
    compileField(text, dimension.kind, scope),
  );
  const all = [compiled, ...tolerance];
  return {
    dimension,
    compiled,
    tolerance,
    symbolFault: symbolFault(dimension, symbols),
    inputs: inputsOf(all, symbols),
    mentions: mentionsOf(all),
  };
}
