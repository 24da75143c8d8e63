export type LengthFault =
  | 'empty'
  | 'too-long'
  | 'character'
  | 'not-a-number'
  | 'unknown-unit'
  | 'zero-denominator'
  | 'fraction'
  | 'mixed'
  | 'spaces'
  | 'nesting'
  | 'unit-missing'
  | 'negative'
  | 'too-large';

/** Why a text is no length: where (counted from 0), what is wrong, and what to type instead. */
export interface Refusal {
  ok: false;
  at: number;
  code: LengthFault;
  message: string;
  cure: string;
}

export const refuse = (at: number, code: LengthFault, message: string, cure: string): Refusal => ({
  ok: false,
  at,
  code,
  message,
  cure,
});
