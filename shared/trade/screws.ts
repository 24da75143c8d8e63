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

/** Root diameter, as a share of the shank (Wood Handbook ch. 8: about two thirds, read). */
export const rootShare = 2 / 3;

/** Lead holes by the Wood Handbook's shares of the root (from memory), mm, for a shank in mm. */
export function leadHoles(shank: number): { soft: number; hard: number } {
  const root = shank * rootShare;
  return { soft: 0.7 * root, hard: 0.9 * root };
}

/** Greatest head of a flat head, mm: A = 2.04 D − 0.003 in, a fit that gives every head that was read. */
export const flatHead = (shank: number): number => 2.04 * shank - 0.003 * 25.4;

/** Depth of a countersink for a head and a hole, all mm: (H − h) / (2 tan(θ/2)); 82° in inches, 90° metric. */
export const countersinkDepth = (head: number, hole: number, degrees: 82 | 90): number =>
  (head - hole) / (2 * Math.tan((degrees * Math.PI) / 360));
