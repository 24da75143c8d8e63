import { type PlanDocument } from './document';

type Named = Pick<PlanDocument, 'dimensions' | 'parts'>;

const stored = /\{\{(dim|part):([0-9a-f-]{36})\}\}/g;
const shown = /\{\{\s*(part\s+)?([A-Za-z][A-Za-z0-9_]*)\s*\}\}/g;

/** A step's text as the editor shows it: `{{runway}}` for a dimension, `{{part A}}` for a part. */
export function shownText(text: string, document: Named): string {
  return text.replace(stored, (whole, kind: string, id: string) => {
    if (kind === 'part') {
      const mark = document.parts.find((p) => p.id === id)?.mark;
      return mark ? `{{part ${mark}}}` : whole;
    }
    const symbol = document.dimensions.find((d) => d.id === id)?.symbol;
    return symbol ? `{{${symbol}}}` : whole;
  });
}

/** The text as it is stored: references by id. What names nothing stays as it was typed. */
export function storedText(text: string, document: Named): string {
  return text.replace(shown, (whole, part: string | undefined, name: string) => {
    const id = part
      ? document.parts.find((p) => p.mark === name)?.id
      : document.dimensions.find((d) => d.symbol === name)?.id;
    return id ? `{{${part ? 'part' : 'dim'}:${id}}}` : whole;
  });
}

/** Names in double braces that stand for nothing in the plan. */
export function looseNames(text: string): string[] {
  return [...text.matchAll(shown)].map((m) => `${m[1] ? 'part ' : ''}${m[2] ?? ''}`);
}
