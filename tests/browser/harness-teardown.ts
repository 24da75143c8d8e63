import { type ChildProcess } from 'node:child_process';

/** Jest's global tear-down: ends what harness-setup.ts started, and waits until it is gone. */
export default async function tearDown(): Promise<void> {
  const { scantlingProduct: child } = globalThis as { scantlingProduct?: ChildProcess };
  if (child === undefined || child.exitCode !== null) return;
  await new Promise<void>((resolve) => {
    child.once('close', () => {
      resolve();
    });
    child.stdin?.end();
  });
}
