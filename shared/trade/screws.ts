/**
 * Shank diameter of a wood screw by its number, mm. US: D = 0.060 + 0.013 N in (ASME B18.6.1, formula read in
 * several references); British: 0.066 in at No. 1 and 0.014 in more each (read in a furniture-making text).
 * Metric screws are named by their diameter. Null when the gauge is no number.
 */
export function shankDiameter(gauge: string, series: 'us' | 'british' | 'metric'): number | null {
  const n = Number(gauge.replace(/^(?:no\.?|#)\s*/i, '').replace(/\s*mm$/i, ''));
  if (!Number.isFinite(n) || gauge.trim() === '' || n < 0) return null;
  if (series === 'metric') return n;
  return 25.4 * (series === 'us' ? 0.06 + 0.013 * n : 0.066 + 0.014 * (n - 1));
}
