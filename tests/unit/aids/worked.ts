/** The result of an aid, or a failure that shows its refusal. */
export function worked<T>(outcome: { ok: true; result: T } | { ok: false; reason: string }): T {
  if (!outcome.ok) throw new Error(`refused: ${outcome.reason}`);
  return outcome.result;
}

/** No number anywhere in a result is NaN or endless. */
export function finite(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (value === null || typeof value !== 'object') return true;
  return Object.values(value).every(finite);
}
