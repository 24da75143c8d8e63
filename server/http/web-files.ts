import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join, sep } from 'node:path';
import { type Request, type Response } from 'express';
import { webPages, type WebPage } from './web-routes';

/** What is known of an export at start: nothing outside this list is ever read. */
export interface WebExport {
  dir: string;
  /** Paths with `/`, without a leading one. */
  files: Set<string>;
  pages: WebPage[];
  html: Map<string, string>;
}

// Metro's names carry 32 hex digits; our fonts and icons carry a version.
const hashed = /^_expo\/static\/.*|[.-][0-9a-f]{32}(@\dx)?\.\w+$|\.v\d+\.\w+$/;

/** Lists and reads the HTML of an export; empty when it has not been built. */
export function readExport(dir: string): WebExport {
  const names = existsSync(dir) ? readdirSync(dir, { recursive: true, encoding: 'utf8' }) : [];
  const files = names
    .map((name) => name.split(sep).join('/'))
    .filter((name) => !/(^|\/)\./.test(name) && statSync(join(dir, name)).isFile());
  const html = files.filter((file) => file.endsWith('.html'));
  return {
    dir,
    files: new Set(files),
    pages: webPages(html),
    html: new Map(html.map((file) => [file, readFileSync(join(dir, file), 'utf8')])),
  };
}

export type Encoding = 'br' | 'gzip' | null;
const suffix = { br: '.br', gzip: '.gz' } as const;

/** The encoding to answer with: brotli when taken at all, since browsers list gzip first. */
export function chooseEncoding(request: Request): Encoding {
  const header = request.get('accept-encoding') ?? '';
  if (header === '') return null;
  if (request.acceptsEncodings('br') === 'br') return 'br';
  return request.acceptsEncodings('gzip') === 'gzip' ? 'gzip' : null;
}

/** Sends a file of the export in the best encoding that lies beside it. */
export function sendExportFile(
  web: WebExport,
  file: string,
  request: Request,
  response: Response,
): void {
  const encoding = chooseEncoding(request);
  const variant = encoding === null ? file : `${file}${suffix[encoding]}`;
  const packed = variant !== file && web.files.has(variant);
  response.type(file.slice(file.lastIndexOf('.')));
  response.vary('Accept-Encoding');
  if (packed && encoding !== null) response.set('Content-Encoding', encoding);
  response.set(
    'Cache-Control',
    hashed.test(file) ? 'public, max-age=31536000, immutable' : 'no-cache',
  );
  response.sendFile(packed ? variant : file, {
    root: web.dir,
    // The folder itself may lie under `.local`; hidden names inside it are not in the list.
    dotfiles: 'allow',
    cacheControl: false,
    lastModified: false,
  });
}
