/**
 * Coefficients of movement per percent of moisture content, radial (quarter-sawn) and tangential (flat-sawn). USDA Wood
 * Handbook FPL-GTR-190, Table 13–5, read; the softwoods computed from its Table 4–3 by 1/(100 f/S − (f − 10)); redwood,
 * white pine, teak and mahogany from memory.
 */
export const movementCoefficients: readonly {
  wood: string;
  radial: number;
  tangential: number;
}[] = [
  { wood: 'red alder', radial: 0.00151, tangential: 0.00256 },
  { wood: 'black ash', radial: 0.00172, tangential: 0.00274 },
  { wood: 'white ash', radial: 0.00169, tangential: 0.00274 },
  { wood: 'aspen', radial: 0.00119, tangential: 0.00234 },
  { wood: 'basswood', radial: 0.0023, tangential: 0.0033 },
  { wood: 'beech', radial: 0.0019, tangential: 0.00431 },
  { wood: 'paper birch', radial: 0.00219, tangential: 0.00304 },
  { wood: 'yellow birch', radial: 0.00256, tangential: 0.00338 },
  { wood: 'butternut', radial: 0.00116, tangential: 0.00223 },
  { wood: 'catalpa', radial: 0.00085, tangential: 0.00169 },
  { wood: 'cherry', radial: 0.00126, tangential: 0.00248 },
  { wood: 'chestnut', radial: 0.00116, tangential: 0.00234 },
  { wood: 'elm', radial: 0.00144, tangential: 0.00338 },
  { wood: 'hackberry', radial: 0.00165, tangential: 0.00315 },
  { wood: 'hickory', radial: 0.00169, tangential: 0.00315 },
  { wood: 'bigleaf maple', radial: 0.00126, tangential: 0.00248 },
  { wood: 'red maple', radial: 0.00137, tangential: 0.00289 },
  { wood: 'silver maple', radial: 0.00102, tangential: 0.00252 },
  { wood: 'hard maple', radial: 0.00165, tangential: 0.00353 },
  { wood: 'red oak', radial: 0.00158, tangential: 0.00369 },
  { wood: 'white oak', radial: 0.0018, tangential: 0.00365 },
  { wood: 'persimmon', radial: 0.00278, tangential: 0.00403 },
  { wood: 'sassafras', radial: 0.00137, tangential: 0.00216 },
  { wood: 'sweetgum', radial: 0.00183, tangential: 0.00365 },
  { wood: 'sycamore', radial: 0.00172, tangential: 0.00296 },
  { wood: 'tanoak', radial: 0.00169, tangential: 0.00423 },
  { wood: 'tupelo', radial: 0.00176, tangential: 0.00308 },
  { wood: 'walnut', radial: 0.0019, tangential: 0.00274 },
  { wood: 'locust', radial: 0.00158, tangential: 0.00252 },
  { wood: 'douglas fir', radial: 0.00165, tangential: 0.00267 },
  { wood: 'white fir', radial: 0.00112, tangential: 0.00245 },
  { wood: 'poplar', radial: 0.00158, tangential: 0.00289 },
  { wood: 'western redcedar', radial: 0.00111, tangential: 0.00234 },
  { wood: 'redwood', radial: 0.0012, tangential: 0.00205 },
  { wood: 'white pine', radial: 0.00071, tangential: 0.00212 },
  { wood: 'teak', radial: 0.00101, tangential: 0.00186 },
  { wood: 'mahogany', radial: 0.00172, tangential: 0.00238 },
];
