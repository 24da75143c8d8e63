/**
 * Measures: exact figures, how they are typed, shown and said.
 *
 * - `Rational` is an exact fraction; a stored figure is `ExactLength` `{text, mm}` (`toExact`, `fromExact`).
 * - `parseLength(text, {unit})` reads what a person typed, or refuses with place, reason and cure.
 * - `displayLength(mm, preference)` shows an exact length for the instrument in hand, with its spoken form.
 * - `term` picks the US or UK word.
 *
 * Pure: no I/O. Lengths are millimetres, angles degrees, durations minutes.
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
export { term, termList, type Term, type TermSide } from './terms';
