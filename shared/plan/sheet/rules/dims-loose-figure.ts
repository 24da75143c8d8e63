import { parseLength } from '../../../measure';
import { looseFigures } from '../loose-figures';
import { type Finding, type Rule } from '../rule';

/** A measurement typed in a step's text that is not a reference. */
export const dimsLooseFigure: Rule = {
  id: 'dims/loose-figure',
  level: 'should',
  source: 'plan model §7: figures in prose do not move when a reading does',
  run: ({ document, model }) =>
    document.steps.flatMap((step, i): Finding[] =>
      looseFigures(step.text, document.names).map(({ text }): Finding => {
        const read = parseLength(text.replace(/-(?=[a-z])/i, ' '), { unit: document.units });
        const worked = model();
        const same = read.ok
          ? document.dimensions.find((d) => {
              const x = worked.dimensions.get(d.id)?.value?.x;
              return x !== undefined && Math.abs(x - read.value.mm.toNumber()) < 0.005;
            })
          : undefined;
        return {
          place: { in: 'steps', elementId: step.id },
          message: same
            ? `Step ${i + 1}: ${text} is the value of ${same.symbol}.`
            : `Step ${i + 1}: ${text} is typed and differs from every dimension.`,
          cure: same
            ? `Make it a reference to ${same.symbol}.`
            : 'Make a dimension of it, refer to one, or say that it is a name.',
          mends: [
            same
              ? { do: 'reference', stepId: step.id, text, dimensionId: same.id }
              : { do: 'dimension', stepId: step.id, text },
            { do: 'name', text },
          ],
        };
      }),
    ),
};
