/** A span of minutes, or one figure twice. */
export type Span = readonly [low: number, high: number];

export interface GlueFamily {
  id: string;
  name: string;
  /** Minutes from spreading to closing. */
  open: Span;
  clamp: Span;
  /** In the clamps when the joint is sprung, bent or under stress. */
  clampStressed?: Span;
  cure: Span;
  /** Lowest temperature, °C. */
  least: number;
  mark: string;
}

const hour = 60;
const day = 24 * hour;

/**
 * Waits by family of glue, no brands. Placeholders until the label's own figures stand in their place: PVA clamp, cure and
 * temperature and the polyurethane clamp read twice removed in makers' guides, everything else from memory.
 */
export const glueFamilies: readonly GlueFamily[] = [
  {
    id: 'pva-white',
    name: 'PVA, white',
    open: [5, 10],
    clamp: [30, 60],
    clampStressed: [day, day],
    cure: [day, day],
    least: 13,
    mark: 'clamp, cure and temperature from a maker’s guide; open time from memory',
  },
  {
    id: 'pva-yellow',
    name: 'PVA, yellow (aliphatic)',
    open: [5, 10],
    clamp: [30, 60],
    clampStressed: [day, day],
    cure: [day, day],
    least: 10,
    mark: 'clamp, cure and temperature from a maker’s guide; open time from memory',
  },
  {
    id: 'polyurethane',
    name: 'Polyurethane, one part',
    open: [15, 20],
    clamp: [4 * hour, 4 * hour],
    cure: [day, day],
    least: 10,
    mark: 'clamp from a maker’s guide; the rest from memory',
  },
  {
    id: 'epoxy',
    name: 'Epoxy, room cure',
    open: [5, 60],
    clamp: [4 * hour, day],
    cure: [day, 7 * day],
    least: 15,
    mark: 'from memory',
  },
  {
    id: 'hot-hide',
    name: 'Hot hide',
    open: [1, 3],
    clamp: [2 * hour, 12 * hour],
    cure: [day, day],
    least: 18,
    mark: 'from memory; “warm parts, warm room” taken as 18 °C, common practice, no source',
  },
  {
    id: 'cyanoacrylate',
    name: 'Cyanoacrylate',
    open: [0, 0.25],
    clamp: [0.2, 1],
    cure: [day, day],
    least: 18,
    mark: 'from memory; “room temperature” taken as 18 °C, common practice, no source',
  },
];

/** Clamp pressure for PVA and polyurethane by the wood, MPa (100–150, 150–200, 200–300 psi; read twice removed). */
export const clampPressure = {
  soft: [0.69, 1.03],
  medium: [1.03, 1.38],
  hard: [1.38, 2.07],
} as const satisfies Record<string, Span>;
