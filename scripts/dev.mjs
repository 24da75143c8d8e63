// `npm run dev`: the API and the app with reload, on one address. The dev server passes /api,
// /media and /local on (metro.config.js), so cookies work as in the built product.
import { join } from 'node:path';
import { ensureDebian, ffmpegThere, postgresThere } from './lib/debian.mjs';
import { claimLocalData } from './lib/one-at-a-time.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { local, root, webDir } from './lib/paths.mjs';
import { ensureFree, wantedPort } from './lib/ports.mjs';
import { endAll, keepRunning } from './lib/run.mjs';
import { checkNode, quietAboutNode, sayFailure, step } from './lib/steps.mjs';
import { loadTypeScript } from './lib/typescript.mjs';

checkNode();
quietAboutNode();
let product = null;
let ending = false;

async function end(status) {
  if (ending) return;
  ending = true;
  endAll();
  await product?.stop().catch((error) => console.error(error.message));
  process.exit(status);
}
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(0));

try {
  const port = wantedPort(8080);
  claimLocalData();
  await ensureFree(port);
  await step('packages', ensurePackages);
  if (!process.env.DATABASE_URL) {
    await step('PostgreSQL installed', () => ensureDebian('postgresql', postgresThere));
  }
  await step('ffmpeg installed', () => ensureDebian('ffmpeg', ffmpegThere));
  const { createProduct } = await loadTypeScript('server/local/product.ts');
  product = createProduct({ port, dataDir: local, webDir, server: 'apart' });
  for (const [name, work] of product.steps) await step(name, work);
  const { apiPort, mailPort, env } = product.apart();
  const tsx = join(root, 'node_modules/tsx/dist/cli.mjs');
  const expo = join(root, 'node_modules/expo/bin/cli');
  const api = keepRunning('node', [tsx, 'watch', '--clear-screen=false', 'server/index.ts'], {
    env,
  });
  const app = keepRunning('node', [expo, 'start', '--port', String(port), '--localhost'], {
    env: {
      SCANTLING_API: `http://127.0.0.1:${apiPort}`,
      SCANTLING_MAIL: `http://127.0.0.1:${mailPort}`,
      EXPO_NO_TELEMETRY: '1',
      EXPO_OFFLINE: '1',
      BROWSER: 'none',
    },
  });
  console.log(`\nScantling with reload: http://localhost:${port}   mail: /local/mail`);
  await end(await Promise.race([api.ended, app.ended]));
} catch (error) {
  if (!ending) {
    sayFailure(error);
    await end(1);
  }
}
