import { shankDiameter } from '../../trade/screws';
import { type Fasten, type Hardware, type PlanDocument } from '../document';
import { type PlanModel, type Stack } from '../model';
import { actionsOf, mm, type Placed } from './actions';

/** A screw or brad through one piece into another, in mm. */
export interface Driven extends Placed<Fasten> {
  item: Hardware;
  length: number;
  through: number;
  into: number | null;
  /** ± on length less both thicknesses, everything at its worst. */
  slack: number;
}

/** Shank diameter, mm: as listed, or by number and series; numbers in an inch plan are US. Null when it is not known. */
export function shankOf(item: Hardware, document: PlanDocument, model: PlanModel): number | null {
  const listed = item.diameter ? mm(model, item.diameter) : null;
  if (listed !== null) return listed;
  const series = item.series ?? (document.units === 'in' ? 'us' : undefined);
  return item.gauge && series ? shankDiameter(item.gauge, series) : null;
}

/** Every screw and brad whose length and first piece can be worked out. */
export function drivenOf(document: PlanDocument, model: PlanModel): Driven[] {
  const stackOf = (text: string, partId: string | undefined): Stack | null =>
    text.trim() !== ''
      ? model.evaluate(text).value
      : ((partId ? model.parts.get(partId)?.thickness.value : null) ?? null);
  return actionsOf(document, 'fasten').flatMap((placed): Driven[] => {
    const { action } = placed;
    const item = document.hardware.find((h) => h.id === action.hardwareId);
    if (!item?.length || (item.kind !== 'screw' && item.kind !== 'brad')) return [];
    const length = model.evaluate(item.length).value;
    const through = stackOf(action.throughThickness, action.throughPartId);
    const into = stackOf(action.intoThickness, action.intoPartId);
    if (!length || !through) return [];
    return [
      {
        ...placed,
        item,
        length: length.x,
        through: through.x,
        into: into?.x ?? null,
        slack: length.worst + through.worst + (into?.worst ?? 0),
      },
    ];
  });
}
