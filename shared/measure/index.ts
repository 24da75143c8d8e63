/**
 * Measures: exact figures, how they are typed, shown and said, and the expression language over them.
 *
 * - `Rational` is an exact fraction; a stored figure is `ExactLength` `{text, mm}` (`toExact`, `fromExact`).
 * - `parseLength(text, {unit})` reads what a person typed, or refuses with place, reason and cure.
 * - `displayLength(mm, preference)` shows an exact length for the instrument in hand, with its spoken form.
 * - `parseExpression`, `parseCheck` read expressions; `evaluate` gives the value with its slopes.
 * - `linearTolerance`, `gradeTolerance`, `instrumentFacts` are tables; `term` picks the US or UK word.
 *
 * Pure: no I/O. Lengths are millimetres, angles degrees, durations minutes, masses kilograms.
 */
export { Rational, type Tie } from './rational';
export {
  parseLength,
  toExact,
  fromExact,
  type ExactLength,
  type LengthUnit,
  type Parsed,
  type Quantity,
} from './length';
export { type LengthFault, type Refusal } from './length-fault';
export {
  displayLength,
  displayDifference,
  displayMm,
  type DisplayFigure,
  type DisplayPreference,
  type Grid,
} from './display';
export { displayValue, type DisplayValue } from './display-value';
export { term, termList, type Term, type TermSide } from './terms';
export {
  parseExpression,
  parseCheck,
  expressionLimits,
  functionNames,
  reservedWords,
} from './expression';
export { type CheckNode, type Node } from './expression-node';
export { FaultError, nearest, type ExpressionFault } from './expression-fault';
export { expectKind, expectSame, kindsOf, type KindScope } from './expression-kinds';
export { factsOf, type ExpressionFacts } from './expression-facts';
export { kindName, kindOf, kindPowers, samePowers, isPlain, type Powers } from './kinds';
export { evaluate, evaluateNode, type Lookup } from './evaluate';
export { exact, type Dual } from './dual';
export { bounds, type Interval } from './interval';
export {
  angularTolerance,
  gradeTolerance,
  linearTolerance,
  type ToleranceClass,
} from './tolerance-classes';
export { instrumentFacts, uncertaintyOf, type Uncertainties } from './instruments';
