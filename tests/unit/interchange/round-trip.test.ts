import fc from 'fast-check';
import { importPlan, exportPlan } from '../../../shared/plan/interchange';
import { actionSchema, planDocumentSchema, type PlanDocument } from '../../../shared/plan/document';

const text = (max: number) => fc.string({ unit: 'grapheme', maxLength: Math.min(40, max) });
const uuid = fc.uuid({ version: 7 });
const figure = fc.oneof(
  fc.constantFrom('3 9/16"', '18 mm', '742 thou', '1½ in', 'a - 2 * kerf', ''),
  text(40),
);
const tolerance = fc.oneof(
  fc.constant({ form: 'none' as const }),
  figure.map((by) => ({ form: 'plus-minus' as const, by })),
  fc.record({ form: fc.constant('limits' as const), low: figure, high: figure }),
  fc.constant({ form: 'iso2768' as const, class: 'm' as const }),
);
const dimension = fc.record({
  id: uuid,
  name: text(40),
  symbol: text(40),
  origin: fc.constantFrom('given' as const, 'taken' as const, 'derived' as const),
  expression: figure,
  tolerance,
  where: text(40),
});
const part = fc.record({
  id: uuid,
  mark: fc.constantFrom('A', 'B', 'AA'),
  name: text(40),
  quantity: fc.integer({ min: 1, max: 1000 }),
  length: figure,
  width: figure,
  layers: fc.array(text(20), { maxLength: 3 }),
});
const action = fc
  .record({
    id: uuid,
    kind: fc.constantFrom('through-rip' as const, 'groove' as const, 'drilling' as const),
    length: figure,
    guardInstead: text(40),
    trapped: fc.boolean(),
    rpm: fc.integer({ min: 0, max: 60_000 }),
  })
  .map((cut) => actionSchema.parse({ ...cut, do: 'cut', machine: 'table-saw' }));
const step = fc.record({
  id: uuid,
  title: text(40),
  text: text(40),
  handsOn: fc.double({ min: 0.001, max: 600, noNaN: true }),
  actions: fc.array(action, { maxLength: 3 }),
  cautions: fc.array(fc.record({ id: uuid, text: text(40) }), { maxLength: 2 }),
  stretches: fc.array(
    fc.record({ start: fc.integer({ min: 0, max: 600 }), end: fc.integer({ min: 0, max: 600 }) }),
    { maxLength: 2 },
  ),
});
const plan: fc.Arbitrary<PlanDocument> = fc
  .record({
    scantling: fc.constant(1 as const),
    id: uuid,
    title: text(40),
    summary: text(40),
    units: fc.constantFrom('mm' as const, 'in' as const),
    dimensions: fc.array(dimension, { maxLength: 6 }),
    parts: fc.array(part, { maxLength: 4 }),
    steps: fc.array(step, { maxLength: 5 }),
    names: fc.array(text(40), { maxLength: 3 }),
  })
  .map((input) => planDocumentSchema.parse(input));

it('brings any plan back exactly', () => {
  fc.assert(
    fc.property(plan, (document) => {
      const file = exportPlan(document);
      const back = importPlan(JSON.parse(file));
      expect(back).toEqual({ ok: true, document });
      if (back.ok) expect(exportPlan(back.document)).toBe(file);
    }),
    { numRuns: 300 },
  );
});

it('never throws on what a file may hold, and takes nothing that is not whole', () => {
  fc.assert(
    fc.property(plan, fc.jsonValue(), fc.nat(), (document, spoilt, at) => {
      const keys = Object.keys(document);
      const result = importPlan({ ...document, [keys[at % keys.length]!]: spoilt });
      if (!result.ok) for (const fault of result.faults) expect(fault.message).not.toBe('');
      else expect(planDocumentSchema.safeParse(result.document).success).toBe(true);
    }),
    { numRuns: 300 },
  );
  fc.assert(fc.property(fc.jsonValue(), (value) => void importPlan(value)));
});
