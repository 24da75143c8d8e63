export type ExpressionFaultCode =
  | 'empty'
  | 'too-long'
  | 'too-deep'
  | 'syntax'
  | 'literal'
  | 'unknown-symbol'
  | 'unknown-function'
  | 'unknown-unit'
  | 'arguments'
  | 'kind'
  | 'reserved'
  | 'comparison'
  | 'division-by-zero'
  | 'domain'
  | 'loop'
  | 'input'
  | 'duplicate'
  | 'negative';

/** What is wrong with an expression: the column counted from 0, a sentence, and the cure. */
export interface ExpressionFault {
  at: number;
  code: ExpressionFaultCode;
  message: string;
  cure: string;
}

/** Carries a fault out of the depth of a tree; caught at the module's doors. */
export class FaultError extends Error {
  constructor(readonly fault: ExpressionFault) {
    super(fault.message);
  }
}

export function fail(at: number, code: ExpressionFaultCode, message: string, cure: string): never {
  throw new FaultError({ at, code, message, cure });
}

/** Edit distance with swaps, given up beyond `most`. */
function distance(a: string, b: string, most: number): number {
  if (Math.abs(a.length - b.length) > most) return most + 1;
  let [before, row] = [[] as number[], Array.from({ length: b.length + 1 }, (_, j) => j)];
  for (let i = 1; i <= a.length; i += 1) {
    const next = [i];
    for (let j = 1; j <= b.length; j += 1) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      let best = Math.min(row[j]! + 1, next[j - 1]! + 1, row[j - 1]! + same);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1])
        best = Math.min(best, before[j - 2]! + 1);
      next.push(best);
    }
    [before, row] = [row, next];
  }
  return row[b.length] ?? most + 1;
}

/** The name most like the one typed, or null when none is near. Ties go to the first. */
export function nearest(typed: string, names: Iterable<string>): string | null {
  const most = Math.max(1, Math.min(3, Math.floor(typed.length / 3)));
  let best: { name: string; far: number } | null = null;
  for (const name of names) {
    const far = distance(typed.toLowerCase(), name.toLowerCase(), most);
    if (far <= most && (!best || far < best.far)) best = { name, far };
  }
  if (best) return best.name;
  for (const name of names)
    if (typed.length >= 3 && name.toLowerCase().startsWith(typed.toLowerCase())) return name;
  return null;
}
