/** A short hash of a text (FNV-1a, 32 bits, twice seeded), in base 36. */
export function hashOf(text: string): string {
  let a = 0x811c9dc5;
  let b = 0x01000193 ^ text.length;
  for (let i = 0; i < text.length; i += 1) {
    a = Math.imul(a ^ text.charCodeAt(i), 0x01000193);
    b = Math.imul(b ^ text.charCodeAt(i), 0x85ebca6b);
  }
  return `${(a >>> 0).toString(36)}${(b >>> 0).toString(36)}`;
}

/**
 * Gives ids that stay where the words stay: from the kind, the words and the words beside them, with a
 * count when the same stands twice.
 */
export function idGiver(): (kind: string, words: string) => string {
  const seen = new Map<string, number>();
  return (kind, words) => {
    const hash = hashOf(`${kind}|${words}`);
    const n = (seen.get(hash) ?? 0) + 1;
    seen.set(hash, n);
    return n === 1 ? `${kind}-${hash}` : `${kind}-${hash}-${n}`;
  };
}
