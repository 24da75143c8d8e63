import { type Part, type PlanDocument } from '../../plan/document';
import { type PlanModel, type SizeState } from '../../plan/model';
import { type CutRow } from './types';

/** What a size that cannot be worked out says. */
function faultOf(part: Part, sizes: readonly SizeState[]): string | null {
  const broken = sizes.find((size) => size.error !== null)?.error;
  if (!broken) return null;
  return `${part.mark}, ${part.name}: its ${broken.in} does not come out. ${broken.message}`;
}

function stepsOf(document: PlanDocument, partId: string): CutRow['steps'] {
  return document.steps.flatMap((step, i) =>
    step.parts
      .filter((entry) => entry.partId === partId)
      .map(({ to }) => ({ number: i + 1, stepId: step.id, to })),
  );
}

/** Length and width with the part's allowance; null where it has none. */
function roughOf(model: PlanModel, part: Part, length: number | null, width: number | null) {
  const by = part.allowance.trim() === '' ? 0 : (model.evaluate(part.allowance).value?.x ?? 0);
  return by > 0 && length !== null && width !== null
    ? { length: length + by, width: width + by }
    : null;
}

function rowOf(model: PlanModel, part: Part): CutRow {
  const { document } = model;
  const state = model.parts.get(part.id);
  const [length, width, thickness] = [state?.length, state?.width, state?.thickness].map((size) =>
    size?.error ? null : (size?.value?.x ?? null),
  );
  const sizes = state ? [state.length, state.width, state.thickness] : [];
  return {
    partId: part.id,
    mark: part.mark,
    name: part.name,
    role: part.role,
    quantity: part.quantity,
    length: length ?? null,
    width: width ?? null,
    thickness: thickness ?? null,
    rough: roughOf(model, part, length ?? null, width ?? null),
    stockId: part.stockId ?? null,
    stock: document.stock.find((s) => s.id === part.stockId)?.name ?? '',
    grain: part.grain,
    steps: stepsOf(document, part.id),
    fault: faultOf(part, sizes),
  };
}

/** Every part of a plan as a line of the cut list, spares, test pieces and helpers included, in the plan's order. */
export const cutList = (model: PlanModel): CutRow[] =>
  model.document.parts.map((part) => rowOf(model, part));
