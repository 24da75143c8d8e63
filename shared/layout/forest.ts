import { fields, Trees, type ForestSetting } from './trees';

const { stride, parent, first, next, width, height, what, top } = fields;

/** A sheet's nodes, parent first, and its slots; derived, rebuilt when the sheet has changed. */
export interface Slots {
  nodes: Int32Array;
  count: number;
  /** Node a slot composes with, -1 on an empty sheet. */
  node: Int32Array;
  axis: Uint8Array;
  /** Largest part that goes in. */
  w: Int32Array;
  h: Int32Array;
  /** What the node takes across the axis already. */
  have: Int32Array;
  slots: number;
}

const slotsOf = (size: number): Slots => ({
  nodes: new Int32Array(size),
  count: 0,
  node: new Int32Array(size + 2),
  axis: new Uint8Array(size + 2),
  w: new Int32Array(size + 2),
  h: new Int32Array(size + 2),
  have: new Int32Array(size + 2),
  slots: 0,
});

/** Cut trees with the slots of each sheet. */
export class Forest extends Trees {
  private readonly slots: Slots[] = [];
  private readonly used: Float64Array;
  private roomW = new Int32Array(64);
  private roomH = new Int32Array(64);
  private depth = new Int32Array(64);

  constructor(setting: ForestSetting) {
    super(setting);
    this.used = new Float64Array(setting.sheets);
    for (let s = 0; s < setting.sheets; s++) this.slots.push(slotsOf(16));
  }

  /** Area of the parts on a sheet. */
  usedOn(s: number): number {
    if (this.stale[s] === 1) this.refresh(s);
    return this.used[s]!;
  }
  slotsOn(s: number): Slots {
    if (this.stale[s] === 1) this.refresh(s);
    return this.slots[s]!;
  }

  private grow(slots: Slots, size: number): Slots {
    const longer = slotsOf(size * 2);
    longer.nodes.set(slots.nodes);
    return longer;
  }

  /** Lists a sheet's nodes with the room each has, and its slots. */
  private refresh(s: number): void {
    this.stale[s] = 0;
    const { cells } = this.memory;
    const most = 2 * this.partsOn(s) + 1;
    let slots = this.slots[s]!;
    if (most > slots.nodes.length) this.slots[s] = slots = this.grow(slots, most);
    const nodesEver = cells[top]!;
    if (nodesEver > this.roomW.length) {
      this.roomW = new Int32Array(nodesEver * 2);
      this.roomH = new Int32Array(nodesEver * 2);
      this.depth = new Int32Array(nodesEver * 2);
    }
    slots.count = 0;
    slots.slots = 0;
    this.used[s] = 0;
    const r = this.rootOf(s);
    if (r < 0) {
      this.addSlot(slots, -1, 0, this.limitW(s), this.limitH(s), 0);
      return;
    }
    this.walk(s, r, slots);
  }

  private walk(s: number, r: number, slots: Slots): void {
    const { cells } = this.memory;
    const { roomW, roomH, depth } = this;
    const { kindArea, stages } = this.setting;
    const { nodes } = slots;
    nodes[0] = r;
    roomW[r] = this.limitW(s);
    roomH[r] = this.limitH(s);
    depth[r] = this.rootDepth(r);
    let count = 1;
    let area = 0;
    for (let i = 0; i < count; i++) {
      const node = nodes[i]!;
      const at = node * stride;
      const kind = cells[at + what]!;
      const [rw, rh, level] = [roomW[node]!, roomH[node]!, depth[node]!];
      if (i > 0 && (stages === 0 || level < stages || kind < 0))
        this.across(slots, node, cells[cells[at + parent]! * stride + what]!, rw, rh);
      if (kind >= 0) {
        area += kindArea[kind]!;
        continue;
      }
      const spareW = kind === -1 ? rw - cells[at + width]! : -1;
      const spareH = kind === -2 ? rh - cells[at + height]! : -1;
      // Of a strip as wide as the sheet only single parts may take the whole width: else it is no strip.
      const shy = i === 0 && level === 1 ? 1 : 0;
      for (let c = cells[at + first]!; c >= 0; c = cells[c * stride + next]!) {
        roomW[c] = spareW < 0 ? rw - shy : cells[c * stride + width]! + spareW;
        roomH[c] = spareH < 0 ? rh - shy : cells[c * stride + height]! + spareH;
        depth[c] = level + 1;
        nodes[count++] = c;
      }
    }
    slots.count = count;
    this.used[s] = area;
    this.rootSlots(s, r, slots);
  }

  /** A root of the second stage's axis counts as one strip of the first. */
  private rootDepth(r: number): number {
    const kind = this.whatOf(r);
    const { first: axis } = this.setting;
    return axis >= 0 && kind < 0 && kind !== -1 - axis ? 1 : 0;
  }

  private across(slots: Slots, node: number, above: number, rw: number, rh: number): void {
    const { cells } = this.memory;
    const [w, h] = [cells[node * stride + width]!, cells[node * stride + height]!];
    if (above === -1) this.addSlot(slots, node, 1, rw, rh - h, w);
    else this.addSlot(slots, node, 0, rw - w, rh, h);
  }

  private rootSlots(s: number, r: number, slots: Slots): void {
    const { stages, first: axis } = this.setting;
    const [W, H, w, h] = [this.limitW(s), this.limitH(s), this.widthOf(r), this.heightOf(r)];
    const kind = this.whatOf(r);
    const levels = stages === 0 || kind >= 0 ? 0 : this.levelsOn(slots);
    for (let a = 0; a < 2; a++) {
      const same = kind >= 0 || kind === -1 - a;
      // Around the root: one level more, and the new first stage must be the wished one.
      if (
        !same &&
        ((axis >= 0 && a !== axis) ||
          (stages > 0 && levels + 1 > stages && !(axis >= 0 && this.rootDepth(r) === 1)))
      )
        continue;
      if (a === 0) this.addSlot(slots, r, 0, W - w, H, h);
      else this.addSlot(slots, r, 1, W, H - h, w);
    }
  }

  private levelsOn(slots: Slots): number {
    let most = 0;
    for (let i = 0; i < slots.count; i++) most = Math.max(most, this.depth[slots.nodes[i]!]!);
    return most;
  }

  private addSlot(
    slots: Slots,
    node: number,
    axis: number,
    w: number,
    h: number,
    have: number,
  ): void {
    if (w < this.setting.least || h < this.setting.least) return;
    const i = slots.slots++;
    slots.node[i] = node;
    slots.axis[i] = axis;
    slots.w[i] = w;
    slots.h[i] = h;
    slots.have[i] = have;
  }
}
