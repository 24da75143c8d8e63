/**
 * Specific gravity of woods: oven-dry mass over volume at 12 % moisture. USDA Wood Handbook FPL-GTR-190 Table 5–3, all of it from
 * memory: a figure to start from. Pieces of one species differ by a tenth either way (from memory).
 */
export const specificGravity: Readonly<Record<string, number>> = {
  'red alder': 0.41,
  'black ash': 0.49,
  'white ash': 0.6,
  aspen: 0.38,
  basswood: 0.37,
  beech: 0.64,
  'paper birch': 0.55,
  'yellow birch': 0.62,
  butternut: 0.38,
  catalpa: 0.41,
  cherry: 0.5,
  chestnut: 0.43,
  elm: 0.5,
  hackberry: 0.53,
  hickory: 0.66,
  'bigleaf maple': 0.48,
  'red maple': 0.54,
  'silver maple': 0.47,
  'hard maple': 0.63,
  'red oak': 0.63,
  'white oak': 0.68,
  sassafras: 0.46,
  sweetgum: 0.52,
  sycamore: 0.49,
  tupelo: 0.5,
  walnut: 0.55,
  locust: 0.69,
  'douglas fir': 0.48,
  'white fir': 0.39,
  poplar: 0.42,
  'western redcedar': 0.32,
  redwood: 0.4,
  'white pine': 0.35,
};

/** How much pieces of one species differ, as a share (coefficient of variation about 10 %, from memory). */
export const gravitySpread = 0.1;
