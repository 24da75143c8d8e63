/** Bytes as people say them: `820 kB`, `3.4 MB`, `1.2 GB`. */
export function sizeWords(bytes: number): string {
  const kilo = bytes / 1000;
  if (kilo < 1000) return `${Math.ceil(kilo)} kB`;
  const [value, unit] = kilo < 1_000_000 ? [kilo / 1000, 'MB'] : [kilo / 1_000_000, 'GB'];
  return `${value < 10 ? value.toFixed(1) : String(Math.round(value))} ${unit}`;
}
