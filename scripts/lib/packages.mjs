import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { local, root } from './paths.mjs';
import { run, tail } from './run.mjs';
import { Plain } from './steps.mjs';

const stamp = join(local, 'packages.sha256');
const read = (file) => readFileSync(join(root, file), 'utf8');

/** Whether node_modules holds what the lock names; npm keeps a list of it inside. */
function installedFits() {
  if (!existsSync(join(root, 'node_modules/.package-lock.json'))) return false;
  const wanted = JSON.parse(read('package-lock.json')).packages;
  const there = JSON.parse(read('node_modules/.package-lock.json')).packages;
  return Object.entries(wanted).every(([path, { version, optional, os, cpu }]) => {
    if (path === '') return true;
    const found = there[path];
    // A package for another system is in the lock and rightly not in the folder.
    return found === undefined ? Boolean(optional ?? os ?? cpu) : found.version === version;
  });
}

/** Runs `npm ci` when node_modules is missing or the lock changed since. Returns a word for the line. */
export async function ensurePackages() {
  const hash = createHash('sha256').update(read('package-lock.json')).digest('hex');
  const known = existsSync(stamp) ? readFileSync(stamp, 'utf8') : '';
  const there = existsSync(join(root, 'node_modules'));
  if (there && known === hash) return 'there';
  mkdirSync(local, { recursive: true });
  if (there && installedFits()) {
    writeFileSync(stamp, hash);
    return 'there';
  }
  const log = join(local, 'logs/npm-ci.log');
  const status = await run('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], { log });
  if (status !== 0) throw new Plain(`npm ci did not succeed. Its last words:\n${tail(log)}`);
  writeFileSync(stamp, hash);
  return 'installed';
}
