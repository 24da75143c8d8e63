// `npm start`: the whole product on this machine, from nothing. Plain Node, since nothing is
// installed yet when it begins.
import { ensureDebian, ffmpegThere, postgresThere } from './lib/debian.mjs';
import { claimLocalData } from './lib/one-at-a-time.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { local, webDir } from './lib/paths.mjs';
import { ensureFree, wantedPort } from './lib/ports.mjs';
import { endAll } from './lib/run.mjs';
import { checkNode, quietAboutNode, sayFailure, step } from './lib/steps.mjs';
import { loadTypeScript } from './lib/typescript.mjs';
import { ensureWebApp } from './lib/web-app.mjs';

checkNode();
quietAboutNode();
let product = null;
let ending = false;

async function end(status) {
  if (ending) return;
  ending = true;
  endAll();
  // A service that hangs must not keep the terminal.
  setTimeout(() => process.exit(1), 20_000).unref();
  await product?.stop().catch((error) => console.error(error.message));
  process.exit(status);
}
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.on(signal, () => {
    if (!ending && process.stdout.isTTY) console.log('\nStopping.');
    void end(0);
  });
}

function sayWhereItIs({ address, mail, signIns }) {
  const people = signIns.map(
    (each) => `    ${each.email.padEnd(28)} ${each.password}   ${each.who}`,
  );
  const lines = [
    '',
    `Scantling: ${address}`,
    ...(mail === null ? [] : [`Mail:      ${address}/local/mail`]),
    ...(people.length === 0 ? [] : ['Sign in as:', ...people]),
    'Ctrl-C stops it; the data stays in .local/.',
  ];
  console.log(lines.join('\n'));
}

try {
  const since = performance.now();
  const port = wantedPort(8080);
  claimLocalData();
  await ensureFree(port);
  console.log('Starting Scantling');
  await step('packages', ensurePackages);
  if (!process.env.DATABASE_URL) {
    await step('PostgreSQL installed', () => ensureDebian('postgresql', postgresThere));
  }
  await step('ffmpeg installed', () => ensureDebian('ffmpeg', ffmpegThere));
  await step('web app', ensureWebApp);
  const { createProduct } = await loadTypeScript('server/local/product.ts');
  product = createProduct({ port, dataDir: local, webDir });
  for (const [name, work] of product.steps) await step(name, work);
  sayWhereItIs(product.found());
  console.log(`Ready in ${((performance.now() - since) / 1000).toFixed(1)} s.`);
} catch (error) {
  if (!ending) {
    sayFailure(error);
    await end(1);
  }
}
