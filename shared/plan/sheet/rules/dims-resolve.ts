import { type Finding, type Rule } from '../rule';

/** Expressions resolve, do not run in circles, and their kinds agree: dims/unknown, dims/loop, dims/kind. */
export const dimsResolve: Rule = {
  id: 'dims/unknown',
  level: 'must',
  source: 'plan model §2: an expression has a value, or the plan cannot be cut to',
  run: ({ document, model }) => {
    const worked = model();
    const dimensions = document.dimensions.flatMap((dimension): Finding[] => {
      const error = worked.dimensions.get(dimension.id)?.error;
      return error
        ? [
            {
              place: { in: 'dimensions', elementId: dimension.id },
              message: `${dimension.name}: ${error.message}`,
              cure: error.cure ?? 'Mend its expression.',
            },
          ]
        : [];
    });
    const parts = document.parts.flatMap((part): Finding[] => {
      const state = worked.parts.get(part.id);
      const error = state?.length.error ?? state?.width.error ?? state?.thickness.error;
      return error
        ? [
            {
              place: { in: 'parts', elementId: part.id },
              message: `Part ${part.mark}, ${part.name}: ${error.message}`,
              cure: error.cure ?? 'Mend its size.',
            },
          ]
        : [];
    });
    return [...dimensions, ...parts];
  },
};
