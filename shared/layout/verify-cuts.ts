import { type Fault } from './verify-fault';
import { type Cut, type Job, type LaidSheet, type Rect, type Sheet } from './types';

interface Piece extends Rect {
  /** Axis of the cut it came from and the stage that cut belongs to; null before the first. */
  axis: 'x' | 'y' | null;
  stage: number;
  cut: boolean;
}

const same = (a: Rect, b: Rect): boolean =>
  a.x === b.x && a.y === b.y && a.w === b.w && a.h === b.h;

/** Replays the cuts of one sheet and says what is wrong with them. Nothing of the solver is used. */
export class Replay {
  readonly faults: Fault[] = [];
  private readonly pieces = new Map<number, Piece>();
  private readonly usable: Rect;
  private kerfArea = 0;

  constructor(
    private readonly job: Job,
    private readonly laid: LaidSheet,
    private readonly stock: Sheet,
    private readonly index: number,
  ) {
    const { left = 0, right = 0, bottom = 0, top = 0 } = stock.trims ?? {};
    this.usable = { x: left, y: bottom, w: stock.w - left - right, h: stock.h - bottom - top };
    this.pieces.set(0, { x: 0, y: 0, w: stock.w, h: stock.h, axis: null, stage: 0, cut: false });
  }

  private say(rule: Fault['rule'], message: string, cut?: number): void {
    this.faults.push({ rule, message, sheet: this.index, ...(cut === undefined ? {} : { cut }) });
  }

  run(): Fault[] {
    let before: Cut | null = null;
    for (const cut of this.laid.cuts) {
      if (!this.replay(cut, before)) return this.faults;
      before = cut;
    }
    this.ends();
    return this.faults;
  }

  private replay(cut: Cut, before: Cut | null): boolean {
    const piece = this.pieces.get(cut.piece);
    if (cut.n !== (before?.n ?? 0) + 1) this.say('numbers', `Cut ${cut.n} is out of order.`, cut.n);
    if (!piece || piece.cut) {
      this.say('parent-first', `Piece ${cut.piece} is not there to cut.`, cut.n);
      return false;
    }
    const [start, size] = cut.axis === 'x' ? [piece.x, piece.w] : [piece.y, piece.h];
    const whole = [cut.at, cut.setting, cut.kerf].every(Number.isSafeInteger);
    if (!whole || cut.setting < 0 || cut.setting >= size || cut.at !== start + cut.setting) {
      this.say('edge-to-edge', `Cut ${cut.n} does not lie in its piece.`, cut.n);
      return false;
    }
    // Where trim is thinner than the kerf, part of the kerf lies outside the sheet.
    const most = Math.min(this.job.kerf, size - cut.setting);
    const overEdge = cut.setting === 0 && cut.at === 0 && cut.kerf < most && cut.kerf > 0;
    if (cut.kerf !== most && !overEdge)
      this.say('kerf', `Cut ${cut.n} has a kerf of ${cut.kerf}.`, cut.n);
    this.limits(cut, piece, size - cut.setting - cut.kerf);
    const wanted = before !== null && before.axis === cut.axis && before.setting === cut.setting;
    if (cut.same !== wanted)
      this.say('fence', `Cut ${cut.n} says the wrong thing of the fence.`, cut.n);
    piece.cut = true;
    return this.split(cut, piece, size);
  }

  private split(cut: Cut, piece: Piece, size: number): boolean {
    const rest = size - cut.setting - cut.kerf;
    const trimming = !this.inside(piece);
    const stage = trimming ? 0 : piece.axis === cut.axis ? piece.stage : piece.stage + 1;
    const axis = trimming ? null : cut.axis;
    const make = (id: number | null, from: number, length: number, which: string) => {
      if ((id === null) !== length <= 0) {
        this.say('pieces', `Cut ${cut.n} has the wrong ${which} piece.`, cut.n);
        return false;
      }
      if (id === null) return true;
      if (this.pieces.has(id)) {
        this.say('pieces', `Piece ${id} is there twice.`, cut.n);
        return false;
      }
      const rect =
        cut.axis === 'x'
          ? { x: piece.x + from, y: piece.y, w: length, h: piece.h }
          : { x: piece.x, y: piece.y + from, w: piece.w, h: length };
      this.pieces.set(id, { ...rect, axis, stage, cut: false });
      return true;
    };
    this.kerfArea += cut.kerf * (cut.axis === 'x' ? piece.h : piece.w);
    const made =
      make(cut.near, 0, cut.setting, 'near') && make(cut.far, cut.setting + cut.kerf, rest, 'far');
    if (made && !trimming) this.stage(cut, stage);
    return made;
  }

