import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const inlineScript = /<script([^>]*)>([\s\S]*?)<\/script>/gi;
const executable = (attributes: string) => {
  if (/\ssrc\s*=/i.test(attributes)) return false;
  const type = /\stype\s*=\s*["']?([^"'\s>]+)/i.exec(attributes)?.[1];
  return type === undefined || /^(module|(text|application)\/javascript)$/i.test(type);
};

/** CSP sources (`'sha256-…'`) of the inline scripts in one HTML text. */
export function inlineScriptHashes(html: string): string[] {
  return [...html.matchAll(inlineScript)]
    .filter(([, attributes = '']) => executable(attributes))
    .map(([, , body = '']) => `'sha256-${createHash('sha256').update(body).digest('base64')}'`);
}

/** CSP sources of every inline script in a folder's HTML files; empty when there is no such folder. */
export function scriptHashes(dir: string): string[] {
  if (!existsSync(dir)) return [];
  const files = readdirSync(dir, { recursive: true, encoding: 'utf8' });
  const hashes = files
    .filter((file) => file.endsWith('.html'))
    .flatMap((file) => inlineScriptHashes(readFileSync(join(dir, file), 'utf8')));
  return [...new Set(hashes)].sort();
}
