/** Measures of the stick in px at size 1; names as in the design's table. */
export const stickFigures = {
  body: 24,
  zeroEnd: 8,
  numberLane: 22,
  /** The long mark stands out on the number side. */
  standOut: 5,
  /** Share of the body a long mark without number crosses. */
  bareMark: 0.62,
  shortInside: 9,
  shortOutside: 4,
  shape: 8,
  shapeCentre: 8,
  failing: 10,
  failingCentre: 9,
  waitGap: 6,
  waitBeyond: 3,
  talkFrom: 15,
  noteWidth: 10,
  noteHeight: 8,
  pointerWidth: 12,
  pointerHeight: 10,
  /** Least distance between two numbers, centre to centre. */
  numberApart: 17,
  /** Shapes nearer than this would overlap. */
  shapeApart: 9,
  /** Mean distance of marks from which every one is numbered, and every fifth. */
  everyMark: 20,
  everyFifth: 9,
  /** More steps than this, and the stick pans. */
  panFrom: 60,
  /** Distance of marks while it pans: that of sixty steps on a wide page. */
  panSpacing: 14,
  benchColumn: 52,
  benchShapes: 16,
  benchBody: 22,
  benchNumberRoom: 15,
  benchPointerApart: 12,
} as const;
