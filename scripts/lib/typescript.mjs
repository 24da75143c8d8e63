import { createRequire } from 'node:module';
import { join } from 'node:path';
import { root } from './paths.mjs';

const require = createRequire(import.meta.url);
let ready = false;

/** Loads one of the project's TypeScript files. Only after the packages are installed. */
export async function loadTypeScript(path) {
  if (!ready) {
    const [forRequire, forImport] = await Promise.all([
      import('tsx/cjs/api'),
      import('tsx/esm/api'),
    ]);
    forRequire.register();
    // For `import()` inside the files.
    forImport.register();
    ready = true;
  }
  return require(join(root, path));
}
