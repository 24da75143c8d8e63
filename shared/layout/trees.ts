import { Journal } from './journal';

/**
 * Cut trees in one block of integers, with a journal so that a move can be taken back.
 *
 * A tree stands for one sheet: a leaf is a part, an inner node sets its children side by side along w (axis 0) or one
 * above the other (axis 1); axes alternate. A node is as small as its children allow, so where the free space goes is
 * decided last. Every node is a slot for one more part: beside it, across its parent's axis.
 */
const stride = 8;
const parent = 0;
const first = 1;
const next = 2;
const prev = 3;
const width = 4;
const height = 5;
/** A kind for a leaf; -1 for axis 0, -2 for axis 1. */
const what = 6;
const turned = 7;
/** Fields of a sheet: record 0 is the forest's own, the sheets' records come next, then the nodes. */
const root = 0;
const bin = 1;
const limitW = 2;
const limitH = 3;
const parts = 4;
/** Of record 0: the first free node, the node after the last. */
const free = 0;
const top = 1;

/** For who walks the block. */
export const fields = { stride, parent, first, next, prev, width, height, what, turned, top };

export interface ForestSetting {
  sheets: number;
  kindW: Int32Array;
  kindH: Int32Array;
  kindArea: Float64Array;
  /** Levels at most, 0 for any number; the axis of the first, -1 for either. */
  stages: number;
  first: number;
  /** Smallest side of any part: a slot narrower than this is none. */
  least: number;
}

export class Trees {
  readonly memory: Journal;
  readonly sheets: number;
  protected readonly stale: Uint8Array;

  constructor(protected readonly setting: ForestSetting) {
    this.sheets = setting.sheets;
    this.memory = new Journal((setting.sheets + 64) * stride);
    const { cells } = this.memory;
    cells[free] = -1;
    cells[top] = setting.sheets + 1;
    this.stale = new Uint8Array(setting.sheets).fill(1);
    for (let s = 0; s < setting.sheets; s++) {
      cells[(s + 1) * stride + root] = -1;
      cells[(s + 1) * stride + bin] = -1;
    }
  }

  /** Takes back everything since a mark of the journal. */
  undo(mark = 0): void {
    this.memory.undo(mark, stride * (this.sheets + 1), (cell) => {
      const sheet = ((cell / stride) | 0) - 1;
      if (sheet >= 0) this.stale[sheet] = 1;
    });
  }

  private sheet(s: number, which: number): number {
    return this.memory.cells[(s + 1) * stride + which]!;
  }
  private putSheet(s: number, which: number, value: number): void {
    this.memory.put((s + 1) * stride + which, value);
    this.stale[s] = 1;
  }
  rootOf = (s: number): number => this.sheet(s, root);
  binOf = (s: number): number => this.sheet(s, bin);
  partsOn = (s: number): number => this.sheet(s, parts);
  limitW = (s: number): number => this.sheet(s, limitW);
  limitH = (s: number): number => this.sheet(s, limitH);

  firstOf = (node: number): number => this.memory.cells[node * stride + first]!;
  nextOf = (node: number): number => this.memory.cells[node * stride + next]!;
  whatOf = (node: number): number => this.memory.cells[node * stride + what]!;
  turnedOf = (node: number): boolean => this.memory.cells[node * stride + turned] === 1;
  widthOf = (node: number): number => this.memory.cells[node * stride + width]!;
  heightOf = (node: number): number => this.memory.cells[node * stride + height]!;

  open(s: number, which: number, w: number, h: number): void {
    this.putSheet(s, root, -1);
    this.putSheet(s, bin, which);
    this.putSheet(s, limitW, w);
    this.putSheet(s, limitH, h);
    this.putSheet(s, parts, 0);
  }
  close(s: number): void {
    this.putSheet(s, bin, -1);
  }
  /** Another height for a sheet whose tree is no higher. */
  setLimitH(s: number, h: number): void {
    this.putSheet(s, limitH, h);
  }

  private make(kind: number, w: number, h: number, rotated: number): number {
    const { memory } = this;
    let node = memory.cells[free]!;
    if (node >= 0) memory.put(free, memory.cells[node * stride + first]!);
    else {
      node = memory.cells[top]!;
      memory.put(top, node + 1);
      memory.reserve((node + 1) * stride);
    }
    const at = node * stride;
    memory.put(at + first, -1);
    memory.put(at + next, -1);
    memory.put(at + prev, -1);
    memory.put(at + width, w);
    memory.put(at + height, h);
    memory.put(at + what, kind);
    memory.put(at + turned, rotated);
    return node;
  }

  private release(node: number): void {
    const { memory } = this;
    memory.put(node * stride + first, memory.cells[free]!);
    memory.put(free, node);
  }

  /** Puts `node` where `old` hangs. */
  private replace(s: number, old: number, node: number): void {
    const { memory } = this;
    const [at, to] = [old * stride, node * stride];
    const above = memory.cells[at + parent]!;
    memory.put(to + parent, above);
    const [before, after] = [memory.cells[at + prev]!, memory.cells[at + next]!];
    memory.put(to + prev, before);
    memory.put(to + next, after);
    if (after >= 0) memory.put(after * stride + prev, node);
    if (before >= 0) memory.put(before * stride + next, node);
    else if (above >= 0) memory.put(above * stride + first, node);
    else this.putSheet(s, root, node);
  }

