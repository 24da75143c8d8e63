import { createHash } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { extname, join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';
import { local, root, webDir } from './paths.mjs';
import { run, tail } from './run.mjs';
import { Plain } from './steps.mjs';

const sources = ['app', 'components', 'shared', 'assets', 'public'];
const configs = [
  'package-lock.json',
  'index.js',
  'app.json',
  'babel.config.js',
  'metro.config.js',
  'tsconfig.base.json',
  'tsconfig.app.json',
  'tsconfig.json',
  'scripts/lib/web-app.mjs',
  'scripts/service-worker.mjs',
];
const stamp = join(webDir, '.sources.sha256');
const lock = join(local, 'web-build.lock');

function filesUnder(dir) {
  if (!existsSync(join(root, dir))) return [];
  return readdirSync(join(root, dir), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath ?? entry.path, entry.name));
}

/** A hash of everything the web app is made from. */
export function sourceHash() {
  const hash = createHash('sha256');
  const files = [...sources.flatMap(filesUnder), ...configs.map((file) => join(root, file))];
  for (const file of files.filter((name) => existsSync(name)).sort()) {
    hash.update(file.slice(root.length)).update('\0').update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
}

const packable = new Set(['.js', '.html', '.css', '.svg', '.json', '.webmanifest', '.txt', '.map']);
const brotli = promisify(brotliCompress);
const zip = promisify(gzip);

/** Puts a .br and a .gz beside every text file over 500 bytes. */
async function precompress(dir) {
  const names = readdirSync(dir, { recursive: true, encoding: 'utf8' });
  const pack = async (name) => {
    const content = readFileSync(join(dir, name));
    if (content.length < 500) return;
    const params = {
      [constants.BROTLI_PARAM_QUALITY]: 11,
      [constants.BROTLI_PARAM_SIZE_HINT]: content.length,
    };
    writeFileSync(join(dir, `${name}.br`), await brotli(content, { params }));
    writeFileSync(join(dir, `${name}.gz`), await zip(content, { level: 9 }));
  };
  await Promise.all(names.filter((name) => packable.has(extname(name))).map(pack));
}

async function serviceWorker(dir, log) {
  const script = join(root, 'scripts/service-worker.mjs');
  if (!existsSync(script)) return;
  const status = await run('node', [script, dir], { log });
  if (status !== 0) throw new Plain(`The service worker was not built:\n${tail(log)}`);
}

async function build(hash) {
  const fresh = join(local, `web-${process.pid}`);
  const log = join(local, 'logs/web-build.log');
  rmSync(fresh, { recursive: true, force: true });
  const cli = join(root, 'node_modules/expo/bin/cli');
  const env = { CI: '1', EXPO_NO_TELEMETRY: '1', EXPO_OFFLINE: '1', NODE_ENV: 'production' };
  // The CLI itself, not npx: that one leaves its child behind when it is ended.
  const args = [cli, 'export', '-p', 'web', '--output-dir', fresh];
  const status = await run('node', args, { log, env });
  if (status !== 0) throw new Plain(`The web app was not built. The last words:\n${tail(log, 40)}`);
  await serviceWorker(fresh, join(local, 'logs/service-worker.log'));
  await precompress(fresh);
  writeFileSync(join(fresh, '.sources.sha256'), hash);
  rmSync(webDir, { recursive: true, force: true });
  renameSync(fresh, webDir);
}

function lockHolderLives() {
  try {
    process.kill(Number(readFileSync(join(lock, 'pid'), 'utf8')), 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}

/** One build at a time in a checkout; a lock whose holder died is taken over. */
async function withLock(work) {
  mkdirSync(local, { recursive: true });
  for (;;) {
    try {
      mkdirSync(lock);
      writeFileSync(join(lock, 'pid'), String(process.pid));
      break;
    } catch {
      await wait(500);
      if (!lockHolderLives()) rmSync(lock, { recursive: true, force: true });
    }
  }
  try {
    return await work();
  } finally {
    rmSync(lock, { recursive: true, force: true });
  }
}

const upToDate = (hash) => existsSync(stamp) && readFileSync(stamp, 'utf8') === hash;

/** Builds the web app when its sources changed since the last build. Returns a word for the line. */
export async function ensureWebApp() {
  if (upToDate(sourceHash())) return 'there';
  return withLock(async () => {
    const hash = sourceHash();
    if (upToDate(hash)) return 'there';
    await build(hash);
    return 'built';
  });
}
