import { Marked, type Token, type Tokens, type TokensList } from 'marked';

/** `{{dim:runway}}` or `{{part:B}}` in running text: a thing of the plan, not a loose figure. */
export interface ReferenceToken extends Tokens.Generic {
  type: 'reference';
  raw: string;
  kind: 'dim' | 'part';
  id: string;
}

const marker = /^\{\{(dim|part):([^{}\n]+)\}\}/;

const parser = new Marked({ gfm: true });
parser.use({
  extensions: [
    {
      name: 'reference',
      level: 'inline',
      start: (src) => {
        const at = src.search(/\{\{(dim|part):/);
        return at < 0 ? undefined : at;
      },
      tokenizer(src) {
        const m = marker.exec(src);
        if (!m) return undefined;
        return { type: 'reference', raw: m[0], kind: m[1], id: (m[2] ?? '').trim() };
      },
    },
  ],
});

/** Markdown as tokens. Raw HTML stays a token the renderer prints as text. */
export const proseTokens = (markdown: string): TokensList => parser.lexer(markdown);

export const isReference = (token: Token): token is ReferenceToken => token.type === 'reference';

/** Addresses a reader may be sent to; anything else is printed as text. */
export function safeHref(href: string): string | null {
  const trimmed = href.trim();
  return /^(https?:\/\/|mailto:)[^\s]+$/i.test(trimmed) ? trimmed : null;
}
