import { type PlanDocumentInput, planDocumentSchema } from '../../../shared/plan/document';
import { createModel, type PlanModel } from '../../../shared/plan/model';

let next = 0;
/** An id of the right form, another each time. */
export const newId = (): string =>
  `01900000-0000-7000-8000-${(next += 1).toString(16).padStart(12, '0')}`;

export const ids = { ply: newId(), board: newId(), strip: newId() };

type Row<K extends 'parts' | 'stock' | 'hardware' | 'dimensions' | 'consumables' | 'steps'> = Omit<
  NonNullable<PlanDocumentInput[K]>[number],
  'id'
>;

export interface PlanParts {
  units?: 'mm' | 'in';
  dimensions?: Row<'dimensions'>[];
  stock?: (Row<'stock'> & { id?: string })[];
  parts?: Row<'parts'>[];
  hardware?: Row<'hardware'>[];
  consumables?: Row<'consumables'>[];
  steps?: Row<'steps'>[];
}

const withIds = <R extends object>(rows: R[] | undefined) =>
  (rows ?? []).map((row) => ({ id: newId(), ...row }));

/** A small plan, worked out. */
export function modelOf(rows: PlanParts): PlanModel {
  return createModel(
    planDocumentSchema.parse({
      scantling: 1,
      id: newId(),
      title: 'A plan for a test',
      units: rows.units ?? 'mm',
      dimensions: withIds(rows.dimensions),
      stock: withIds(rows.stock),
      parts: withIds(rows.parts),
      hardware: withIds(rows.hardware),
      consumables: withIds(rows.consumables),
      steps: withIds(rows.steps),
    }),
  );
}

export const ply = {
  id: ids.ply,
  name: 'Plywood 18',
  form: 'sheet' as const,
  thickness: '18 mm',
  kerf: '3 mm',
  grained: true,
  sizes: [{ id: newId(), length: '2440 mm', width: '1220 mm', price: 70 }],
};
export const board = {
  id: ids.board,
  name: 'Oak board',
  form: 'board' as const,
  thickness: '20 mm',
  kerf: '3 mm',
  sizes: [{ id: newId(), length: '2000 mm', width: '150 mm', price: 20 }],
};
export const strip = {
  id: ids.strip,
  name: 'Maple strip',
  form: 'strip' as const,
  thickness: '10 mm',
  kerf: '3 mm',
  sizes: [{ id: newId(), length: '1000 mm', width: '40 mm', price: 8 }],
};
