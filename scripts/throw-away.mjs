// The product with demo data on services that vanish with it, for browser tests and benchmarks.
// Prints one line of JSON when it is up; ends when its standard input does.
import { webDir } from './lib/paths.mjs';
import { quietAboutNode, sayFailure } from './lib/steps.mjs';
import { loadTypeScript } from './lib/typescript.mjs';

// Lets the demo's own work be done at test speed; the limits themselves have their API tests.
process.env.RATE_FACTOR ??= '1000';
process.env.LOG_LEVEL ??= 'error';
quietAboutNode();
for (const name of ['DATABASE_URL', 'S3_ENDPOINT', 'SMTP_URL']) delete process.env[name];

const { createProduct } = await loadTypeScript('server/local/product.ts');
const product = createProduct({ port: Number(process.env.PORT ?? 0), webDir });
let ending = false;
async function end(status) {
  if (ending) return;
  ending = true;
  await product.stop();
  process.exit(status);
}
process.stdin.resume().once('end', () => void end(0));
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(0));
try {
  for (const [, work] of product.steps) await work();
  console.log(JSON.stringify(product.found()));
} catch (error) {
  sayFailure(error);
  await end(1);
}
