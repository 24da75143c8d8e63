// `npm test`: every check of the project, with what it needs installed first. Stage names as
// arguments run those alone: `npm test -- unit api`.
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { chromiumThere, ensureDebian, ffmpegThere, postgresThere } from './lib/debian.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { local, root } from './lib/paths.mjs';
import { endAll, run, tail } from './lib/run.mjs';
import { checkNode, Plain, step } from './lib/steps.mjs';
import { ensureWebApp } from './lib/web-app.mjs';

const bin = (path) => join(root, 'node_modules', path);
const logOf = (name) => join(local, 'logs', `test-${name}.log`);
const total = { passed: 0, failed: 0 };

/** Runs programs side by side as one check; each must end with status 0. */
async function check(name, ...commands) {
  const statuses = await Promise.all(
    commands.map((args, index) => run('node', args, { log: `${logOf(name)}${index || ''}` })),
  );
  const bad = statuses.findIndex((status) => status !== 0);
  if (bad >= 0) throw new Plain(tail(`${logOf(name)}${bad || ''}`, 60));
  total.passed += 1;
}

/** Runs one Jest project and adds its counts; a file that does not even load counts as a failure. */
async function jest(name, project, ...extra) {
  const json = join(local, 'test', `${name}.json`);
  mkdirSync(join(local, 'test'), { recursive: true });
  rmSync(json, { force: true });
  const args = [bin('jest/bin/jest.js'), '--selectProjects', project, '--passWithNoTests'];
  const output = ['--json', '--outputFile', json, '--verbose=false', ...extra];
  const status = await run('node', ['--no-warnings', ...args, ...output], { log: logOf(name) });
  if (!existsSync(json)) {
    if (status === 0) return 'no tests';
    throw new Plain(tail(logOf(name), 60));
  }
  const result = JSON.parse(readFileSync(json, 'utf8'));
  const failed = result.numFailedTests + result.numRuntimeErrorTestSuites;
  total.passed += result.numPassedTests;
  total.failed += failed;
  if (status !== 0 && failed === 0) total.failed += 1;
  const skipped = result.numPendingTests > 0 ? `, ${result.numPendingTests} skipped` : '';
  const counts = `${result.numPassedTests} passed, ${failed} failed${skipped}`;
  if (status === 0) return counts;
  const messages = result.testResults
    .filter((file) => file.status === 'failed')
    .map((file) => file.message);
  console.log(`\n${messages.join('\n').slice(0, 20_000)}\nAll of it: ${logOf(name)}`);
  return counts;
}

const prettierCache = join(root, 'node_modules/.cache/prettier-check');
/** Types and lint need the typed routes, which a fresh clone does not have. */
const withRoutes = async (name, ...commands) => {
  const status = await run('node', [join(root, 'scripts/routes.mjs')], { log: logOf('routes') });
  if (status !== 0) throw new Plain(tail(logOf('routes'), 60));
  await check(name, ...commands);
};

const stages = {
  types: () =>
    withRoutes(
      'types',
      ...['app', 'server'].map((name) => [
        bin('typescript/bin/tsc'),
        '-p',
        `tsconfig.${name}.json`,
        '--noEmit',
      ]),
    ),
  lint: () =>
    // No cache: with types a file's findings depend on other files as well.
    withRoutes('lint', [bin('eslint/bin/eslint.js'), '.', '--max-warnings', '0']),
  boundaries: () =>
    check('boundaries', [
      bin('dependency-cruiser/bin/dependency-cruise.mjs'),
      '--config',
      '.dependency-cruiser.cjs',
      ...['app', 'components', 'shared', 'server'],
    ]),
  format: () =>
    check('format', [
      bin('prettier/bin/prettier.cjs'),
      '--check',
      '.',
      '--cache',
      '--cache-location',
      prettierCache,
    ]),
  unit: () => jest('unit', 'shared', '--maxWorkers=2'),
  api: () => jest('api', 'server', '--maxWorkers=2'),
  components: () => jest('components', 'app', '--maxWorkers=2'),
  browser: async () => {
    await ensureWebApp();
    return jest('browser', 'browser', '--runInBand');
  },
};

/** A failed stage is shown and counted, and the next goes on. */
async function stage(name, work) {
  try {
    await step(name, work);
  } catch (error) {
    total.failed += 1;
    console.log(error instanceof Plain ? error.message : error);
  }
}

checkNode();
const chosen = process.argv.slice(2).filter((name) => !name.startsWith('-'));
const unknown = chosen.filter((name) => !(name in stages));
if (unknown.length > 0) {
  console.error(`No stage ${unknown.join(', ')}. There are: ${Object.keys(stages).join(', ')}.`);
  process.exit(1);
}
for (const signal of ['SIGINT', 'SIGTERM']) {
  process.once(signal, () => {
    endAll();
    process.exit(130);
  });
}
const since = performance.now();
const wants = (name) => chosen.length === 0 || chosen.includes(name);
await stage('packages', ensurePackages);
if (wants('api') || wants('browser')) {
  await stage('postgresql', () => ensureDebian('postgresql', postgresThere));
  await stage('ffmpeg', () => ensureDebian('ffmpeg', ffmpegThere));
}
if (wants('browser')) await stage('chromium', () => ensureDebian('chromium', chromiumThere));
for (const [name, work] of Object.entries(stages)) {
  if (wants(name)) await stage(name, work);
}
console.log(`\nAll stages: ${((performance.now() - since) / 1000).toFixed(0)} s`);
console.log(`${total.passed} passed, ${total.failed} failed`);
process.exit(total.failed === 0 ? 0 : 1);
