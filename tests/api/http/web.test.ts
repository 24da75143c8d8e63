import { createHash } from 'node:crypto';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import express from 'express';
import request from 'supertest';
import { scriptHashes, serveWeb, type PageHead } from '../../../server/http/web';

const dir = mkdtempSync(join(tmpdir(), 'scantling-web-'));
const script = 'globalThis.ready=true;';
const html = (name: string) =>
  `<html><head><title data-rh="true"></title><script>${script}</script><script type="application/ld+json">{}</script><script src="/x.js"></script></head><body>${name}</body></html>`;
const chunk = '_expo/static/js/web/entry-480c9b1a482a6ae22a5d00b775a0ce6f.js';

function put(name: string, content: string | Buffer): void {
  mkdirSync(dirname(join(dir, name)), { recursive: true });
  writeFileSync(join(dir, name), content);
}

const heads: Record<string, PageHead> = {
  '/plans/stool': {
    title: 'Stool "$&" <b>',
    description: 'Two boards',
    jsonLd: { name: '</script><script>alert(1)</script>' },
  },
};

function appFor(development: boolean) {
  const app = express();
  serveWeb(app, { dir, development, headFor: (path) => Promise.resolve(heads[path] ?? null) });
  app.use((_request, response) => {
    response.status(418).send('passed on');
  });
  return app;
}

// Before any describe: an app lists its export when it is made.
for (const page of [
  'index',
  '(shell)/index',
  '(shell)/plans/index',
  'plans/[slug]',
  'plans/new',
  'gallery',
  '+not-found',
  'docs/[...rest]',
])
  put(`${page}.html`, html(page));
put(chunk, 'let a = 1;');
put(`${chunk}.br`, brotliCompressSync('let a = 1;'));
put(`${chunk}.gz`, gzipSync('let a = 1;'));
put('fonts/next-400.v1.woff2', 'font');
put('manifest.webmanifest', '{}');
put('_expo/.routes.json', 'secret');
afterAll(() => {
  rmSync(dir, { recursive: true, force: true });
});

describe('pages', () => {
  const app = appFor(false);
  it.each([
    ['/', 'index'],
    ['/plans', '(shell)/plans/index'],
    ['/plans/stool-2', 'plans/[slug]'],
    ['/plans/new', 'plans/new'],
    ['/plans/%5Bslug%5D.html', 'plans/[slug]'],
    ['/docs/a/b/c', 'docs/[...rest]'],
  ])('%s is answered by %s', async (path, body) => {
    const { text, headers } = await request(app).get(path).expect(200);
    expect(text).toContain(`<body>${body}</body>`);
    expect(headers['cache-control']).toBe('no-cache');
    expect(headers.etag).toBeDefined();
  });

  it.each([
    ['/nothing', 404],
    ['/plans/a/b', 404],
    ['/docs', 404],
    ['/plans//a', 404],
    ['/%2e%2e/%2e%2e/etc/passwd', 404],
    ['/_expo/.routes.json', 404],
    ['/gallery', 404],
    ['/gallery.html', 404],
    ['/%E0%A4%A', 400],
    ['/%00', 400],
    ['/api/none', 418],
    ['/media/none', 418],
  ])('%s gives %i', async (path, status) => {
    await request(app).get(path).expect(status);
  });

  it('shows +not-found for an unknown page and plain words for an unknown file', async () => {
    expect((await request(app).get('/nothing')).text).toContain('+not-found');
    expect((await request(app).get('/_expo/static/old.js')).text).toBe('Not found');
  });

  it('drops a trailing slash and never leads to another host', async () => {
    const { headers } = await request(app).get('/plans/?q=a').expect(308);
    expect(headers.location).toBe('/plans?q=a');
    const away = await request(app).get('//other.example/');
    expect(away.status).toBe(404);
  });

  it('shows the gallery in development only', async () => {
    const { text } = await request(appFor(true)).get('/gallery').expect(200);
    expect(text).toContain('name="scantling-mode" content="development"');
  });

  it('passes on what is not read', async () => {
    await request(app).post('/plans').expect(418);
  });
});

describe('caching and encodings', () => {
  const app = appFor(false);
  it('keeps hashed and versioned files for ever, brotli first', async () => {
    const { headers } = await request(app)
      .get(`/${chunk}`)
      .set('Accept-Encoding', 'gzip, deflate, br');
    expect(headers['content-encoding']).toBe('br');
    expect(headers['cache-control']).toContain('immutable');
    expect(headers['content-type']).toContain('javascript');
    expect(headers.vary).toContain('Accept-Encoding');
    const zipped = await request(app).get(`/${chunk}`).set('Accept-Encoding', 'gzip, br;q=0');
    expect(zipped.headers['content-encoding']).toBe('gzip');
    expect(zipped.text).toBe('let a = 1;');
    const plain = await request(app).get(`/${chunk}`).set('Accept-Encoding', '');
    expect(plain.headers['content-encoding']).toBeUndefined();
    const font = await request(app).get('/fonts/next-400.v1.woff2');
    expect(font.headers['cache-control']).toContain('immutable');
    const manifest = await request(app).get('/manifest.webmanifest');
    expect(manifest.headers['cache-control']).toBe('no-cache');
    expect(manifest.headers['content-type']).toContain('application/manifest+json');
  });

  it.each(['/plans/stool', '/plans/other', '/plans'])(
    'answers 304 for %s when unchanged',
    async (path) => {
      const first = await request(app).get(path);
      const etag = first.headers.etag ?? '';
      await request(app).get(path).set('If-None-Match', etag).expect(304);
    },
  );
});

describe('head and CSP', () => {
  it('puts the head of the path in, escaped', async () => {
    const { text } = await request(appFor(false)).get('/plans/stool').expect(200);
    expect(text).toContain('<title data-rh="true">Stool &quot;$&amp;&quot; &lt;b&gt;</title>');
    expect(text).toContain('content="Two boards"');
    expect(text).not.toContain('<script>alert(1)');
  });

  it('serves the page without its head when the head cannot be had', async () => {
    const app = express();
    serveWeb(app, { dir, development: false, headFor: () => Promise.reject(new Error('down')) });
    await request(app).get('/plans/stool').expect(200);
  });

  it('hashes each inline script once, and neither data nor files', () => {
    const hash = createHash('sha256').update(script).digest('base64');
    expect(scriptHashes(dir)).toEqual([`'sha256-${hash}'`]);
    expect(scriptHashes(join(dir, 'none'))).toEqual([]);
  });

  it('matches the value browsers compute for Expo’s own script', () => {
    // Recorded from a Chromium CSP run of a blank export, not computed by this code.
    const own = mkdtempSync(join(tmpdir(), 'scantling-csp-'));
    writeFileSync(
      join(own, 'index.html'),
      '<script type="module">globalThis.__EXPO_ROUTER_HYDRATE__=true;</script>',
    );
    expect(scriptHashes(own)).toEqual(["'sha256-67fhrP0+BkBqmgGGXTtgiVO/9EQs3QruYNU/7fnRkI8='"]);
    rmSync(own, { recursive: true, force: true });
  });
});

it('says what to do when nothing was built', async () => {
  const app = express();
  serveWeb(app, { dir: join(dir, 'none'), development: false });
  expect((await request(app).get('/').expect(503)).text).toContain('npm start');
});
