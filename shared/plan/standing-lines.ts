import { eyeEarDust, looseClothing } from '../trade/standing-lines.data';
import { type MachineClass, type PlanDocument, type Step } from './document';
import { turns } from './sheet/actions';

/** A line the product writes into a step, by the rule that watches over it. */
export interface StandingLine {
  rule: 'safety/eye-ear-dust' | 'safety/loose-clothing';
  text: string;
  /** The creator took it out. */
  out: boolean;
}

/** Machine classes a step works with: by its cuts and its tools. */
function machinesOf(
  step: Step,
  tools: ReadonlyMap<string, MachineClass>,
): ReadonlySet<MachineClass> {
  const used = new Set<MachineClass>();
  for (const action of step.actions) if (action.do === 'cut') used.add(action.machine);
  for (const id of step.toolIds) {
    const machine = tools.get(id);
    if (machine) used.add(machine);
  }
  return used;
}

const said = {
  'safety/eye-ear-dust': /\b(?:eyes?|goggles|safety glasses|face shield)\b/i,
  'safety/loose-clothing':
    /\bno (?:gloves|loose|jewel)|\bsleeves up\b|\broll\w* up\b.*\bsleeves|\bhair (?:tied|back)/i,
} as const;

/**
 * The lines that stand in a plan's steps, by step id. A line is written at the first step of a run of steps with the same
 * machine, unless the step's own cautions say it already.
 */
export function standingLines(document: PlanDocument): ReadonlyMap<string, StandingLine[]> {
  const known = written.get(document);
  if (known) return known;
  const lines = writeLines(document);
  written.set(document, lines);
  return lines;
}

/** Documents are never changed in place, and every step of a screen asks. */
const written = new WeakMap<PlanDocument, ReadonlyMap<string, StandingLine[]>>();

function writeLines(document: PlanDocument): ReadonlyMap<string, StandingLine[]> {
  const tools = new Map(document.tools.map((t) => [t.id, t.machine]));
  const lines = new Map<string, StandingLine[]>();
  let before: ReadonlySet<MachineClass> = new Set();
  for (const step of document.steps) {
    const now = machinesOf(step, tools);
    const begun = [...now].filter((machine) => !before.has(machine));
    before = now;
    const cautions = step.cautions.map((c) => c.text).join(' ');
    const here: StandingLine[] = [];
    const write = (rule: StandingLine['rule'], text: string) => {
      if (text !== '' && !said[rule].test(cautions))
        here.push({ rule, text, out: step.withoutLines.includes(rule) });
    };
    // One line for several machines: the one that asks for most.
    const words = begun.map((machine) => eyeEarDust[machine]);
    write(
      'safety/eye-ear-dust',
      words.reduce((a, b) => (b.length > a.length ? b : a), ''),
    );
    write('safety/loose-clothing', begun.some(turns) ? looseClothing : '');
    if (here.length > 0) lines.set(step.id, here);
  }
  return lines;
}
