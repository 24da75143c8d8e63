import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { jot, readCaptions } from '../../shared/captions';
import { pooled, rates, score, type Gold, type Score } from './captions-score';
import { conditions, report, table } from './write-section';

const parts = ['measures', 'steps', 'cautions', 'corrections'] as const;

function cells(each: Score): string[] {
  return parts.map((part) => {
    const { precision, recall, f1 } = rates(each[part]);
    return `${f1.toFixed(3)} (${precision.toFixed(2)}/${recall.toFixed(2)})`;
  });
}

function scoreFile(folder: string, file: string): { row: string[]; score: Score } {
  const text = readFileSync(join(folder, file), 'utf8');
  const gold = JSON.parse(
    readFileSync(join(folder, file.replace(/\.(?:vtt|srt)$/i, '.gold.json')), 'utf8').replace(
      /^\uFEFF/,
      '',
    ),
  ) as Gold;
  const begun = performance.now();
  const result = jot(readCaptions(text, { fileName: file }));
  const ms = performance.now() - begun;
  const own = score(gold, result);
  return { row: [file, ...cells(own), ms.toFixed(0)], score: own };
}

function main(): number {
  const folder = process.argv.slice(2).find((word) => !word.startsWith('--'));
  if (folder === undefined || !existsSync(folder) || !statSync(folder).isDirectory()) {
    console.error(
      folder === undefined
        ? 'usage: npm run bench:captions -- FOLDER [--write]'
        : `There is no folder ${folder}.`,
    );
    return 2;
  }
  const files = readdirSync(folder)
    .filter(
      (file) =>
        /\.(?:vtt|srt)$/i.test(file) &&
        existsSync(join(folder, file.replace(/\.\w+$/, '.gold.json'))),
    )
    .sort();
  if (files.length === 0) {
    console.error(`No caption file in ${folder} has a .gold.json beside it.`);
    return 2;
  }
  const scored = files.map((file) => scoreFile(folder, file));
  const rows = [
    ...scored.map((each) => each.row),
    ['all', ...cells(pooled(scored.map((each) => each.score))), ''],
  ];
  const text = `## Jottings from captions\n\n\`npm run bench:captions -- FOLDER\`: F1 (precision/recall) against gold notes.\n\n${table(['file', ...parts, 'ms'], rows)}\n\n${conditions()}`;
  report('captions', text);
  return 0;
}

process.exitCode = main();
