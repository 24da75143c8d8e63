import {
  planDocumentSchema,
  type PlanDocument,
  type PlanDocumentInput,
} from '../../shared/plan/document';

const idOf = (list: number, n: number): string =>
  `0190f${list.toString(16).padStart(3, '0')}-0000-7000-8000-${n.toString(16).padStart(12, '0')}`;

const dimension = (
  i: number,
  salt: number,
): NonNullable<PlanDocumentInput['dimensions']>[number] => {
  const base = { id: idOf(1, i), name: `Dimension ${i}`, symbol: `d${i}` };
  const tolerance = { form: 'plus-minus', by: '0.2 mm' } as const;
  const near = (back: number) => `d${i - (i % 10) + ((i + back) % 4)}`;
  if (i % 10 < 2)
    return { ...base, origin: 'given', expression: `${20 + (i % 300)}.${salt} mm`, tolerance };
  if (i % 10 < 4)
    return { ...base, origin: 'taken', expression: `${1 + (i % 17)} ${(salt % 15) + 1}/16 in` };
  if (i % 10 < 8)
    return { ...base, origin: 'derived', expression: `${near(0)} + ${near(1)} - ${salt}/64 in` };
  if (i % 10 === 8)
    return {
      ...base,
      origin: 'derived',
      expression: `hypot(d${i - 1}, ${near(2)}) * 2 / ${salt + 3}`,
    };
  return {
    ...base,
    origin: 'derived',
    expression: `round(max(d${i - 2}, made(${near(3)})), 0.5 mm) + 2 mm`,
  };
};

/**
 * An invented plan in blocks of ten dimensions: given, taken, derived over one another, some of them bent.
 * Another salt gives other figures in every expression.
 */
export function benchPlan(dimensions: number, salt = 1): PlanDocument {
  const count = (of: number) => Math.max(1, Math.round((dimensions * of) / 1000));
  const at = (i: number, k: number) => `d${(i * 10 + k) % dimensions}`;
  const list = <T>(n: number, make: (i: number) => T) =>
    Array.from({ length: n }, (_, i) => make(i));
  const [parts, steps, checks] = [
    Math.min(1000, count(500)),
    Math.min(400, count(200)),
    count(300),
  ];
  return planDocumentSchema.parse({
    scantling: 1,
    id: idOf(0, 0),
    title: 'A large invented plan',
    units: 'mm',
    dimensions: list(dimensions, (i) => dimension(i, salt)),
    checks: list(checks, (i) => ({
      id: idOf(2, i),
      name: `Check ${i}`,
      expression:
        i % 2
          ? `${at(i, 0)} < ${at(i, 5)} + ${400 + salt} mm`
          : `fit(${at(i, 1)}, ${at(i, 7)}, 0.${salt} mm, 900 mm)`,
    })),
    stock: [{ id: idOf(5, 0), name: 'Plywood', form: 'sheet', thickness: 'd2', sizes: [] }],
    parts: list(parts, (i) => ({
      id: idOf(3, i),
      mark: String.fromCharCode(65 + (i % 26)),
      name: `Part ${i}`,
      length: at(i, 4),
      width: `${at(i, 5)} + ${salt} mm`,
      stockId: idOf(5, 0),
    })),
    steps: list(steps, (i) => ({
      id: idOf(4, i),
      title: `Size part ${i}`,
      text: `Cut it to {{dim:${idOf(1, (i * 10 + 4) % dimensions)}}}.`,
      parts: [{ partId: idOf(3, i % parts), to: 'sized' }],
      takes: [idOf(1, (i * 10 + 2) % dimensions)],
      handsOn: 5,
    })),
  } satisfies PlanDocumentInput);
}
