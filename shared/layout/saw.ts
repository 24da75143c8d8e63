import { machineAllows } from './machine';
import { noTrims, usableOf } from './problem';
import { type Cut, type Frees, type LaidSheet, type Options, type Rect, type Sheet } from './types';

/** A cut tree in the job's units, kerfs between children not counted in their sizes. */
export interface Plan {
  w: number;
  h: number;
  /** Of an inner node: its children lie side by side along this axis. */
  axis?: 'x' | 'y';
  children?: Plan[];
  /** Of a leaf: its part; `parts` where it is a block that was laid out before. */
  item?: number;
  rotated?: boolean;
}

interface Task {
  id: number;
  rect: Rect;
  node: Plan;
  /** Children still to be cut off, once the piece has its node's size across. */
  queue: Plan[] | null;
  level: number;
  next: Step | null;
}

interface Step {
  axis: 'x' | 'y';
  setting: number;
  near: { node: Plan; queue: Plan[] | null } | null;
  far: { node: Plan; queue: Plan[] } | null;
}

const along = (size: { w: number; h: number }, axis: 'x' | 'y'): number =>
  axis === 'x' ? size.w : size.h;

interface Bench {
  kerf: number;
  options: Options;
  first: 'x' | 'y' | null;
  limited: boolean;
  /** The full-width offcut on top comes first. */
  strip: boolean;
}

/** Largest first, equal ones together. */
const inOrder = (children: Plan[], axis: 'x' | 'y'): Plan[] =>
  [...children].sort((a, b) => along(b, axis) - along(a, axis));

function trimSteps(task: Task, bench: Bench, root: boolean): Step[] {
  const { rect, node } = task;
  const [spareX, spareY] = [rect.w - node.w, rect.h - node.h];
  const step = (axis: 'x' | 'y'): Step => ({
    axis,
    setting: along(node, axis),
    near: { node, queue: null },
    far: null,
  });
  const gain = (spare: number, across: number) => Math.max(0, spare - bench.kerf) * across;
  const steps: Step[] = [];
  if (spareX > 0) steps.push(step('x'));
  if (spareY > 0) steps.push(step('y'));
  const onTop = root && bench.strip && gain(spareY, rect.w) > 0;
  if (onTop || gain(spareY, rect.w) >= gain(spareX, rect.h)) steps.reverse();
  const { first } = bench;
  if (root && first !== null) {
    // The first stage is the wished one: where the node cuts that way itself, it begins.
    if (node.axis === first) return [];
    return [...steps].sort((a, b) => Number(b.axis === first) - Number(a.axis === first));
  }
  return bench.limited && node.axis !== undefined ? [] : steps;
}

function chainSteps(task: Task): Step[] {
  const { node, queue } = task;
  const axis = node.axis ?? 'x';
  const steps: Step[] = [];
  for (let i = 0; queue && i < queue.length; i++) {
    if (i > 0 && along(queue[i]!, axis) === along(queue[i - 1]!, axis)) continue;
    steps.push({
      axis,
      setting: along(queue[i]!, axis),
      near: { node: queue[i]!, queue: null },
      far: { node, queue: [...queue.slice(0, i), ...queue.slice(i + 1)] },
    });
  }
  return steps;
}

/** The next cut of a piece; null when it is done, false when the machine cannot. */
function nextStep(task: Task, bench: Bench, root: boolean): Step | null | false {
  for (;;) {
    const { rect, node } = task;
    if (task.queue === null) {
      if (node.axis === undefined && rect.w === node.w && rect.h === node.h) return null;
      const steps = trimSteps(task, bench, root);
      if (steps.length > 0) return allowed(steps, task, bench);
      task.queue = inOrder(node.children ?? [], node.axis ?? 'x');
    }
    const [head] = task.queue;
    const axis = node.axis ?? 'x';
    if (head !== undefined && task.queue.length === 1 && along(head, axis) === along(rect, axis)) {
      task.node = head;
      task.queue = null;
      root = false;
      continue;
    }
    return allowed(chainSteps(task), task, bench);
  }
}

function allowed(steps: Step[], task: Task, bench: Bench): Step | false {
  const { rect } = task;
  const { machine } = bench.options;
  const good = steps.find((s) =>
    machineAllows(machine, rect, s.axis, s.setting, along(rect, s.axis) - s.setting - bench.kerf),
  );
  return good ?? false;
}

/** Cuts a sheet as its plan says. */
class Saw {
  readonly sheet: LaidSheet;
  private pieces = 1;
  private tasks: Task[] = [];

  constructor(
    bin: number,
    private readonly bench: Bench,
  ) {
    this.sheet = { bin, placements: [], cuts: [], offcuts: [] };
  }

  private record(
    piece: number,
    axis: 'x' | 'y',
    at: number,
    rest: Omit<Cut, 'n' | 'piece' | 'axis' | 'at' | 'same'>,
  ): void {
    const { cuts } = this.sheet;
    const before = cuts[cuts.length - 1];
    const same = before !== undefined && before.axis === axis && before.setting === rest.setting;
    cuts.push({ n: cuts.length + 1, piece, axis, at, ...rest, same });
  }

