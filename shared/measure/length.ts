import { type Refusal, refuse } from './length-fault';
import { scanLength, type Piece } from './length-scan';
import { Rational } from './rational';

export type LengthUnit = 'mm' | 'in';

/** A figure as typed and its exact value in the kind's base unit (millimetres for a length). */
export interface Quantity {
  text: string;
  mm: Rational;
}

/** A figure as it is stored: `{"text": "3 9/16\"", "mm": "7239/80"}`. */
export interface ExactLength {
  text: string;
  mm: string;
}

const factors: Record<string, Rational> = {
  ft: Rational.of(1524, 5),
  in: Rational.of(127, 5),
  thou: Rational.of(127, 5000),
  m: Rational.of(1000),
  cm: Rational.of(10),
  mm: Rational.one,
};
export type Parsed = { ok: true; value: Quantity } | Refusal;

/** What may follow a unit in one length. */
const inside: Record<string, string[]> = { ft: ['in'], m: ['cm', 'mm'], cm: ['mm'] };
const largest = Rational.of(100_000);

function nestingFault(before: Piece, piece: Piece): Refusal | null {
  const allowed = inside[before.unit ?? ''] ?? [];
  if (piece.unit && allowed.includes(piece.unit)) {
    if (before.value.d === 1n && !before.pointed) return null;
    return refuse(
      before.at,
      'nesting',
      'Only the last figure can have a fraction.',
      `Write the fraction in ${piece.unit}.`,
    );
  }
  if (!piece.unit) {
    const next = before.unit === 'ft' ? 'in' : (allowed[0] ?? 'mm');
    return refuse(
      piece.at,
      'unit-missing',
      `The figure after the ${before.unit ?? ''} has no unit.`,
      `Add ${next} to it.`,
    );
  }
  return refuse(
    piece.at,
    'nesting',
    `${piece.unit} cannot follow ${before.unit ?? 'this figure'}.`,
    piece.unit === 'ft' ? 'Put feet before inches: 5 ft 3 in.' : 'Use one unit.',
  );
}

/**
 * Reads one length in any accepted form: `3/4 in`, `1-1/2"`, `5' 3-1/2"`, `742 thou`, `1½`, `2.44 m` …
 * A figure without a unit takes `unit`. Nothing is guessed: whatever could mean two things is refused
 * with its place, the reason and the cure. A negative size and more than 100 m are refused.
 */
export function parseLength(text: string, { unit }: { unit: LengthUnit }): Parsed {
  const scanned = scanLength(text);
  if (!scanned.ok) return scanned;
  let total = Rational.zero;
  let before: Piece | null = null;
  for (const piece of scanned.pieces) {
    const fault = before && nestingFault(before, piece);
    if (fault) return fault;
    const factor = factors[piece.unit ?? unit] ?? Rational.one;
    total = total.plus(piece.value.times(factor));
    before = piece;
  }
  if (total.compare(largest) > 0)
    return refuse(
      scanned.pieces[0]?.at ?? 0,
      'too-large',
      'This is more than 100 m.',
      'Check the unit.',
    );
  return { ok: true, value: { text: text.trim(), mm: total } };
}

/** The stored form of a typed length, or why it is none. */
export function toExact(
  text: string,
  unit: LengthUnit,
): { ok: true; value: ExactLength } | Refusal {
  const parsed = parseLength(text, { unit });
  if (!parsed.ok) return parsed;
  return { ok: true, value: { text: parsed.value.text, mm: parsed.value.mm.toString() } };
}

/** A stored length again; never re-rounded. Throws a RangeError when the stored fraction is broken. */
export function fromExact(stored: ExactLength): Quantity {
  return { text: stored.text, mm: Rational.parse(stored.mm) };
}