  private inside(piece: Rect): boolean {
    const { usable } = this;
    return (
      piece.x >= usable.x &&
      piece.y >= usable.y &&
      piece.x + piece.w <= usable.x + usable.w &&
      piece.y + piece.h <= usable.y + usable.h
    );
  }

  private part(id: number | null): boolean {
    const piece = id === null ? undefined : this.pieces.get(id);
    return piece !== undefined && this.laid.placements.some((p) => same(p, piece));
  }

  private stage(cut: Cut, stage: number): void {
    const { stages, firstCut } = this.job.options ?? {};
    const isLast = (id: number | null) => !this.laid.cuts.some((c) => c.piece === id);
    if (stages !== undefined && stage > stages) {
      const toSize =
        this.part(cut.near) && isLast(cut.near) && isLast(cut.far) && !this.part(cut.far);
      if (!toSize) this.say('stages', `Cut ${cut.n} belongs to stage ${stage}.`, cut.n);
    }
    if (firstCut === undefined || stage !== 1) return;
    const wished = firstCut === 'rip' ? 'y' : 'x';
    const { usable } = this;
    const full = this.laid.placements.some((p) =>
      wished === 'y' ? p.h === usable.h : p.w === usable.w,
    );
    if (cut.axis !== wished && !full)
      this.say('first-cut', `Cut ${cut.n} is not a ${firstCut} over the whole sheet.`, cut.n);
  }

  private limits(cut: Cut, piece: Piece, rest: number): void {
    const machine = this.job.options?.machine;
    if (!machine || !this.inside(piece)) return;
    const long = Math.max(piece.w, piece.h);
    const blade = cut.axis === 'x' ? piece.h : piece.w;
    const isRip = blade === long;
    if (machine.hold !== undefined && long < machine.hold)
      this.say('hold', `Cut ${cut.n}: the piece is only ${long} long.`, cut.n);
    const narrow = Math.min(cut.setting, Math.max(rest, 0));
    if (isRip && machine.rip !== undefined && narrow > machine.rip)
      this.say('rip-capacity', `Cut ${cut.n}: ${narrow} lies between fence and blade.`, cut.n);
    if (!isRip && machine.crosscut !== undefined && blade > machine.crosscut)
      this.say('crosscut-capacity', `Cut ${cut.n} is ${blade} long.`, cut.n);
  }

  /** What is left when all is cut must be parts, offcuts, trim and dust, and as much as there was. */
  private ends(): void {
    const { job, laid, stock } = this;
    const left = [...this.pieces.values()].filter((piece) => !piece.cut);
    const key = (r: Rect) => `${r.x}/${r.y}/${r.w}/${r.h}`;
    const parts = new Set(laid.placements.map(key));
    const offcuts = new Set(laid.offcuts.map(key));
    let area = this.kerfArea;
    for (const piece of left) {
      area += piece.w * piece.h;
      const at = key(piece);
      if (parts.delete(at) || offcuts.delete(at)) continue;
      const trim = !this.overlapsUsable(piece);
      const least = Math.max(1, job.kerf);
      if (!trim && piece.w >= least && piece.h >= least)
        this.say(
          'remainder',
          `A piece ${piece.w} × ${piece.h} at ${piece.x}, ${piece.y} is not accounted for.`,
        );
    }
    for (const at of parts) this.say('freed', `The part at ${at} is never cut free.`);
    for (const at of offcuts) this.say('offcuts', `There is no offcut at ${at}.`);
    if (area !== stock.w * stock.h)
      this.say('sum', 'Parts, offcuts, dust and trim are not the sheet.');
    this.frees();
  }

  private overlapsUsable(piece: Rect): boolean {
    const { usable: u } = this;
    return (
      piece.x < u.x + u.w &&
      piece.x + piece.w > u.x &&
      piece.y < u.y + u.h &&
      piece.y + piece.h > u.y
    );
  }

  private frees(): void {
    for (const cut of this.laid.cuts) {
      if (cut.frees.kind !== 'part') continue;
      const { item } = cut.frees;
      const piece = cut.near === null ? undefined : this.pieces.get(cut.near);
      const found = piece && this.laid.placements.some((p) => p.item === item && same(p, piece));
      if (!found) this.say('freed', `Cut ${cut.n} does not free part ${item}.`, cut.n);
    }
  }
}
