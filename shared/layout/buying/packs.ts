/** A size of pack on sale; price null when it is not known. */
export interface Pack {
  of: number;
  price: number | null;
}

export interface PackChoice {
  /** How many of each pack, by its place in the list. */
  counts: number[];
  /** Pieces in them together. */
  pieces: number;
  /** null unless every pack bought has a price. */
  price: number | null;
}

/** Costs in whole coins; without all prices the fewest pieces too many count, then the fewest packs. */
function costsOf(packs: readonly Pack[]): { costs: number[]; priced: boolean } {
  const priced = packs.every((pack) => pack.price !== null);
  return {
    priced,
    costs: packs.map((p) => (priced ? Math.round((p.price ?? 0) * 100) : p.of * 10_000 + 1)),
  };
}

interface Step {
  cost: number;
  pack: number;
}

/** Exact: the least cost for at least n pieces, for every n up to what is needed. */
function table(packs: readonly Pack[], costs: readonly number[], need: number): Step[] {
  const best: Step[] = [{ cost: 0, pack: -1 }];
  for (let n = 1; n <= need; n += 1) {
    let step: Step = { cost: Infinity, pack: -1 };
    packs.forEach(({ of }, pack) => {
      const cost = (best[Math.max(0, n - of)]?.cost ?? Infinity) + (costs[pack] ?? Infinity);
      if (cost < step.cost) step = { cost, pack };
    });
    best.push(step);
  }
  return best;
}

/**
 * The cheapest packs that hold at least `need` pieces, exactly: any number of any of them. Where a price is missing, the
 * packs with the fewest pieces too many. Null when there is no pack.
 */
export function cheapestPacks(packs: readonly Pack[], need: number): PackChoice | null {
  const usable = packs.every((p) => Number.isInteger(p.of) && p.of > 0);
  if (packs.length === 0 || !usable) return null;
  const { costs, priced } = costsOf(packs);
  const counts = packs.map(() => 0);
  const best = table(packs, costs, Math.max(0, Math.ceil(need)));
  for (let n = best.length - 1; n > 0;) {
    const pack = best[n]?.pack ?? -1;
    if (pack < 0) return null;
    counts[pack] = (counts[pack] ?? 0) + 1;
    n = Math.max(0, n - (packs[pack]?.of ?? n));
  }
  const pieces = counts.reduce((sum, count, i) => sum + count * (packs[i]?.of ?? 0), 0);
  const cost = counts.reduce((sum, count, i) => sum + count * (costs[i] ?? 0), 0);
  return { counts, pieces, price: priced ? cost / 100 : null };
}
