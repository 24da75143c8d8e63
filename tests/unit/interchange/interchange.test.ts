import { builtDemoPlans } from '../../../server/demo';
import { actionSchema, type PlanDocument } from '../../../shared/plan/document';
import { exportPlan, importPlan, pathText, planJsonSchema } from '../../../shared/plan/interchange';
import { idOf } from '../model/plan';

const plans = builtDemoPlans().map(({ key, built }) => [key, built.document] as const);
const board = plans[0]![1];
const faultsOf = (value: unknown) => {
  const result = importPlan(value);
  return result.ok ? [] : result.faults;
};

describe('a plan as a file', () => {
  it.each(plans)('comes back exactly: %s', (_, document) => {
    const result = importPlan(JSON.parse(exportPlan(document)));
    expect(result).toEqual({ ok: true, document });
    expect(exportPlan((result as { document: PlanDocument }).document)).toBe(exportPlan(document));
  });

  it('lists every fault with its path and takes nothing', () => {
    const broken = JSON.parse(exportPlan(board)) as {
      units: string;
      steps: { handsOn: unknown }[];
      parts: { quantity: unknown }[];
    };
    broken.units = 'ells';
    broken.steps[2]!.handsOn = 'long';
    broken.parts[1]!.quantity = -1;
    expect(faultsOf(broken).map((f) => f.path)).toEqual(
      expect.arrayContaining(['units', 'steps[2].handsOn', 'parts[1].quantity']),
    );
  });

  it('finds repeated ids and references that lead nowhere', () => {
    const twice = { ...board, parts: [...board.parts, { ...board.parts[0]!, mark: 'Z' }] };
    expect(faultsOf(twice)).toMatchObject([
      { path: `parts[${board.parts.length}].id`, code: 'id/repeated' },
    ]);
    const dead = { ...board, parts: board.parts.slice(1) };
    expect(faultsOf(dead).every((f) => f.code === 'reference/dead')).toBe(true);
    expect(faultsOf(dead).length).toBeGreaterThan(0);
  });

  it('names a reference that leads nowhere wherever it stands', () => {
    const gone = board.id;
    const first = board.steps[0]!;
    const step = {
      ...first,
      toolIds: [gone],
      photoIds: [gone],
      after: [gone],
      heard: [{ ...first.heard[0]!, dimensionId: gone }],
      actions: [
        actionSchema.parse({
          id: idOf(9, 1),
          do: 'cut',
          machine: 'drill',
          kind: 'drilling',
          partIds: [gone],
        }),
        actionSchema.parse({ id: idOf(9, 2), do: 'fasten', hardwareId: gone, intoPartId: gone }),
        actionSchema.parse({ id: idOf(9, 3), do: 'finish', consumableId: gone }),
      ],
    };
    const flow = [
      {
        id: idOf(9, 4),
        kind: 'repeat',
        fromStepId: gone,
        toStepId: first.id,
        untilCheckId: gone,
        atMost: 2,
      },
    ];
    expect(
      faultsOf({ ...board, steps: [step, ...board.steps.slice(1)], flow }).map((f) => f.path),
    ).toEqual([
      'steps[0].photoIds[0]',
      'steps[0].toolIds[0]',
      'steps[0].after[0]',
      'steps[0].heard[0].dimensionId',
      'steps[0].actions[0].partIds[0]',
      'steps[0].actions[1].hardwareId',
      'steps[0].actions[1].intoPartId',
      'steps[0].actions[2].consumableId',
      'flow[0].fromStepId',
      'flow[0].untilCheckId',
    ]);
  });

  it.each([
    ['a newer version', { ...board, scantling: 2 }, 'plan/newer'],
    ['no version', { title: 'x' }, 'plan/version'],
    ['a list', [], 'plan/not-one'],
    ['nothing', null, 'plan/not-one'],
  ])('refuses %s clearly', (_, value, code) => {
    expect(faultsOf(value)[0]?.code).toBe(code);
  });

  it('publishes a JSON Schema that names its parts', () => {
    const schema = planJsonSchema() as { properties: Record<string, unknown>; required: string[] };
    expect(Object.keys(schema.properties)).toEqual(
      expect.arrayContaining(['scantling', 'dimensions', 'steps', 'parts', 'checks']),
    );
    expect(schema.required).toEqual(expect.arrayContaining(['scantling', 'id', 'title', 'units']));
  });

  it('writes paths as they are read', () => {
    expect(pathText(['steps', 2, 'stretches', 0, 'end'])).toBe('steps[2].stretches[0].end');
  });
});
