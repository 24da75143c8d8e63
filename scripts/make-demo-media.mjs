// Draws the demo's clips and pictures: line drawings of each step, a title block below, as small MP4 files
// and WebP covers in assets/demo. Needs ffmpeg (Debian). The results are committed; a start needs neither.
import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { loadTypeScript } from './lib/typescript.mjs';

const { demoFilms } = await loadTypeScript('server/demo/index.ts');
const out = new URL('../assets/demo/', import.meta.url).pathname;
mkdirSync(out, { recursive: true });

const film = '#F3F5F4';
const ink = '#1C2226';
const blue = '#1D43B8';
const escape = (text) => text.replace(/[&<>]/g, (c) => `&#${c.charCodeAt(0)};`);

/** Deterministic numbers from a word, so that each step gets a drawing of its own and always the same. */
function numbers(word) {
  let h = 2166136261;
  for (const c of word) h = Math.imul(h ^ c.charCodeAt(0), 16777619);
  return () => {
    h = Math.imul(h ^ (h >>> 15), 2246822519);
    h = Math.imul(h ^ (h >>> 13), 3266489917);
    return ((h ^= h >>> 16) >>> 0) / 4294967296;
  };
}

/** Boards on a bench, one of them set off with a dimension line. */
function drawing(title) {
  const next = numbers(title);
  const boards = [];
  let y = 236;
  const count = 2 + Math.floor(next() * 3);
  for (let i = 0; i < count; i += 1) {
    const w = 200 + Math.floor(next() * 260);
    const h = 18 + Math.floor(next() * 26);
    const x = 320 - w / 2 + Math.floor((next() - 0.5) * 80);
    y -= h;
    const grain = [0.3, 0.6]
      .map(
        (f) =>
          `<path d="M${x + 14} ${y + h * f}H${x + w * (0.4 + next() * 0.4)}" stroke="#9AA5A8" stroke-width="1"/>`,
      )
      .join('');
    boards.push(
      `<rect x="${x}" y="${y}" width="${w}" height="${h}" fill="#FCFDFC" stroke="${ink}" stroke-width="2"/>${grain}`,
    );
    if (i === count - 1) {
      boards.push(
        `<path d="M${x} ${y - 8}V${y - 34}M${x + w} ${y - 8}V${y - 34}" stroke="${blue}" stroke-width="1"/><path d="M${x - 8} ${y - 26}H${x + w + 8}M${x - 6} ${y - 20}l12 -12M${x + w - 6} ${y - 20}l12 -12" stroke="${blue}" stroke-width="2" fill="none"/>`,
      );
    }
  }
  const clamps =
    next() > 0.5
      ? [230, 410]
          .map(
            (x) =>
              `<path d="M${x} ${y - 44}v${236 - y + 30}M${x - 16} ${y - 44}h32" stroke="${ink}" stroke-width="3"/>`,
          )
          .join('')
      : '';
  return `${boards.join('')}${clamps}<path d="M60 237H580M60 246H580" stroke="${ink}" stroke-width="2"/>`;
}

function frame(name, number, count, title) {
  return `<svg xmlns="http://www.w3.org/2000/svg" width="640" height="360"><rect width="640" height="360" fill="${film}"/>
<rect x="16" y="16" width="608" height="328" fill="none" stroke="${ink}" stroke-width="1.5"/>${drawing(name + title)}
<path d="M16 288H624M120 288V344" stroke="${ink}" stroke-width="1.5"/>
<text x="68" y="327" font-family="DejaVu Sans Mono, monospace" font-size="26" text-anchor="middle" fill="${ink}">${number}/${count}</text>
<text x="136" y="324" font-family="DejaVu Sans, sans-serif" font-size="19" fill="${ink}">${escape(title)}</text></svg>`;
}

for (const { key, slides } of demoFilms()) {
  const work = mkdtempSync(join(tmpdir(), 'demo-film-'));
  const list = [];
  for (const [i, slide] of slides.entries()) {
    const file = join(work, `${i}.png`);
    await sharp(Buffer.from(frame(key, i + 1, slides.length, slide.title)))
      .png()
      .toFile(file);
    list.push(`file '${file}'`, `duration ${slide.seconds}`);
  }
  writeFileSync(
    join(work, 'list.txt'),
    [...list, `file '${join(work, `${slides.length - 1}.png`)}'`].join('\n'),
  );
  const seconds = slides.reduce((n, s) => n + s.seconds, 0);
  execFileSync('ffmpeg', [
    '-y',
    '-v',
    'error',
    '-f',
    'concat',
    '-safe',
    '0',
    '-i',
    join(work, 'list.txt'),
    '-f',
    'lavfi',
    '-i',
    'anullsrc=r=22050:cl=mono',
    '-t',
    String(seconds),
    '-r',
    '5',
    '-g',
    '10',
    '-c:v',
    'libx264',
    '-preset',
    'slow',
    '-crf',
    '30',
    '-pix_fmt',
    'yuv420p',
    '-c:a',
    'aac',
    '-b:a',
    '8k',
    '-movflags',
    '+faststart',
    '-map_metadata',
    '-1',
    join(out, `${key}.mp4`),
  ]);
  const cover = slides[Math.min(3, slides.length - 1)];
  await sharp(
    Buffer.from(
      `<svg xmlns="http://www.w3.org/2000/svg" width="640" height="360" viewBox="0 60 640 200"><rect y="0" width="640" height="360" fill="${film}"/>${drawing(key + cover.title)}</svg>`,
    ),
  )
    .webp({ quality: 80 })
    .toFile(join(out, `${key}.webp`));
  rmSync(work, { recursive: true, force: true });
  console.log(`${key}: ${seconds} s`);
}
