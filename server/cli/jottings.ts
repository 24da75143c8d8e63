import { readFile, stat } from 'node:fs/promises';
import { basename } from 'node:path';
import { jot, readCaptions, type Captions, type Jottings } from '../../shared/captions';
import { type Command } from './index';

const usage = 'usage: scantling jottings FILE.vtt|FILE.srt [--json]';
const mostBytes = 20 * 1024 * 1024;

/** What `--json` prints: the figures that are scored, and titles, tools, materials beside them. */
function asResult(file: string, captions: Captions, jottings: Jottings): unknown {
  return {
    file: basename(file),
    units: jottings.units,
    duration: jottings.duration,
    steps: jottings.steps.map(({ start, end, title, phase }) => ({ start, end, title, phase })),
    measures: jottings.measures.map(
      ({ t, text, value, values, range, unit, kind, qualifier, refersTo }) => ({
        t,
        text,
        value,
        values,
        range,
        unit,
        kind,
        qualifier,
        refersTo,
      }),
    ),
    cautions: jottings.cautions.map(({ t, text }) => ({ t, text })),
    corrections: jottings.corrections.map(({ t, heard, meant, why }) => ({ t, heard, meant, why })),
    tools: jottings.tools.map(({ t, name, text }) => ({ t, name, text })),
    materials: jottings.materials.map(({ t, name, text }) => ({ t, name, text })),
    faults: captions.faults,
  };
}

function asText(jottings: Jottings): string {
  const clock = (t: number) =>
    `${Math.floor(t / 60)}:${String(Math.floor(t % 60)).padStart(2, '0')}`.padStart(7);
  const size = (m: Jottings['measures'][number]) =>
    `${(m.values ?? [m.value]).join(m.range ? ' to ' : ' × ')} ${m.unit}`;
  return [
    ...jottings.steps.map((step) => `${clock(step.start)}  ${step.phase.padEnd(6)} ${step.title}`),
    '',
    ...jottings.measures.map((m) => `${clock(m.t)}  ${size(m).padEnd(22)} ${m.text}`),
    '',
    ...jottings.cautions.map((caution) => `${clock(caution.t)}  Caution: ${caution.text}`),
    ...jottings.corrections.map(
      (c) => `${clock(c.t)}  Heard “${c.heard}”, perhaps “${c.meant}”. ${c.why}`,
    ),
    '',
    `Tools: ${jottings.tools.map((tool) => tool.name).join(', ') || 'none heard'}`,
    `Materials: ${jottings.materials.map((material) => material.name).join(', ') || 'none heard'}`,
  ].join('\n');
}

/** The text of a file, or the sentence that says why it cannot be read. */
async function open(path: string): Promise<{ text: string } | { error: string }> {
  try {
    const { size } = await stat(path);
    if (size > mostBytes)
      return {
        error: `${path} is larger than 20 MB. Caption files are far smaller; choose the .vtt or .srt file.`,
      };
    return { text: await readFile(path, 'utf8') };
  } catch (error) {
    const why =
      (error as NodeJS.ErrnoException).code === 'ENOENT'
        ? 'There is no such file'
        : 'It cannot be read';
    return { error: `${path}: ${why}. Nothing was written; check the path.` };
  }
}

const command: Command = {
  name: 'jottings',
  summary: 'Jot down what a caption file says: steps, measures, tools, cautions',
  async run(argv) {
    const path = argv.find((word) => !word.startsWith('--'));
    const unknown = argv.find((word) => word.startsWith('--') && word !== '--json');
    if (path === undefined || unknown !== undefined) {
      console.error(unknown === undefined ? usage : `There is no option ${unknown}.\n${usage}`);
      return 2;
    }
    const file = await open(path);
    if ('error' in file) {
      console.error(file.error);
      return 2;
    }
    const captions = readCaptions(file.text, { fileName: path });
    const fatal = captions.faults.find((fault) => fault.fatal);
    if (fatal) {
      console.error(`${path}: ${fatal.sentence}`);
      return 2;
    }
    const jottings = jot(captions);
    console.log(
      argv.includes('--json')
        ? JSON.stringify(asResult(path, captions, jottings), null, 1)
        : asText(jottings),
    );
    return 0;
  },
};

export default command;
