/**
 * Dual feasible functions on whole lengths: lengths that fit into `whole` together have images that fit into the image
 * of `whole`. All are superadditive, so the same holds for every shorter sheet.
 * S. P. Fekete, J. Schepers, Math. Programming 91 (2001) 11–31; J. Carlier, F. Clautiaux, A. Moukrim, Computers &
 * Operations Research 34 (2007) 2223–2250.
 */
export interface Dual {
  /** Image of each given length. */
  of: Float64Array;
  /** Image of each sheet's length. */
  room: Float64Array;
  whole: number;
}

export type Lengths = { parts: Int32Array; sheets: Int32Array; whole: number };

function build(lengths: Lengths, f: (x: number) => number): Dual {
  return {
    of: Float64Array.from(lengths.parts, f),
    room: Float64Array.from(lengths.sheets, (x) => f(Math.min(x, lengths.whole))),
    whole: f(lengths.whole),
  };
}

/** x itself. */
const plain = (): ((x: number) => number) => (x) => x;

/** Everything longer than `whole - k` counts whole, below k nothing. */
const steps = (whole: number, k: number) => (x: number) => (x > whole - k ? whole : x < k ? 0 : x);

/** Counts how often k goes in, mirrored at the half. */
const counts = (whole: number, k: number) => (x: number) => {
  const all = Math.floor(whole / k);
  if (2 * x > whole) return 2 * (all - Math.floor((whole - x) / k));
  return 2 * x === whole ? all : 2 * Math.floor(x / k);
};

/** Rounds to k-ths; exact multiples stay. Scaled by `whole` and k. */
const rounded = (whole: number, k: number) => (x: number) =>
  ((k + 1) * x) % whole === 0 ? x * k : Math.floor(((k + 1) * x) / whole) * whole;

/** An even choice of at most `most` values. */
function thinned(values: number[], most: number): number[] {
  if (values.length <= most) return values;
  return Array.from({ length: most }, (_, i) => values[Math.floor((i * values.length) / most)]!);
}

/** The family for one direction, without doubles; `most` bounds its size. */
export function dualsOf(lengths: Lengths, most: number): Dual[] {
  const { whole, parts } = lengths;
  const marks = [...new Set([...parts].flatMap((x) => [x, whole - x, whole - x + 1]))]
    .filter((x) => x > 0 && 2 * x <= whole)
    .sort((a, b) => a - b);
  const places = thinned(marks, most);
  const ks = whole <= 2 * most ? Array.from({ length: whole >> 1 }, (_, i) => i + 1) : places;
  const all = [
    plain(),
    ...places.map((k) => steps(whole, k)),
    ...ks.map((k) => counts(whole, k)),
    ...Array.from({ length: Math.min(most, 24) }, (_, k) => rounded(whole, k + 1)),
  ];
  const seen = new Set<string>();
  return all
    .map((f) => build(lengths, f))
    .filter((dual) => {
      if (!(dual.whole > 0)) return false;
      const key = Array.from(dual.of, (x) => (x / dual.whole).toFixed(9)).join();
      return seen.has(key) ? false : (seen.add(key), true);
    });
}
