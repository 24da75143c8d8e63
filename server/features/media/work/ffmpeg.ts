import { spawn } from 'node:child_process';
import { constants, setPriority } from 'node:os';

export interface Ran {
  /** 0 when it went well. */
  status: number;
  stdout: Buffer;
  /** The last words, for the log. */
  stderr: string;
}

export interface RunOptions {
  signal: AbortSignal;
  /** Called with the seconds of film that are done. */
  onSeconds?: (seconds: number) => void;
  /** Kill it when nothing was heard for so long; ms. */
  silence?: number;
}

/** Runs ffmpeg or ffprobe below everything else on the machine. Throws when it cannot start or was stopped. */
export function runTool(
  tool: 'ffmpeg' | 'ffprobe',
  args: readonly string[],
  { signal, onSeconds, silence = 300_000 }: RunOptions,
): Promise<Ran> {
  return new Promise((resolve, reject) => {
    const child = spawn(tool, args, {
      signal,
      killSignal: 'SIGKILL',
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    const out: Buffer[] = [];
    let stderr = '';
    let quiet = setTimeout(() => child.kill('SIGKILL'), silence);
    child.once('spawn', () => {
      if (child.pid !== undefined) setPriority(child.pid, constants.priority.PRIORITY_LOW);
    });
    child.stdout.on('data', (chunk: Buffer) => {
      clearTimeout(quiet);
      quiet = setTimeout(() => child.kill('SIGKILL'), silence);
      if (!onSeconds) out.push(chunk);
      else {
        const us = /out_time_us=(\d+)/.exec(chunk.toString())?.[1];
        if (us) onSeconds(Number(us) / 1e6);
      }
    });
    child.stderr.on('data', (chunk: Buffer) => {
      stderr = (stderr + chunk.toString()).slice(-2000);
    });
    child.once('error', (error) => {
      clearTimeout(quiet);
      reject(error);
    });
    child.once('close', (code) => {
      clearTimeout(quiet);
      resolve({ status: code ?? 1, stdout: Buffer.concat(out), stderr });
    });
  });
}

export const quietly = ['-nostdin', '-hide_banner', '-loglevel', 'error'] as const;
