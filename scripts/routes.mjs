// Writes the typed routes of the app (.expo/types/router.d.ts), as the Expo dev server does, so that types and
// lint know them in a fresh clone as well.
import { mkdirSync, readdirSync, readFileSync, writeFileSync, existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('..', import.meta.url));
const fromExpo = createRequire(
  createRequire(join(root, 'package.json')).resolve('expo/package.json'),
);
const fromCli = createRequire(fromExpo.resolve('@expo/cli/package.json'));
const { getTypedRoutesDeclarationFile } = fromCli(
  '@expo/router-server/build/typed-routes/generate',
);

const keys = readdirSync(join(root, 'app'), { recursive: true })
  .map((file) => `./${String(file).replaceAll('\\', '/')}`)
  .filter((file) => /\.tsx?$/.test(file) && !/\/\+(?:html|native-intent)\./.test(file))
  .sort();
const context = Object.assign(() => ({ default: () => null }), {
  keys: () => keys,
  resolve: (key) => key,
  id: '0',
});
const text = getTypedRoutesDeclarationFile(context, {});
if (!text) throw new Error('The typed routes could not be made.');
const file = join(root, '.expo/types/router.d.ts');
mkdirSync(join(root, '.expo/types'), { recursive: true });
if (!existsSync(file) || readFileSync(file, 'utf8') !== text) writeFileSync(file, text);
