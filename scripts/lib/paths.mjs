import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');
/** Everything the commands keep between runs; delete it to start from nothing. */
export const local = join(root, '.local');
/** The static export the server serves. */
export const webDir = join(root, 'dist');
