/** Why an aid gives no result: the input it is about, the reason, and what to do. */
export interface Refused {
  ok: false;
  field: string;
  reason: string;
  cure: string;
}

/** What an aid works out, or why it does not: it never answers outside the range its source holds for. */
export type Outcome<T> = { ok: true; result: T } | Refused;

export const refused = (field: string, reason: string, cure: string): Refused => ({
  ok: false,
  field,
  reason,
  cure,
});
