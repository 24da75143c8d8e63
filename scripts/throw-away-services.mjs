// PostgreSQL with the demo data, the object store and the mail catcher alone, for tests that start and kill
// servers of their own. Prints one line of JSON with the environment; ends when its standard input does.
import { webDir } from './lib/paths.mjs';
import { quietAboutNode, sayFailure } from './lib/steps.mjs';
import { loadTypeScript } from './lib/typescript.mjs';

quietAboutNode();
for (const name of ['DATABASE_URL', 'S3_ENDPOINT', 'SMTP_URL']) delete process.env[name];
const { createProduct } = await loadTypeScript('server/local/product.ts');
const product = createProduct({ port: 0, webDir, server: 'apart' });
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
  console.log(JSON.stringify({ env: product.apart().env }));
} catch (error) {
  sayFailure(error);
  await end(1);
}
