import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import S3rver from 's3rver';

export interface LocalObjectStore {
  /** `http://127.0.0.1:PORT`; the keys are `S3RVER` and `S3RVER`. */
  endpoint: string;
  port: number;
  stop(): Promise<void>;
}

export interface ObjectStoreOptions {
  /** Folder of the objects. Left out: a folder in tmp, removed at stop. */
  dir?: string;
  port?: number;
  buckets: string[];
}

/** Key id and secret s3rver knows; anyone on loopback may use them. */
export const localStoreKeys = { accessKeyId: 'S3RVER', secretAccessKey: 'S3RVER' } as const;

// A resumed upload reads ETag; a player asks for ranges from another origin.
const cors = `<CORSConfiguration><CORSRule>
  <AllowedOrigin>*</AllowedOrigin>
  ${['GET', 'HEAD', 'PUT', 'POST', 'DELETE'].map((m) => `<AllowedMethod>${m}</AllowedMethod>`).join('')}
  <AllowedHeader>*</AllowedHeader>
  ${['ETag', 'Content-Length', 'Content-Range', 'Accept-Ranges'].map((h) => `<ExposeHeader>${h}</ExposeHeader>`).join('')}
  <MaxAgeSeconds>3000</MaxAgeSeconds>
</CORSRule></CORSConfiguration>`;

/** Starts an S3-compatible store on loopback. Throws when the port is taken. */
export async function startObjectStore(options: ObjectStoreOptions): Promise<LocalObjectStore> {
  const temporary = options.dir === undefined;
  const directory = options.dir ?? mkdtempSync(join(tmpdir(), 'scantling-s3-'));
  mkdirSync(directory, { recursive: true });
  const store = new S3rver({
    address: '127.0.0.1',
    port: options.port ?? 0,
    silent: true,
    directory,
    allowMismatchedSignatures: false,
    vhostBuckets: false,
    configureBuckets: options.buckets.map((name) => ({ name, configs: [cors] })),
  });
  const { port } = await store.run();
  let stopped: Promise<void> | undefined;
  const stop = async () => {
    store.httpServer.closeAllConnections();
    await store.close();
    if (temporary) rmSync(directory, { recursive: true, force: true });
  };
  return {
    endpoint: `http://127.0.0.1:${String(port)}`,
    port,
    stop: () => (stopped ??= stop()),
  };
}
