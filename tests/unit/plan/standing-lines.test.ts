import { emptyPlan, planDocumentSchema, stepSchema } from '../../../shared/plan/document';
import { checkSheet } from '../../../shared/plan/sheet';
import { standingLines } from '../../../shared/plan/standing-lines';

const id = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`;

/** A plan of steps that each work at these machines, with what each cautions. */
function planOf(steps: { machines: string[]; caution?: string; without?: string[] }[]) {
  return planDocumentSchema.parse({
    ...emptyPlan(id(1), 'Peg rail', 'mm'),
    steps: steps.map((s, i) =>
      stepSchema.parse({
        id: id(100 + i),
        title: 'Cut',
        withoutLines: s.without ?? [],
        cautions: s.caution ? [{ id: id(300 + i), text: s.caution }] : [],
        actions: s.machines.map((machine, j) => ({
          id: id(500 + i * 10 + j),
          do: 'cut',
          machine,
          kind: 'through-crosscut',
        })),
      }),
    ),
  });
}
const rules = (plan: ReturnType<typeof planOf>, step: number) =>
  standingLines(plan)
    .get(id(100 + step))
    ?.map((line) => line.rule) ?? [];
const both = ['safety/eye-ear-dust', 'safety/loose-clothing'];

describe('standing lines', () => {
  it('stand at the first step of a run with a machine, and again when the run was broken', () => {
    const plan = planOf([
      { machines: ['table-saw'] },
      { machines: ['table-saw'] },
      { machines: [] },
      { machines: ['table-saw'] },
    ]);
    expect([0, 1, 2, 3].map((i) => rules(plan, i))).toEqual([both, [], [], both]);
  });
  it('leave hand tools alone', () => {
    expect(rules(planOf([{ machines: ['hand-tool'] }]), 0)).toEqual([]);
  });
  it('are not said twice where a caution says them', () => {
    const plan = planOf([
      { machines: ['lathe'], caution: 'Face shield on. No gloves, no loose sleeves.' },
    ]);
    expect(rules(plan, 0)).toEqual([]);
  });
  it('stand where a caution asks for gloves', () => {
    const plan = planOf([{ machines: ['lathe'], caution: 'Wear gloves for the stripper.' }]);
    expect(rules(plan, 0)).toContain('safety/loose-clothing');
  });
  it('taken out are kept as such, and the check sheet says so', () => {
    const plan = planOf([{ machines: ['table-saw'], without: ['safety/eye-ear-dust'] }]);
    expect(standingLines(plan).get(id(100))?.[0]).toMatchObject({ out: true });
    expect(checkSheet(plan).rows.map((row) => row.rule)).toContain('safety/eye-ear-dust');
  });
});
