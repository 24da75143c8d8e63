/** Largest router speed for a bit's diameter: over mm, rev/min. Common practice, no source; the bit's own mark wins. */
export const routerSpeeds = [
  { over: 65, rpm: 12_000 },
  { over: 50, rpm: 16_000 },
  { over: 25, rpm: 18_000 },
  { over: 0, rpm: 24_000 },
] as const;

/** Nearer than this to a blade something else takes the place of the hand, mm. Common practice, no source. */
export const handClear = 100;
/** The same along a crosscut at a mitre saw, from the blade to the end that is held. Common practice, no source. */
export const crosscutClear = 150;

/**
 * Shortest piece that is safe over each machine, mm. Common practice, no source; the machine's manual wins. HSE asks for a
 * push stick over the last 300 mm of a rip (circular saw bench, read).
 */
export const shortestWork: Readonly<Partial<Record<string, number>>> = {
  'table-saw': 250,
  jointer: 300,
  planer: 300,
};

/** Heavier than this two people lift, kg. Common practice, no source. */
export const twoPeopleLift = 25;

/** Air between a saw path and a fastener on each side, mm. Common practice, no source. */
export const fastenerAir = 3;

/** Least bite of a screw in the second piece, in diameters. Common practice for jigs and cabinets, no source. */
export const leastBite = 3;

/** What is usual, mm; outside it a unit was probably slipped. Common practice, no source. */
export const usual = {
  sheet: [1, 60],
  board: [3, 150],
  screw: [4, 350],
  kerf: [0.3, 8],
  bit: [0.5, 120],
  part: [2, 6500],
  hole: [0.5, 400],
} as const;

/** Seasonal change of moisture content indoors, percent points. Common practice, no source. */
export const season = 4;
/** Movement that splits or bows what is held across the grain, mm. Common practice, no source. */
export const movementBorne = 1.5;
