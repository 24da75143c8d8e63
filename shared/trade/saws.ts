/** Geometry of a circular blade (elementary, computed) and what is asked of it. Lengths in mm, angles in degrees. */
const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** Speed of the teeth, m/s: π D N / 60. */
export const rimSpeed = (diameter: number, rpm: number): number =>
  (Math.PI * (diameter / 1000) * rpm) / 60;

/** The turning speed at which the teeth go at a speed, rev/min. */
export const speedLimit = (diameter: number, metresPerSecond: number): number =>
  (60 * metresPerSecond) / (Math.PI * (diameter / 1000));

/** How far the blade stands above the table at full height, when its arbor's centre is so far below the table. */
export const fullHeight = (diameter: number, arborBelow: number): number =>
  diameter / 2 - arborBelow;

/** Height that is left straight up when a blade raised so far is tilted. */
export const tilted = (height: number, bevel: number): number => height * Math.cos(radians(bevel));

/** Length of the blade in the plane `height` below its top: 2 √(r² − (r − h)²). */
export function chord(diameter: number, height: number): number {
  const r = diameter / 2;
  return 2 * Math.sqrt(Math.max(0, r ** 2 - (r - height) ** 2));
}

/** Smallest blade as a share of the largest the machine takes (HSE, circular saw bench, read). */
export const smallestBlade = 0.6;
