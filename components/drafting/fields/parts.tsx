import {
  featureSchema,
  grains,
  partSchema,
  type Feature,
  type Part,
  type PlanDocument,
} from '../../../shared/plan/document';
import { nextLetter } from '../../../shared/plan/facts';
import { ListEditor } from './list-editor';
import { type ListFields } from './list-field';
import { choice, measured, one, said, text, whole } from './makers';

const runs = new Set<Feature['kind']>(['groove', 'dado', 'rabbet', 'slot', 'notch', 'chamfer']);

const featureFields = (document: PlanDocument): ListFields<Feature> => ({
  make: (id) => featureSchema.parse({ id, kind: 'hole', width: '' }),
  name: (f) => [said(f.kind), f.name].filter(Boolean).join(', '),
  fields: (f) => [
    choice('kind', 'Kind', ['hole', 'groove', 'dado', 'rabbet', 'chamfer', 'notch', 'slot']),
    text('name', 'Name'),
    choice('face', 'On the', ['front', 'back', 'left', 'right', 'top', 'bottom']),
    measured(document, 'x', 'From the left end', { needed: true }),
    measured(document, 'y', 'From the lower edge', { needed: true }),
    measured(document, 'width', f.kind === 'hole' ? 'Diameter' : 'Width', { needed: true }),
    measured(document, 'depth', 'Depth, empty for through'),
    ...(runs.has(f.kind)
      ? [
          choice<Feature, 'along'>('along', 'Runs along the part’s', ['length', 'width']),
          measured<Feature, 'length'>(document, 'length', 'Length, empty for the full run'),
        ]
      : []),
  ],
});

/** The parts of a plan, with the holes and grooves that are cut into them. */
export const partFields = (document: PlanDocument): ListFields<Part> => ({
  make: (id) =>
    partSchema.parse({
      id,
      mark: nextLetter(document.parts[document.parts.length - 1]?.mark ?? null),
      name: '',
      length: '',
      width: '',
    }),
  name: (p) => `${p.mark} ${p.name}`,
  fields: [
    text('mark', 'Mark'),
    text('name', 'Name'),
    whole('quantity', 'How many', 1000),
    measured(document, 'length', 'Length', { needed: true }),
    measured(document, 'width', 'Width', { needed: true }),
    measured(document, 'thickness', 'Thickness, if not the stock’s'),
    one(
      'stockId',
      'Cut from',
      document.stock.map((s) => ({ value: s.id, label: s.name })),
    ),
    choice('grain', 'Grain', grains),
    choice('role', 'Role', ['part', 'spare', 'test-piece', 'helper']),
    measured(document, 'allowance', 'Left on for the rough size, each way'),
    text('note', 'Note'),
    {
      key: 'features',
      draw: (part, change) => (
        <ListEditor
          level={3}
          title="Holes, grooves and the like"
          fields={featureFields(document)}
          items={part.features}
          onChange={(fn) => change((p) => ({ ...p, features: fn(p.features) }))}
        />
      ),
    },
  ],
});
