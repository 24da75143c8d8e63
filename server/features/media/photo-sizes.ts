/** Longest side of each size of a photo, in points. */
export const photoSizes = { large: 1600, medium: 960, thumb: 480 } as const;
export const maxPixels = 100_000_000;

const order = [
  ['image/avif', 'avif'],
  ['image/webp', null],
] as const;

/**
 * Which form of a photo answers: AVIF or WebP where the asker names it, JPEG otherwise. `there` are the
 * renditions made so far; WebP, which is made first, stands in for what is not there yet.
 */
export function photoForm(
  size: string,
  accept: string | undefined,
  there: ReadonlySet<string>,
): string {
  const named = (type: string) => (accept ?? '').includes(type);
  for (const [type, ending] of order) {
    const name = ending === null ? size : `${size}.${ending}`;
    if (named(type) && there.has(name)) return name;
  }
  return there.has(`${size}.jpeg`) ? `${size}.jpeg` : size;
}
