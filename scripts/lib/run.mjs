import { spawn } from 'node:child_process';
import { createWriteStream, mkdirSync, readFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { root } from './paths.mjs';

const running = new Set();

/** Ends every program `run` started and still waits for, with the programs they started. */
export function endAll(signal = 'SIGTERM') {
  for (const child of running) {
    try {
      process.kill(-child.pid, signal);
    } catch {
      // It has just ended by itself.
    }
  }
}

/**
 * Runs a program with its output in `log`, and resolves with its status. Each gets a process group
 * of its own, so that ending it ends what it started.
 */
export function run(program, args, { log, env = {}, cwd = root } = {}) {
  mkdirSync(dirname(log), { recursive: true });
  const out = createWriteStream(log);
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      cwd,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
      detached: true,
    });
    running.add(child);
    child.stdout.pipe(out, { end: false });
    child.stderr.pipe(out, { end: false });
    child.once('error', reject);
    child.once('close', (code, signal) => {
      running.delete(child);
      out.end(() => resolve(code ?? (signal === null ? 1 : 128)));
    });
  });
}

/** Starts a program that goes on until it is ended; its words go to the terminal. */
export function keepRunning(program, args, { env = {} } = {}) {
  const child = spawn(program, args, {
    cwd: root,
    env: { ...process.env, ...env },
    stdio: ['ignore', 'inherit', 'inherit'],
    detached: true,
  });
  running.add(child);
  const ended = new Promise((resolve) => {
    child.once('close', (code) => {
      running.delete(child);
      resolve(code ?? 1);
    });
  });
  return { ended };
}

/** The last lines of a log, for a message. */
export function tail(log, lines = 25) {
  return readFileSync(log, 'utf8').trimEnd().split('\n').slice(-lines).join('\n');
}
