// Builds sw.js into a static export: bundled by esbuild, with the list of files to keep filled in.
import { rmSync } from 'node:fs';
import { join, resolve } from 'node:path';
import esbuild from 'esbuild';
import workbox from 'workbox-build';
import { root, webDir } from './lib/paths.mjs';

const dir = resolve(process.argv[2] ?? webDir);
const bundled = join(dir, 'sw-source.js');

await esbuild.build({
  entryPoints: [join(root, 'components/service-worker/sw.ts')],
  outfile: bundled,
  bundle: true,
  format: 'iife',
  minify: true,
  target: 'es2022',
  define: { 'process.env.NODE_ENV': '"production"' },
  logLevel: 'warning',
});
const { count, size, warnings } = await workbox.injectManifest({
  swSrc: bundled,
  swDest: join(dir, 'sw.js'),
  globDirectory: dir,
  globPatterns: ['**/*.{html,js,woff2,webmanifest}', 'icons/*'],
  // Pages of a group are there twice; the gallery is for development, and the server says which.
  globIgnores: ['(*)/**', 'gallery.html', '**/gallery-*.js', 'sw.js', 'sw-source.js'],
  // Metro's names and ours change with the content, so their address alone says which they are.
  dontCacheBustURLsMatching: /-[0-9a-f]{32}\.js$|\.v\d+\.\w+$/,
  maximumFileSizeToCacheInBytes: 5 * 1024 * 1024,
});
rmSync(bundled);
if (warnings.length > 0) {
  console.error(warnings.join('\n'));
  process.exit(1);
}
console.log(`sw.js keeps ${count} files, ${(size / 1e6).toFixed(2)} MB`);
