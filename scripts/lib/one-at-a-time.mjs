import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { local } from './paths.mjs';
import { Plain } from './steps.mjs';

const file = join(local, 'running.pid');

function lives(pid) {
  try {
    process.kill(pid, 0);
  } catch (error) {
    return error.code === 'EPERM';
  }
  // After a crash and a restart of the machine the number may be someone else's.
  const command = `/proc/${pid}/cmdline`;
  return !existsSync(command) || /scripts\/(start|dev)\.mjs/.test(readFileSync(command, 'utf8'));
}

/** Two starts would share one data folder, so the second one says so and ends. */
export function claimLocalData() {
  mkdirSync(local, { recursive: true });
  const pid = existsSync(file) ? Number(readFileSync(file, 'utf8')) : 0;
  if (pid > 0 && pid !== process.pid && lives(pid)) {
    throw new Plain(
      `Scantling runs already from this folder (process ${pid}). End that one first.`,
    );
  }
  writeFileSync(file, String(process.pid));
  process.once('exit', () => rmSync(file, { force: true }));
}
