import { type PlanModel } from '../../plan/model';

/** Surface of all parts that end in the piece, faces and edges, m². Parts whose sizes do not come out count as none. */
export function surfaceOf(model: PlanModel): number {
  let mm2 = 0;
  for (const part of model.document.parts) {
    if (part.role !== 'part') continue;
    const state = model.parts.get(part.id);
    const [l, w] = [state?.length.value?.x ?? 0, state?.width.value?.x ?? 0];
    const t = state?.thickness.value?.x ?? 0;
    mm2 += part.quantity * 2 * (l * w + l * t + w * t);
  }
  return mm2 / 1e6;
}

/** How a thing that is spread is bought: what one tin or sheet covers, m² a coat, as its label says. */
export interface Coverage {
  coats: number;
  covers: number;
}

/** Tins needed for an area, whole ones; null when the label's figure is missing. */
export const tinsFor = (area: number, { coats, covers }: Coverage): number | null =>
  covers > 0 && coats > 0 ? Math.ceil((area * coats) / covers - 1e-9) : null;