  /** Takes the trims off; what is left is returned. */
  trim(sheet: Sheet): { id: number; rect: Rect } {
    const { left, right, bottom, top } = sheet.trims ?? noTrims;
    let [id, rect] = [0, { x: 0, y: 0, w: sheet.w, h: sheet.h }];
    const cut = (axis: 'x' | 'y', take: number, atStart: boolean) => {
      if (take <= 0) return;
      const size = along(rect, axis);
      const kerf = Math.min(this.bench.kerf, take);
      const setting = atStart ? take - kerf : size - take;
      const waste = take - kerf > 0 ? this.pieces++ : null;
      const kept = this.pieces++;
      const start = axis === 'x' ? rect.x : rect.y;
      const frees: Frees = { kind: atStart ? 'trim' : 'piece' };
      const [near, far] = atStart ? [waste, kept] : [kept, waste];
      this.record(id, axis, start + setting, { setting, kerf, near, far, frees });
      id = kept;
      const move = atStart ? take : 0;
      rect =
        axis === 'x'
          ? { ...rect, x: rect.x + move, w: size - take }
          : { ...rect, y: rect.y + move, h: size - take };
    };
    cut('x', left, true);
    cut('y', bottom, true);
    cut('x', right, false);
    cut('y', top, false);
    return { id, rect };
  }

  /** Cuts the whole plan out of a piece; false where the machine cannot. */
  run(id: number, rect: Rect, node: Plan): boolean {
    if (!this.add({ id, rect, node, queue: null, level: 0, next: null }, true)) return false;
    while (this.tasks.length > 0) if (!this.cut(this.take())) return false;
    return true;
  }

  private add(task: Task, root: boolean): boolean {
    const step = nextStep(task, this.bench, root);
    if (step === false) return false;
    if (step !== null) {
      task.next = step;
      this.tasks.push(task);
      return true;
    }
    const { x, y, w, h } = task.rect;
    const { item = -1, rotated = false } = task.node;
    this.sheet.placements.push({ item, x, y, w, h, rotated });
    return true;
  }

  /** The piece to cut next: one for the fence as it stands, else of the earliest stage the widest. */
  private take(): Task {
    const { tasks } = this;
    const before = this.sheet.cuts[this.sheet.cuts.length - 1];
    let best = 0;
    for (let i = 0; i < tasks.length; i++) {
      const step = tasks[i]!.next!;
      if (before?.axis === step.axis && before.setting === step.setting) {
        best = i;
        break;
      }
      const [task, top] = [tasks[i]!, tasks[best]!];
      if (task.level < top.level || (task.level === top.level && step.setting > top.next!.setting))
        best = i;
    }
    const task = tasks[best]!;
    tasks[best] = tasks[tasks.length - 1]!;
    tasks.pop();
    return task;
  }

  private cut(task: Task): boolean {
    const { rect, next } = task;
    if (next === null) return true;
    const { axis, setting } = next;
    const size = along(rect, axis);
    const kerf = Math.min(this.bench.kerf, size - setting);
    const restSize = size - setting - kerf;
    const near = this.pieces++;
    const far = restSize > 0 ? this.pieces++ : null;
    const start = axis === 'x' ? rect.x : rect.y;
    const nearRect = axis === 'x' ? { ...rect, w: setting } : { ...rect, h: setting };
    const moved = setting + kerf;
    const farRect =
      axis === 'x'
        ? { ...rect, x: rect.x + moved, w: restSize }
        : { ...rect, y: rect.y + moved, h: restSize };
    const node = next.near?.node ?? task.node;
    const level = task.level + 1;
    const part = node.axis === undefined && nearRect.w === node.w && nearRect.h === node.h;
    const frees: Frees = part ? { kind: 'part', item: node.item ?? -1 } : { kind: 'piece' };
    this.record(task.id, axis, start + setting, { setting, kerf, near, far, frees });
    const queue = next.far?.queue ?? [];
    if (far !== null && queue.length === 0) this.leave(farRect);
    else if (
      far !== null &&
      !this.add(
        { id: far, rect: farRect, node: task.node, queue, level: task.level, next: null },
        false,
      )
    )
      return false;
    return this.add({ id: near, rect: nearRect, node, queue: null, level, next: null }, false);
  }

  private leave(rect: Rect): void {
    const least = Math.max(1, this.bench.kerf);
    if (rect.w >= least && rect.h >= least) this.sheet.offcuts.push(rect);
  }
}

/** Lays a plan out on its sheet with every cut in order; null where the machine's limits do not allow it. */
export function sawSheet(
  plan: Plan,
  bin: number,
  sheet: Sheet,
  kerf: number,
  options: Options = {},
  strip = false,
): LaidSheet | null {
  const first = options.firstCut === undefined ? null : options.firstCut === 'rip' ? 'y' : 'x';
  const saw = new Saw(bin, { kerf, options, first, limited: options.stages !== undefined, strip });
  const { id, rect } = saw.trim(sheet);
  if (rect.w !== usableOf(sheet).w) return null;
  return saw.run(id, rect, plan) ? saw.sheet : null;
}
