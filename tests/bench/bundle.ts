import { execFileSync } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { brotliCompressSync, constants } from 'node:zlib';
import { conditions, report, table } from './write-section';

const root = join(__dirname, '../..');
const blank = join(root, '.local/blank');

const brotli = (content: Buffer) =>
  brotliCompressSync(content, { params: { [constants.BROTLI_PARAM_QUALITY]: 11 } }).length;

interface FirstLoad {
  html: number;
  scripts: number;
  requests: number;
}

/** Brotli bytes of a pre-rendered page and of every script it names. */
function firstLoad(dist: string, file: string): FirstLoad {
  const html = readFileSync(join(dist, file));
  const sources = [...html.toString().matchAll(/<script[^>]*\ssrc="([^"]+)"/g)].map(
    ([, src = '']) => decodeURIComponent(src.replace(/[?#].*$/, '')),
  );
  const sizes = [...new Set(sources)].map((src) => brotli(readFileSync(join(dist, src))));
  return {
    html: brotli(html),
    scripts: sizes.reduce((sum, size) => sum + size, 0),
    requests: 1 + sizes.length,
  };
}

/** Exports an app of one empty route with the packages of this project. */
function exportBlank(): string {
  rmSync(blank, { recursive: true, force: true });
  mkdirSync(join(blank, 'app'), { recursive: true });
  const put = (name: string, text: string) => {
    writeFileSync(join(blank, name), text);
  };
  put(
    'package.json',
    JSON.stringify({ name: 'blank', version: '1.0.0', main: 'expo-router/entry' }),
  );
  put('app.json', readFileSync(join(root, 'app.json'), 'utf8'));
  put('babel.config.js', readFileSync(join(root, 'babel.config.js'), 'utf8'));
  put(
    'metro.config.js',
    `const { getDefaultConfig } = require('expo/metro-config');
const config = getDefaultConfig(__dirname);
config.watchFolders = [${JSON.stringify(join(root, 'node_modules'))}];
config.resolver.nodeModulesPaths = [${JSON.stringify(join(root, 'node_modules'))}];
module.exports = config;
`,
  );
  put('app/_layout.tsx', "import { Slot } from 'expo-router';\nexport default Slot;\n");
  put('app/index.tsx', 'export default function Home() {\n  return null;\n}\n');
  execFileSync('node', [join(root, 'node_modules/expo/bin/cli'), 'export', '-p', 'web'], {
    cwd: blank,
    stdio: ['ignore', 'ignore', 'inherit'],
    env: {
      ...process.env,
      CI: '1',
      EXPO_NO_TELEMETRY: '1',
      EXPO_OFFLINE: '1',
      NODE_ENV: 'production',
    },
  });
  return join(blank, 'dist');
}

function findPage(ending: string): string {
  const found = execFileSync('find', ['dist', '-name', '*.html'], { cwd: root, encoding: 'utf8' })
    .split('\n')
    .map((file) => file.replace(/^dist\//, ''))
    .find((file) => file.replace(/\([^)]*\)\//g, '') === ending);
  if (found === undefined) throw new Error(`The web app has no page ${ending}.`);
  return found;
}

function main(): void {
  execFileSync('node', [join(root, 'scripts/build-web.mjs')], { stdio: 'inherit' });
  const pages: [string, FirstLoad][] = [
    ['blank Expo Router export', firstLoad(exportBlank(), 'index.html')],
  ];
  const wanted: [string, string][] = [
    ['plan page', 'plans/[slug].html'],
    ['bench page', 'bench/[copyId].html'],
  ];
  for (const [name, file] of wanted)
    pages.push([name, firstLoad(join(root, 'dist'), findPage(file))]);
  const base = pages[0]?.[1];
  const size = (load: FirstLoad) => load.html + load.scripts;
  const rows = pages.map(([name, load]) => [
    name,
    load.requests,
    load.html,
    load.scripts,
    size(load),
    base === undefined ? '' : `${(size(load) / size(base)).toFixed(2)} ×`,
  ]);
  const head = ['page', 'requests', 'HTML, B', 'scripts, B', 'first load, B', 'against blank'];
  rmSync(blank, { recursive: true, force: true });
  report(
    'bundle',
    `## Bytes of a first load\n\n\`npm run bench:bundle\`: brotli 11, the page and every script it names; fonts, clips and data apart.\n\n${table(head, rows)}\n\n${conditions()}`,
  );
}

main();
