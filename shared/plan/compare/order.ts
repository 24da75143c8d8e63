/**
 * Which of the ids that both lists hold must be picked up and put elsewhere to get from one order to the other: the
 * fewest there are, by the longest increasing subsequence of the places (patience sorting, n log n).
 */
export function movedIds(before: readonly string[], after: readonly string[]): Set<string> {
  const placeBefore = new Map(before.map((id, i) => [id, i]));
  const shared = after.filter((id) => placeBefore.has(id));
  const places = shared.map((id) => placeBefore.get(id) ?? 0);
  const tails: number[] = [];
  const previous = new Array<number>(places.length).fill(-1);
  places.forEach((place, i) => {
    let low = 0;
    let high = tails.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if ((places[tails[middle] ?? 0] ?? 0) < place) low = middle + 1;
      else high = middle;
    }
    if (low > 0) previous[i] = tails[low - 1] ?? -1;
    tails[low] = i;
  });
  const still = new Set<string>();
  for (let i = tails[tails.length - 1] ?? -1; i >= 0; i = previous[i] ?? -1)
    still.add(shared[i] ?? '');
  return new Set(shared.filter((id) => !still.has(id)));
}
