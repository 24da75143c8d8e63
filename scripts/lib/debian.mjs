import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { local } from './paths.mjs';
import { run, tail } from './run.mjs';
import { Plain } from './steps.mjs';

const succeeds = (program, args) => spawnSync(program, args, { stdio: 'ignore' }).status === 0;

export function postgresThere() {
  const base = '/usr/lib/postgresql';
  return existsSync(base) && readdirSync(base).some((v) => existsSync(join(base, v, 'bin/initdb')));
}

export const ffmpegThere = () => existsSync('/usr/bin/ffmpeg') || succeeds('ffmpeg', ['-version']);
export const chromiumThere = () => existsSync('/usr/bin/chromium');

/** How this user may call apt-get: as root, through sudo without a password, or not at all. */
function aptCommand() {
  if (!succeeds('apt-get', ['--version'])) return null;
  if (process.getuid() === 0) return ['apt-get'];
  return succeeds('sudo', ['-n', 'true']) ? ['sudo', '-n', 'apt-get'] : null;
}

/** Makes sure a Debian package is there, installing it where that is allowed. Returns a word for the line. */
export async function ensureDebian(name, isThere) {
  if (isThere()) return 'there';
  const command = aptCommand();
  if (command === null) {
    throw new Plain(`${name} is missing. Install it with: sudo apt-get install ${name}`);
  }
  const [program, ...before] = command;
  const log = join(local, `logs/apt-${name}.log`);
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  const wait = ['-o', 'DPkg::Lock::Timeout=180'];
  await run(program, [...before, ...wait, 'update'], { log, env });
  const install = [...before, ...wait, 'install', '-y', '--no-install-recommends', name];
  const status = await run(program, install, { log, env });
  if (status !== 0 || !isThere()) {
    throw new Plain(`apt-get could not install ${name}. Its last words:\n${tail(log)}`);
  }
  return 'installed';
}
