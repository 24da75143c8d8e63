import { execFileSync, spawn, type ChildProcess } from 'node:child_process';
import { join } from 'node:path';

const root = join(__dirname, '../..');
const scope = globalThis as { scantlingProduct?: ChildProcess };

/** Jest's global set-up: the product with demo data on throw-away services, once for every file. */
export default async function setUp(): Promise<void> {
  execFileSync('node', [join(root, 'scripts/build-web.mjs')], { stdio: 'inherit' });
  const child = spawn('node', [join(root, 'scripts/throw-away.mjs')], {
    cwd: root,
    stdio: ['pipe', 'pipe', 'inherit'],
    // Jest says `test` here; the gallery and the mail pages show in development.
    env: { ...process.env, NODE_ENV: 'development' },
  });
  scope.scantlingProduct = child;
  const found = await new Promise<{ address: string }>((resolve, reject) => {
    let output = '';
    child.stdout.on('data', (chunk: Buffer) => {
      output += chunk.toString();
      const line = /^\{.*\}$/m.exec(output)?.[0];
      if (line !== undefined) resolve(JSON.parse(line) as { address: string });
    });
    child.once('close', () => {
      reject(new Error(`The product did not start:\n${output}`));
    });
  });
  process.env.SCANTLING_TEST_BASE = found.address;
}
