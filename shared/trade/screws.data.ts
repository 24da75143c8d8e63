/**
 * Wood screws by number, inches: shank D = 0.060 + 0.013 N (ASME B18.6.1, formula read in several references), head as a
 * flat head of 82° (read twice; 16 and up computed by 2.04 D − 0.003). Root taken as two thirds of the shank (USDA Wood
 * Handbook FPL-GTR-190 ch. 8, read). Lead holes are 70 % (softwood) and 90 % (hardwood) of the root (Wood Handbook ch. 8,
 * from memory; NDS and trade charts differ), as drills to the nearest 1/64; clearance is the next 1/64 over the shank.
 */
export const woodScrews: readonly {
  number: number;
  shank: number;
  head: number;
  pilotSoft?: string;
  pilotHard?: string;
  clearance?: string;
}[] = [
  { number: 0, shank: 0.06, head: 0.119 },
  { number: 1, shank: 0.073, head: 0.146 },
  { number: 2, shank: 0.086, head: 0.172 },
  { number: 3, shank: 0.099, head: 0.199 },
  {
    number: 4,
    shank: 0.112,
    head: 0.225,
    pilotSoft: '3/64',
    pilotHard: '1/16',
    clearance: '1/8',
  },
  { number: 5, shank: 0.125, head: 0.252 },
  {
    number: 6,
    shank: 0.138,
    head: 0.279,
    pilotSoft: '1/16',
    pilotHard: '5/64',
    clearance: '9/64',
  },
  { number: 7, shank: 0.151, head: 0.305 },
  {
    number: 8,
    shank: 0.164,
    head: 0.332,
    pilotSoft: '5/64',
    pilotHard: '3/32',
    clearance: '11/64',
  },
  { number: 9, shank: 0.177, head: 0.358 },
  {
    number: 10,
    shank: 0.19,
    head: 0.385,
    pilotSoft: '3/32',
    pilotHard: '7/64',
    clearance: '13/64',
  },
  {
    number: 12,
    shank: 0.216,
    head: 0.438,
    pilotSoft: '3/32',
    pilotHard: '1/8',
    clearance: '7/32',
  },
  {
    number: 14,
    shank: 0.242,
    head: 0.491,
    pilotSoft: '7/64',
    pilotHard: '9/64',
    clearance: '1/4',
  },
  { number: 16, shank: 0.268, head: 0.544 },
  { number: 18, shank: 0.294, head: 0.597 },
  { number: 20, shank: 0.32, head: 0.65 },
  { number: 24, shank: 0.372, head: 0.756 },
];
