import { createRequire } from 'node:module';
import { join } from 'node:path';
import { root } from './paths.mjs';

const require = createRequire(import.meta.url);

/** Loads one of the project's TypeScript files. Only after the packages are installed. */
export function loadTypeScript(path) {
  require('tsx/cjs/api').register();
  return require(join(root, path));
}
