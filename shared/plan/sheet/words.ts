/** Sentences of a text, lower case. */
export const sentencesOf = (text: string): string[] =>
  text
    .toLowerCase()
    .split(/(?<=[.!?])\s+|\n+/)
    .map((s) => s.trim())
    .filter(Boolean);

const negation =
  /\b(?:no|not|never|without|don['’]t|do not|must not|cannot|avoid|instead of|rather than)\b/;

/** Does a sentence of the text say it, and not forbid it? */
export const saysSo = (text: string, what: RegExp): boolean =>
  sentencesOf(text).some((s) => what.test(s) && !negation.test(s));
