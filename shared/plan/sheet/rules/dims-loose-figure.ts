import { parseLength } from '../../../measure';
import { atStep } from '../actions';
import { type Finding, type Rule } from '../rule';

const figure =
  /(?<![\w.{/])(\d+(?:[ -]\d+\/\d+|\/\d+|\.\d+)?\s?(?:mm|cm|in|inch|inches|ft|thou|["″]))(?![\w"])/g;
const vague = /\b(?:about|around|roughly|some|nearly|almost|up to)\s*$/i;
/** What follows a figure that is a name: a tool, a bit, a fastener. */
const named =
  /^\s*-?\s*(?:\w+\s)?(?:bits?|cutters?|drills?|brads?|nails?|screws?|bolts?|dowels?|pins?|chisels?|blades?|plywood|ply|mdf|castors?|magnets?|washers?|grit)\b/i;

/** A measurement typed in a step's text that is not a reference. */
export const dimsLooseFigure: Rule = {
  id: 'dims/loose-figure',
  level: 'should',
  source: 'plan model §7: figures in prose do not move when a reading does',
  run: ({ document, model }) =>
    document.steps.flatMap((step, i): Finding[] => {
      const text = step.text.replace(/\{\{(?:dim|part):[0-9a-f-]+\}\}/g, ' ¤ ');
      return [...text.matchAll(figure)].flatMap((match): Finding[] => {
        const said = match[1]!.trim();
        const at = match.index;
        if (
          document.names.includes(said) ||
          vague.test(text.slice(0, at)) ||
          named.test(text.slice(at + match[0].length))
        )
          return [];
        const read = parseLength(said, { unit: document.units });
        const worked = model();
        const same = read.ok
          ? document.dimensions.find((d) => {
              const x = worked.dimensions.get(d.id)?.value?.x;
              return x !== undefined && Math.abs(x - read.value.mm.toNumber()) < 0.005;
            })
          : undefined;
        return [
          atStep(
            step,
            same
              ? `Step ${i + 1}: ${said} is the value of ${same.symbol}.`
              : `Step ${i + 1}: ${said} is typed and differs from every dimension.`,
            same
              ? `Make it a reference to ${same.symbol}.`
              : 'Make a dimension of it, refer to one, or say that it is a name.',
          ),
        ];
      });
    }),
};
