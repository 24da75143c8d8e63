import { type PlanDocument } from '../../shared/plan/document';
import { Figure } from '../ui/figure';
import { type RenderReference } from '../ui/prose';
import { PartMark } from '../ui/tag';
import { Text } from '../ui/text';
import { type PlanValues } from './plan-model';

/** Draws the dimensions and parts named in a step's text. */
export function referencesOf(document: PlanDocument, values: PlanValues): RenderReference {
  return function Reference({ kind, id }) {
    if (kind === 'part') {
      const part = document.parts.find((p) => p.id === id);
      return part ? (
        <Text weight={600}>
          {part.name.toLowerCase()} <PartMark letter={part.mark} />
        </Text>
      ) : (
        <Text tone="failsText">a part that is gone</Text>
      );
    }
    const figure = values.figure(id);
    if (figure) return <Figure figure={figure} weight={600} />;
    const dimension = document.dimensions.find((d) => d.id === id);
    return <Text tone="failsText">{dimension ? dimension.name : 'a dimension that is gone'}</Text>;
  };
}
