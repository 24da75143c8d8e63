import { type Cut, type GuardItem, type PlanDocument, type Step } from '../document';

/** How an item of a machine stands before a cut. */
export type GuardStanding = 'on' | 'lowered' | 'off';
export type Guards = ReadonlyMap<string, GuardStanding>;

export const guardKey = (machine: string, item: GuardItem): string => `${machine}/${item}`;

/** A cut and how the guards stand when it is made. */
export interface GuardedCut {
  cut: Cut;
  step: Step;
  number: number;
  guards: Guards;
}

export interface GuardWalk {
  cuts: GuardedCut[];
  /** What is not back on when the plan ends, with the step that last changed it. */
  left: { machine: string; item: GuardItem; standing: GuardStanding; step: Step }[];
}

interface Change {
  machine: string;
  item: GuardItem;
  standing: GuardStanding;
  step: Step;
}
type State = ReadonlyMap<string, Change>;

const order = { off: 0, lowered: 1, on: 2 } as const;

/** After alternatives nobody knows which group was taken: the least guarded standing counts. */
function worstOf(states: State[]): State {
  const merged = new Map<string, Change>();
  for (const state of states) {
    for (const [key, change] of state) {
      const known = merged.get(key);
      const others = states.every((s) => s.has(key));
      if (!known || order[change.standing] < order[known.standing]) {
        // A group that does not touch it leaves it as it was: on, unless said before.
        if (change.standing !== 'on' || others) merged.set(key, change);
      }
    }
  }
  return merged;
}

/** Walks one step from a state. */
function walkStep(step: Step, number: number, before: State, cuts: GuardedCut[]): State {
  const state = new Map(before);
  for (const action of step.actions) {
    if (action.do === 'guard') {
      const standing = action.to === 'back-on' ? 'on' : action.to;
      state.set(guardKey(action.machine, action.item), {
        machine: action.machine,
        item: action.item,
        standing,
        step,
      });
    } else if (action.do === 'cut') {
      const guards = new Map([...state].map(([key, change]) => [key, change.standing] as const));
      cuts.push({ cut: action, step, number, guards });
    }
  }
  return state;
}

/**
 * The guards as a state machine over the steps in order. Groups of alternatives start from the same state and
 * meet at their worst; a repeated stretch is walked twice, so that its second round starts as its first ended.
 */
export function walkGuards(document: PlanDocument): GuardWalk {
  const cuts: GuardedCut[] = [];
  const groupOf = new Map<string, { flow: string; group: string; groups: readonly string[] }>();
  for (const flow of document.flow) {
    if (flow.kind !== 'alternatives') continue;
    const groups = flow.groups.map((group) => group.id);
    for (const group of flow.groups)
      for (const id of group.stepIds) groupOf.set(id, { flow: flow.id, group: group.id, groups });
  }
  let state: State = new Map();
  let branch: { flow: string; start: State; ends: Map<string, State> } | null = null;
  // A group without steps here leaves everything as it was, so every group's end is its start at first.
  const close = () => {
    if (branch) state = worstOf([...branch.ends.values()]);
    branch = null;
  };
  const visit = (step: Step, number: number) => {
    const at = groupOf.get(step.id);
    if (!at) {
      close();
      state = walkStep(step, number, state, cuts);
      return;
    }
    if (branch?.flow !== at.flow) {
      close();
      const start = state;
      branch = { flow: at.flow, start, ends: new Map(at.groups.map((g) => [g, start])) };
    }
    const from = branch.ends.get(at.group) ?? branch.start;
    branch.ends.set(at.group, walkStep(step, number, from, cuts));
  };
  document.steps.forEach((step, i) => {
    visit(step, i + 1);
    for (const flow of document.flow) {
      if (flow.kind !== 'repeat' || flow.toStepId !== step.id) continue;
      const first = document.steps.findIndex((s) => s.id === flow.fromStepId);
      if (first >= 0) for (let n = first; n <= i; n += 1) visit(document.steps[n]!, n + 1);
    }
  });
  close();
  const left = [...state.values()].filter((c) => c.standing !== 'on');
  return { cuts, left };
}
