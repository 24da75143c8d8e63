/** One pre-rendered page: its file in the export and the address pattern it answers. */
export interface WebPage {
  /** Path of the file under the export, with `/`: `plans/[slug].html`. */
  file: string;
  /** Address segments: `plans`, `[slug]`, `[...rest]`. */
  segments: string[];
}

const isGroup = (segment: string) => /^\(.*\)$/.test(segment);
const isRest = (segment: string) => segment.startsWith('[...');
const isDynamic = (segment: string) => segment.startsWith('[');

function toPage(file: string): WebPage {
  const names = file
    .replace(/\.html$/, '')
    .split('/')
    .filter((segment) => !isGroup(segment));
  if (names.at(-1) === 'index') names.pop();
  return { file, segments: names };
}

// Fixed words win over a parameter, a parameter over the rest; then a file outside a group wins.
function weight(page: WebPage): string {
  const kinds = page.segments.map((segment) =>
    isRest(segment) ? '2' : isDynamic(segment) ? '1' : '0',
  );
  return `${kinds.join('')}${page.file.includes('(') ? 'z' : 'a'}`;
}

/** The pages of an export, the most particular first. `files` are paths as in `WebPage.file`. */
export function webPages(files: string[]): WebPage[] {
  return files
    .filter((file) => file.endsWith('.html') && !/(^|\/)\+/.test(file))
    .map(toPage)
    .sort((a, b) => (weight(a) < weight(b) ? -1 : 1));
}

function fits(page: WebPage, segments: string[]): boolean {
  const last = page.segments.at(-1);
  const open = last !== undefined && isRest(last);
  if (open ? segments.length < page.segments.length : segments.length !== page.segments.length) {
    return false;
  }
  return page.segments.every((segment, index) => isDynamic(segment) || segment === segments[index]);
}

/** The page that answers a decoded path such as `/plans/step-stool`, if any. */
export function findPage(pages: WebPage[], path: string): WebPage | undefined {
  const segments = path.split('/').slice(1);
  if (segments.length === 1 && segments[0] === '') segments.pop();
  if (segments.includes('')) return undefined;
  return pages.find((page) => fits(page, segments));
}
