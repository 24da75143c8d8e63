/** What a page's head says to readers of links and to search engines. Plain text; escaped here. */
export interface PageHead {
  title: string;
  description: string;
  /** Absolute address of a picture. */
  image?: string;
  /** An object of schema.org, as JSON-LD. */
  jsonLd?: unknown;
}

const escapes: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };
const escapeHtml = (text: string) => text.replace(/[&<>"]/g, (sign) => escapes[sign] ?? sign);
const meta = (kind: 'name' | 'property', key: string, value: string) =>
  `<meta ${kind}="${key}" content="${escapeHtml(value)}"/>`;

/**
 * Puts a title, description, Open Graph tags and JSON-LD into a pre-rendered page. The tags carry
 * no `data-rh`: hydration would take those away.
 */
export function injectHead(html: string, head: PageHead): string {
  const tags = [
    meta('name', 'description', head.description),
    meta('property', 'og:title', head.title),
    meta('property', 'og:description', head.description),
    meta('property', 'og:type', 'article'),
    meta('property', 'og:site_name', 'Scantling'),
    ...(head.image === undefined ? [] : [meta('property', 'og:image', head.image)]),
    ...(head.jsonLd === undefined
      ? []
      : // A `</script>` in a plan's text must not end the element.
        [
          `<script type="application/ld+json">${JSON.stringify(head.jsonLd).replaceAll('<', '\\u003c')}</script>`,
        ]),
  ].join('');
  const title = `<title data-rh="true">${escapeHtml(head.title)}</title>`;
  // Replacer functions: a `$` in a title is no pattern.
  const titled = /<title[^>]*>[^<]*<\/title>/.test(html)
    ? html.replace(/<title[^>]*>[^<]*<\/title>/, () => title)
    : html.replace('</head>', () => `${title}</head>`);
  return titled
    .replace(/<meta[^>]*name="description"[^>]*>/g, '')
    .replace('</head>', () => `${tags}</head>`);
}
