/** ISO 2768-1:1989 table 1: over the size before, up to and including `to` mm; ± mm. null: none stated. */
export const linearClasses: {
  to: number;
  f: number | null;
  m: number;
  c: number;
  v: number | null;
}[] = [
  { to: 3, f: 0.05, m: 0.1, c: 0.2, v: null },
  { to: 6, f: 0.05, m: 0.1, c: 0.3, v: 0.5 },
  { to: 30, f: 0.1, m: 0.2, c: 0.5, v: 1 },
  { to: 120, f: 0.15, m: 0.3, c: 0.8, v: 1.5 },
  { to: 400, f: 0.2, m: 0.5, c: 1.2, v: 2.5 },
  { to: 1000, f: 0.3, m: 0.8, c: 2, v: 4 },
  { to: 2000, f: 0.5, m: 1.2, c: 3, v: 6 },
  { to: 4000, f: null, m: 2, c: 4, v: 8 },
];

/** ISO 2768-1:1989 table 3: angles by the shorter side, up to and including `to` mm; ± minutes of arc. */
export const angularClasses: { to: number; f: number; m: number; c: number; v: number }[] = [
  { to: 10, f: 60, m: 60, c: 90, v: 180 },
  { to: 50, f: 30, m: 30, c: 60, v: 120 },
  { to: 120, f: 20, m: 20, c: 30, v: 60 },
  { to: 400, f: 10, m: 10, c: 15, v: 30 },
  { to: Infinity, f: 5, m: 5, c: 10, v: 20 },
];

/** ISO 286-1 standard tolerance grades in µm: over the size before, up to and including `to` mm. */
export const toleranceGrades: {
  over: number;
  to: number;
  it: Record<6 | 7 | 8 | 9 | 10 | 11 | 12, number>;
}[] = [
  { over: 3, to: 6, it: { 6: 8, 7: 12, 8: 18, 9: 30, 10: 48, 11: 75, 12: 120 } },
  { over: 6, to: 10, it: { 6: 9, 7: 15, 8: 22, 9: 36, 10: 58, 11: 90, 12: 150 } },
  { over: 10, to: 18, it: { 6: 11, 7: 18, 8: 27, 9: 43, 10: 70, 11: 110, 12: 180 } },
  { over: 18, to: 30, it: { 6: 13, 7: 21, 8: 33, 9: 52, 10: 84, 11: 130, 12: 210 } },
  { over: 30, to: 50, it: { 6: 16, 7: 25, 8: 39, 9: 62, 10: 100, 11: 160, 12: 250 } },
  { over: 50, to: 80, it: { 6: 19, 7: 30, 8: 46, 9: 74, 10: 120, 11: 190, 12: 300 } },
  { over: 80, to: 120, it: { 6: 22, 7: 35, 8: 54, 9: 87, 10: 140, 11: 220, 12: 350 } },
  { over: 120, to: 180, it: { 6: 25, 7: 40, 8: 63, 9: 100, 10: 160, 11: 250, 12: 400 } },
  { over: 180, to: 250, it: { 6: 29, 7: 46, 8: 72, 9: 115, 10: 185, 11: 290, 12: 460 } },
];
