import { createHash } from 'node:crypto';
import { statSync } from 'node:fs';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';
import { type Express, type NextFunction, type Request, type Response } from 'express';
import { chooseEncoding, readExport, sendExportFile, type WebExport } from './web-files';
import { injectHead, type PageHead } from './web-head';
import { findPage } from './web-routes';

export { scriptHashes } from './web-csp';
export { type PageHead } from './web-head';

export interface ServeWebOptions {
  /** Folder of the static export. */
  dir: string;
  /** Shows the gallery, and reads the export again when it was built anew. */
  development: boolean;
  /** Head of a page, by its decoded path; null leaves the page as it was rendered. */
  headFor?: (path: string) => Promise<PageHead | null>;
}

const brotli = promisify(brotliCompress);
const zip = promisify(gzip);
const quality = { params: { [constants.BROTLI_PARAM_QUALITY]: 5 } };
const missing = '+not-found.html';
const ofTheServer = /^\/(api|media|local)(\/|$)/;
const developmentOnly = /^\/gallery(\/|\.html|$)/;
const developmentMark = '<meta name="scantling-mode" content="development"/>';
const fileLike = /^\/(_expo|assets|fonts|icons)\//;

async function sendHtml(request: Request, response: Response, html: string): Promise<void> {
  response.set('Cache-Control', 'no-cache');
  response.vary('Accept-Encoding');
  response.type('html');
  const encoding = chooseEncoding(request);
  response.set('ETag', `W/"${createHash('sha1').update(html).digest('base64url')}"`);
  if (request.fresh) {
    response.status(304).end();
    return;
  }
  if (encoding !== null) response.set('Content-Encoding', encoding);
  const body = Buffer.from(html);
  if (encoding === 'br') response.end(await brotli(body, quality));
  else response.end(encoding === 'gzip' ? await zip(body) : body);
}

function sendMissing(web: WebExport, path: string, request: Request, response: Response): void {
  response.status(404);
  const page = web.html.get(missing);
  if (page === undefined || fileLike.test(path)) {
    response.set('Cache-Control', 'no-store').type('text/plain').send('Not found');
    return;
  }
  sendExportFile(web, missing, request, response);
}

const notBuilt = `<!doctype html><html lang="en"><meta charset="utf-8"><title>Scantling</title>
<p>The web app has not been built. Run <code>npm start</code>, which builds it.</p>`;

function decode(path: string): string | null {
  try {
    const decoded = decodeURIComponent(path);
    return decoded.includes('\0') ? null : decoded;
  } catch {
    return null;
  }
}

const webStamp = (dir: string) =>
  statSync(join(dir, 'index.html'), { throwIfNoEntry: false })?.mtimeMs ?? 0;

type Handler = (request: Request, response: Response, next: NextFunction) => Promise<void>;

function webHandler(current: () => WebExport, options: ServeWebOptions): Handler {
  const headOf = async (path: string) => {
    // A page whose head could not be had is still a page; its own requests will say what failed.
    return options.headFor?.(path).catch(() => null) ?? null;
  };
  return async (request, response, next) => {
    if (!['GET', 'HEAD'].includes(request.method) || ofTheServer.test(request.path)) {
      next();
      return;
    }
    const path = decode(request.path);
    if (path === null) {
      response.status(400).type('text/plain').send('This address is malformed.');
      return;
    }
    const web = current();
    if (web.pages.length === 0) {
      response.status(503).type('html').send(notBuilt);
      return;
    }
    if (developmentOnly.test(path) && !options.development) {
      sendMissing(web, path, request, response);
      return;
    }
    const file = path.slice(1);
    if (web.files.has(file) && !/\.(br|gz)$/.test(file)) {
      sendExportFile(web, file, request, response);
      return;
    }
    await answerPage(web, path, request, response, headOf);
  };
}

async function answerPage(
  web: WebExport,
  path: string,
  request: Request,
  response: Response,
  headOf: (path: string) => Promise<PageHead | null>,
): Promise<void> {
  const bare = path.replace(/\/+$/, '');
  const page = findPage(web.pages, path);
  if (page === undefined) {
    // Only to a page of ours, and with one leading slash: `//other.example/` must not lead away.
    if (bare !== path && bare !== '' && findPage(web.pages, bare) !== undefined) {
      const query = /\?.*$/.exec(request.originalUrl)?.[0] ?? '';
      response.redirect(
        308,
        `/${bare.split('/').slice(1).map(encodeURIComponent).join('/')}${query}`,
      );
      return;
    }
    sendMissing(web, path, request, response);
    return;
  }
  const html = web.html.get(page.file);
  if (html !== undefined && developmentOnly.test(path)) {
    // Only in development does a request come this far; the page shows itself when it finds this.
    await sendHtml(
      request,
      response,
      html.replace('</head>', () => `${developmentMark}</head>`),
    );
    return;
  }
  const head = await headOf(path);
  if (head === null || html === undefined) sendExportFile(web, page.file, request, response);
  else await sendHtml(request, response, injectHead(html, head));
}

/**
 * Serves Expo Router's static export: pages by their file names, hashed files for ever, pages with
 * ETag, brotli before gzip, `+not-found.html` with 404, malformed addresses with 400. Mount it last;
 * `/api`, `/media` and `/local` are left to others.
 */
export function serveWeb(app: Express, options: ServeWebOptions): void {
  let web = readExport(options.dir);
  let stamp = webStamp(options.dir);
  const current = () => {
    if (!options.development) return web;
    const now = webStamp(options.dir);
    if (now !== stamp) {
      web = readExport(options.dir);
      stamp = now;
    }
    return web;
  };
  app.use(webHandler(current, options));
}
