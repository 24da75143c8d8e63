import { spawn, type ChildProcess } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { mkdtempSync, openSync, closeSync, readFileSync, rmSync, writeSync } from 'node:fs';
import { createServer, connect, type Server, type Socket } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { makeClip } from '../api/media/files';

const root = join(__dirname, '../..');
const scripts = (name: string) => join(root, 'scripts', name);

/** A line to the object store that can be counted, held and cut. */
export interface Line {
  port: number;
  /** Bytes that went up so far. */
  up(): number;
  /** Calls back once when so many bytes have gone up. */
  at(bytes: number, then: () => void): void;
  /** Ends every connection there is. */
  cut(): void;
  /** Nothing goes up while held. */
  hold(on: boolean): void;
  close(): Promise<void>;
}

/** Opens a line to a port on loopback. */
export function openLine(to: number): Promise<Line> {
  const pairs = new Set<[Socket, Socket]>();
  const waiting: { bytes: number; then: () => void }[] = [];
  let up = 0;
  let held = false;
  const server: Server = createServer((near) => {
    const far = connect(to, '127.0.0.1');
    const pair: [Socket, Socket] = [near, far];
    pairs.add(pair);
    const end = () => {
      near.destroy();
      far.destroy();
      pairs.delete(pair);
    };
    near.on('data', (chunk) => {
      up += chunk.length;
      if (!far.write(chunk)) near.pause();
      const due = waiting.findIndex(({ bytes }) => up >= bytes);
      if (due >= 0) waiting.splice(due, 1)[0]?.then();
      if (held) near.pause();
    });
    far.on('drain', () => {
      if (!held) near.resume();
    });
    far.pipe(near);
    for (const socket of pair) socket.on('error', end).on('close', end);
    if (held) near.pause();
  });
  const cut = () => {
    for (const pair of pairs) pair.forEach((socket) => socket.destroy());
  };
  return new Promise((resolve) => {
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      resolve({
        port: typeof address === 'object' && address ? address.port : 0,
        up: () => up,
        at: (bytes, then) => waiting.push({ bytes, then }),
        cut,
        hold: (on) => {
          held = on;
          for (const [near] of pairs) {
            if (on) near.pause();
            else near.resume();
          }
        },
        close: () =>
          new Promise((closed) => {
            server.close(() => closed());
            cut();
          }),
      });
    });
  });
}

/** Starts a script of ours and waits for its line of JSON. */
function startScript<T>(
  args: string[],
  env: Record<string, string>,
): Promise<{ child: ChildProcess; found: T }> {
  const child = spawn('node', args, {
    cwd: root,
    stdio: ['pipe', 'pipe', 'inherit'],
    env: { ...process.env, ...env },
  });
  return new Promise((resolve, reject) => {
    let output = '';
    child.stdout.on('data', (chunk: Buffer) => {
      output += chunk.toString();
      const line = /^\{.*\}$/m.exec(output)?.[0];
      if (line !== undefined) resolve({ child, found: JSON.parse(line) as T });
    });
    child.once('close', () => reject(new Error(`${args.join(' ')} did not start:\n${output}`)));
  });
}

const ended = (child: ChildProcess) =>
  new Promise<void>((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) resolve();
    else child.once('close', () => resolve());
  });

export interface UploadStage {
  base: string;
  line: Line;
  /** Endpoint of the store itself, past the line. */
  store: string;
  /** Memory of the server process now, MB. */
  serverMb(): number;
  /** Kills the server without a word and starts it again on the same port. */
  restart(): Promise<void>;
  close(): Promise<void>;
}

interface Services {
  env: Record<string, string>;
}

/** Services of their own, and the server as a process of its own that reaches browsers' uploads by a line. */
export async function uploadStage(port: number): Promise<UploadStage> {
  const services = await startScript<Services>([scripts('throw-away-services.mjs')], {});
  const store = services.found.env.S3_ENDPOINT ?? '';
  const line = await openLine(Number(new URL(store).port));
  const env = {
    ...services.found.env,
    NODE_ENV: 'production',
    PORT: String(port),
    APP_ORIGIN: `http://127.0.0.1:${port}`,
    MEDIA_ORIGIN: `http://127.0.0.1:${line.port}`,
    SESSION_SECRET: randomUUID(),
    WEB_DIR: join(root, 'dist'),
    LOG_LEVEL: 'error',
    RATE_FACTOR: '1000',
  };
  const serve = async () => {
    const child = spawn('node', ['--import', 'tsx', join(root, 'server/index.ts')], {
      cwd: root,
      stdio: ['ignore', 'inherit', 'inherit'],
      env: { ...process.env, ...env },
    });
    for (;;) {
      const up = await fetch(`http://127.0.0.1:${port}/api/healthz`).catch(() => null);
      if (up?.ok) return child;
      if (child.exitCode !== null) throw new Error('the server did not start');
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
  };
  let server = await serve();
  return {
    base: env.APP_ORIGIN,
    line,
    store,
    serverMb: () => {
      const status = readFileSync(`/proc/${server.pid}/status`, 'utf8');
      return Number(/VmRSS:\s+(\d+)/.exec(status)?.[1] ?? 0) / 1024;
    },
    restart: async () => {
      server.kill('SIGKILL');
      await ended(server);
      server = await serve();
    },
    close: async () => {
      server.kill('SIGTERM');
      await ended(server);
      await line.close();
      services.child.stdin?.end();
      await ended(services.child);
    },
  };
}

/** A clip that plays, with so many bytes behind it that do not repeat; on disk, removed by the caller. */
export function bigClip(bytes: number): string {
  const path = join(mkdtempSync(join(tmpdir(), 'scantling-big-')), 'big.mp4');
  const clip = makeClip(2, '640x360');
  const file = openSync(path, 'w');
  writeSync(file, clip);
  const head = Buffer.alloc(16);
  // `free` with a 64-bit size: ISO/IEC 14496-12 §4.2.
  head.writeUInt32BE(1, 0);
  head.write('free', 4, 'latin1');
  head.writeBigUInt64BE(BigInt(bytes - clip.length), 8);
  writeSync(file, head);
  const block = Buffer.alloc(1024 * 1024);
  let x = 2463534242;
  for (let at = clip.length + 16; at < bytes; at += block.length) {
    for (let i = 0; i + 4 <= block.length; i += 512) {
      x ^= x << 13;
      x ^= x >>> 17;
      x ^= x << 5;
      block.writeUInt32LE(x >>> 0, i);
    }
    writeSync(file, block, 0, Math.min(block.length, bytes - at));
  }
  closeSync(file);
  return path;
}
export const removeBig = (path: string) => rmSync(join(path, '..'), { recursive: true });