  private prepend(above: number, node: number): void {
    const { memory } = this;
    const head = memory.cells[above * stride + first]!;
    memory.put(node * stride + parent, above);
    memory.put(node * stride + prev, -1);
    memory.put(node * stride + next, head);
    if (head >= 0) memory.put(head * stride + prev, node);
    memory.put(above * stride + first, node);
  }

  /** Adds a part of a kind beside `node` along `axis`; -1 for an empty sheet. The slot must allow it. */
  insert(s: number, node: number, axis: number, kind: number, rotated: boolean): void {
    const { memory, setting } = this;
    const [kw, kh] = [setting.kindW[kind]!, setting.kindH[kind]!];
    const leaf = this.make(kind, rotated ? kh : kw, rotated ? kw : kh, rotated ? 1 : 0);
    this.putSheet(s, parts, this.partsOn(s) + 1);
    if (node < 0) {
      memory.put(leaf * stride + parent, -1);
      this.putSheet(s, root, leaf);
      return;
    }
    let above = node;
    if (memory.cells[node * stride + what] !== -1 - axis) {
      above = this.make(-1 - axis, this.widthOf(node), this.heightOf(node), 0);
      this.replace(s, node, above);
      this.prepend(above, node);
    }
    this.prepend(above, leaf);
    this.resize(above);
  }

  /** Grows a tree a snapshot holds on an empty sheet. */
  plant(s: number, tree: Int32Array): void {
    let at = 0;
    let count = 0;
    const grow = (): number => {
      const code = tree[at++]!;
      if (code >= 0) {
        const [kind, rotated] = [code >> 1, code & 1];
        const [w, h] = [this.setting.kindW[kind]!, this.setting.kindH[kind]!];
        count++;
        return this.make(kind, rotated === 1 ? h : w, rotated === 1 ? w : h, rotated);
      }
      const node = this.make(code, 0, 0, 0);
      this.memory.put(node * stride + parent, -1);
      for (let left = tree[at++]!; left > 0; left--) this.prepend(node, grow());
      this.resize(node);
      return node;
    };
    if (tree.length === 0) return;
    const node = grow();
    this.memory.put(node * stride + parent, -1);
    this.putSheet(s, root, node);
    this.putSheet(s, parts, count);
  }

  /** Works out the sizes of a node and of those above it, as far as they change. */
  private resize(from: number): void {
    const { memory } = this;
    let node = from;
    while (node >= 0) {
      const { cells } = memory;
      const at = node * stride;
      const along = cells[at + what] === -1;
      let [w, h] = [0, 0];
      for (let c = cells[at + first]!; c >= 0; c = cells[c * stride + next]!) {
        const [cw, ch] = [cells[c * stride + width]!, cells[c * stride + height]!];
        if (along) {
          w += cw;
          if (ch > h) h = ch;
        } else {
          h += ch;
          if (cw > w) w = cw;
        }
      }
      if (w === cells[at + width] && h === cells[at + height]) return;
      memory.put(at + width, w);
      memory.put(at + height, h);
      node = memory.cells[at + parent]!;
    }
  }

  /** Takes a node and all under it off its sheet; `freed` hears the kind of every part. */
  remove(s: number, node: number, freed: (kind: number) => void): void {
    const { memory } = this;
    const at = node * stride;
    const above = memory.cells[at + parent]!;
    if (above < 0) this.putSheet(s, root, -1);
    else {
      const [before, after] = [memory.cells[at + prev]!, memory.cells[at + next]!];
      if (after >= 0) memory.put(after * stride + prev, before);
      if (before >= 0) memory.put(before * stride + next, after);
      else memory.put(above * stride + first, after);
      this.settle(s, above);
    }
    this.putSheet(s, parts, this.partsOn(s) - this.drop(node, freed));
  }

  private drop(node: number, freed: (kind: number) => void): number {
    const { cells } = this.memory;
    const kind = cells[node * stride + what]!;
    let count = 0;
    if (kind >= 0) {
      freed(kind);
      count = 1;
    } else
      for (let c = cells[node * stride + first]!; c >= 0;) {
        const after = this.memory.cells[c * stride + next]!;
        count += this.drop(c, freed);
        c = after;
      }
    this.release(node);
    return count;
  }

  /** After a child went: an inner node with one child left gives way to it. */
  private settle(s: number, node: number): void {
    const { memory } = this;
    const only = memory.cells[node * stride + first]!;
    if (memory.cells[only * stride + next]! >= 0) {
      this.resize(node);
      return;
    }
    const above = memory.cells[node * stride + parent]!;
    if (above < 0 || memory.cells[only * stride + what]! >= 0) {
      this.replace(s, node, only);
      this.release(node);
      if (above >= 0) this.resize(above);
      return;
    }
    // An inner child has its grandparent's axis: its children move up.
    const [before, after] = [
      memory.cells[node * stride + prev]!,
      memory.cells[node * stride + next]!,
    ];
    if (after >= 0) memory.put(after * stride + prev, before);
    if (before >= 0) memory.put(before * stride + next, after);
    else memory.put(above * stride + first, after);
    for (let c = memory.cells[only * stride + first]!; c >= 0;) {
      const following = memory.cells[c * stride + next]!;
      this.prepend(above, c);
      c = following;
    }
    this.release(only);
    this.release(node);
    this.resize(above);
  }
}
