const number = String.raw`(?:\d+(?:[ -]\d+[/⁄]\d+|[/⁄]\d+|\.\d+|\s?[¼½¾⅓⅔⅛⅜⅝⅞])?|\.\d+|[¼½¾⅓⅔⅛⅜⅝⅞])`;
const unit = String.raw`(?:[ -]?(?:mm|cm|m|in|inch|inches|ft|foot|feet|thou|milli?met(?:er|re)s?|centimet(?:er|re)s?)(?![\w/²³])|\s?["″”])`;
const figure = new RegExp(`(?<![\\w.{/"“⁄])(${number}${unit})(?![\\w"])`, 'g');

const vague =
  /(?:\b(?:about|around|roughly|some|nearly|almost|up to|approx\.?|approximately|within|circa|say|or so)|[±~≈])\s*$/i;
const orSo =
  /^\s*(?:or so|or thereabouts|per (?:second|minute|min)\b|\/\s*(?:s|min)\b|a (?:second|minute)\b)/i;
/** "4 in each side", "2 in {{part}}": a count and a preposition. */
const preposition =
  /^\s+(?:the|a|an|each|every|both|this|that|these|those|all|any|total|place|turn|your|its|their|one|two|three|four|order|sequence|¤)(?![\w-])/;
const nouns =
  'bits?|cutters?|drills?|brads?|nails?|screws?|bolts?|dowels?|pins?|chisels?|blades?|plywood|ply|mdf|osb|veneer|castors?|casters?|magnets?|washers?|nuts?|inserts?|hinges?|grit|rules?|rulers?|squares?|tapes?|clamps?|cramps?|straight ?edges?|shanks?|collets?|feelers?|gauges?|keys?|spanners?|wrench(?:es)?|sockets?|hoses?|wheels?|studs?|two.by.fours?|planes?|saws?|taps?|threads?|rods?|pipes?|chuck|tenoners?|staples?|tacks?|bearing|roundovers?|forstners?';
const between =
  '(?!(?:from|of|to|by|deep|wide|long|thick|high|apart|off|past|into|in|on|at|above|below|beyond|before|after|under|over|and|or|for|with|between|clear|proud|away|across|along|up|down)\\b)[\\w-]+\\s';
/** What follows a figure that is a name: a tool, a bit, a fastener; with another figure in between, too. */
const named = new RegExp(
  `^\\s*-?(?:\\s*[x×]\\s*${number}(?:${unit})?)?\\s*-?\\s*(?:${between}){0,2}(?:${nouns})\\b`,
  'i',
);
/** How far hands keep away is no size of the piece. */
const hands = /\b(?:hands?|fingers?|thumbs?|keep (?:clear|away|back)|stand (?:clear|back))\b/i;

export interface LooseFigure {
  /** As it stands in the text. */
  text: string;
  at: number;
}

const sentenceAround = (text: string, at: number): string => {
  const start = Math.max(text.lastIndexOf('. ', at) + 1, text.lastIndexOf('\n', at) + 1, 0);
  const end = text.slice(at).search(/[.!?](?:\s|$)|\n/);
  return text.slice(start, end < 0 ? undefined : at + end);
};

/**
 * Lengths typed in a text that are no names of tools, fasteners or materials, no rough figures ("about") and no distances
 * for hands. References do not count; counts, grits, times and speeds have no unit of length.
 */
export function looseFigures(text: string, names: readonly string[]): LooseFigure[] {
  const plain = text.replace(/\{\{(?:dim|part):[0-9a-f-]+\}\}/g, (all) => '¤'.padEnd(all.length));
  return [...plain.matchAll(figure)].flatMap((match): LooseFigure[] => {
    const said = match[1]!.trim();
    const at = match.index;
    const after = plain.slice(at + match[0].length);
    const ignored =
      names.includes(said) ||
      vague.test(plain.slice(0, at)) ||
      orSo.test(after) ||
      (/[ ]in$/.test(said) && preposition.test(after)) ||
      named.test(after) ||
      hands.test(sentenceAround(plain, at));
    return ignored ? [] : [{ text: said, at }];
  });
}
