import { type Forest } from './forest';
import { type Problem } from './problem';
import { type Random } from './random';

/** How the slot for a part is chosen: least area, least short side or least waste beside it. */
export type Choice = 0 | 1 | 2 | 3 | 4;

/** Finds the best slot of a sheet for a kind; the answer lies in its fields, so that nothing is allocated. */
export class Chooser {
  /** How many slots and ways there are. */
  count = 0;
  score = 0;
  slot = -1;
  rotated = false;
  choice: Choice = 0;
  /** Share of slots passed over, in 2^-32. */
  blink = 0;
  /** Only slots after this one, by score, then place and way. */
  private afterScore = -Infinity;
  private afterPlace = -1;

  constructor(
    private readonly problem: Problem,
    private readonly forest: Forest,
    private readonly random: Random,
  ) {}

  /** From here on only slots that come after the given one. */
  after(score: number, slot: number, turned: number): void {
    this.afterScore = score;
    this.afterPlace = 2 * slot + turned;
  }

  look(kind: number, s: number): void {
    const { problem, forest } = this;
    this.count = 0;
    this.score = Infinity;
    this.slot = -1;
    const which = forest.binOf(s);
    const ways = problem.fits[kind * problem.bins + which]!;
    if (ways === 0) return;
    const room = forest.limitW(s) * forest.limitH(s) - forest.usedOn(s);
    if (problem.area[kind]! > room) return;
    const [w, h] = [problem.w[kind]!, problem.h[kind]!];
    if ((ways & 1) !== 0) this.scan(s, w, h, false);
    if ((ways & 2) !== 0 && w !== h) this.scan(s, h, w, true);
    else if (ways === 2) this.scan(s, h, w, true);
  }

  private scan(s: number, w: number, h: number, rotated: boolean): void {
    const slots = this.forest.slotsOn(s);
    const { w: sw, h: sh, axis, have } = slots;
    const { blink, random, choice, afterScore: floor } = this;
    for (let i = 0; i < slots.slots; i++) {
      const [aw, ah] = [sw[i]!, sh[i]!];
      if (aw < w || ah < h) continue;
      this.count++;
      if (blink > 0 && random.bits() < blink) continue;
      const score = rate(choice, w, h, aw, ah, axis[i]!, have[i]!);
      if (score <= floor && (score < floor || 2 * i + (rotated ? 1 : 0) <= this.afterPlace))
        continue;
      if (score < this.score) {
        this.score = score;
        this.slot = i;
        this.rotated = rotated;
      }
    }
  }
}

function rate(
  choice: Choice,
  w: number,
  h: number,
  aw: number,
  ah: number,
  axis: number,
  have: number,
): number {
  switch (choice) {
    case 0:
      return aw * ah - w * h;
    case 1:
      return Math.min(aw - w, ah - h);
    case 2: {
      // Waste beside the part and beside its neighbour.
      const [along, across] = axis === 0 ? [w, h] : [h, w];
      return Math.abs(have - across) * along;
    }
    case 3: {
      const [along, across, room] = axis === 0 ? [w, h, ah] : [h, w, aw];
      return across <= have ? (have - across) * along : (across - have) * (along + room);
    }
    default: {
      const across = axis === 0 ? h : w;
      return Math.min(aw - w, ah - h, Math.abs(have - across));
    }
  }
}
