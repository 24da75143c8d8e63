/** A caption: seconds from the start, the words without tags. */
export interface Cue {
  start: number;
  end: number;
  text: string;
}

export interface CaptionFault {
  /** Line of the file, from 1. */
  line: number;
  code: 'time' | 'order' | 'empty' | 'format';
  message: string;
}

export interface Captions {
  format: 'vtt' | 'srt' | 'unknown';
  cues: Cue[];
  faults: CaptionFault[];
}

const time = /(?:(\d{1,4}):)?(\d{1,2}):(\d{1,2})(?:[.,](\d{1,3}))?/;
const timing = new RegExp(`^\\s*${time.source}\\s*-+>\\s*${time.source}(?:\\s.*)?$`);

function secondsOf(
  h: string | undefined,
  m: string | undefined,
  s: string | undefined,
  f: string | undefined,
): number | null {
  const minutes = Number(m);
  const whole = Number(s);
  if (minutes > 59 && h !== undefined) return null;
  if (whole > 59) return null;
  return Number(h ?? 0) * 3600 + minutes * 60 + whole + Number((f ?? '0').padEnd(3, '0')) / 1000;
}

const entities: Record<string, string> = {
  '&amp;': '&',
  '&lt;': '<',
  '&gt;': '>',
  '&nbsp;': ' ',
  '&lrm;': '',
  '&rlm;': '',
  '&#39;': "'",
  '&quot;': '"',
};

/** The words of a payload: tags, word times and style runs taken out, entities read, spaces folded. */
export function plainText(payload: string): string {
  return payload
    .replace(/<[^>]{0,200}>/g, '')
    .replace(/\{\\[^}]{0,80}\}/g, '')
    .replace(/&(?:amp|lt|gt|nbsp|lrm|rlm|quot|#39);/g, (e) => entities[e] ?? e)
    .replace(/\s+/g, ' ')
    .trim();
}

interface Raw {
  start: number;
  end: number;
  lines: string[];
}

function readBlocks(lines: string[], faults: CaptionFault[]): Raw[] {
  const cues: Raw[] = [];
  let current: Raw | null = null;
  let skipping = false;
  lines.forEach((line, i) => {
    const match = line.includes('->') ? timing.exec(line) : null;
    if (match) {
      skipping = false;
      const start = secondsOf(match[1], match[2], match[3], match[4]);
      const end = secondsOf(match[5], match[6], match[7], match[8]);
      current = null;
      if (start === null || end === null || end <= start) {
        faults.push({
          line: i + 1,
          code: 'time',
          message: 'The times of this caption make no sense; it was left out.',
        });
        skipping = true;
      } else {
        current = { start, end, lines: [] };
        cues.push(current);
      }
    } else if (line.includes('-->')) {
      faults.push({
        line: i + 1,
        code: 'time',
        message: 'This line of times cannot be read; its caption was left out.',
      });
      current = null;
      skipping = true;
    } else if (line.trim() === '') {
      current = null;
      skipping = false;
    } else if (!skipping && current) {
      current.lines.push(line);
    }
  });
  return cues;
}

/** Automatic captions repeat the line before: what was said already is taken out. */
export function mergeRolling(cues: Cue[]): Cue[] {
  const merged: Cue[] = [];
  for (const cue of cues) {
    const last = merged[merged.length - 1];
    if (!last || cue.start - last.end > 2) {
      merged.push({ ...cue });
      continue;
    }
    if (cue.text === last.text) {
      last.end = Math.max(last.end, cue.end);
      continue;
    }
    const words = cue.text.split(' ');
    const before = last.text.split(' ');
    let shared = 0;
    for (let n = Math.min(words.length, before.length); n >= 2; n -= 1) {
      if (before.slice(-n).join(' ') === words.slice(0, n).join(' ')) {
        shared = n;
        break;
      }
    }
    const text = words.slice(shared).join(' ');
    if (text === '') last.end = Math.max(last.end, cue.end);
    else merged.push({ ...cue, text });
  }
  return merged;
}

/**
 * Reads WebVTT or SubRip. Never throws: what cannot be read is named in `faults` and left out, the rest
 * is put in order. No cues at all means that the file is not captions.
 */
export function readCaptions(text: string): Captions {
  const lines = text
    .replace(/^\uFEFF/, '')
    .replace(/\u0000/g, '\uFFFD')
    .split(/\r\n|\r|\n/);
  const faults: CaptionFault[] = [];
  const first = lines.find((l) => l.trim() !== '') ?? '';
  const format = first.startsWith('WEBVTT')
    ? 'vtt'
    : /^\d+$/.test(first.trim()) || timing.test(first)
      ? 'srt'
      : 'unknown';
  const raw = readBlocks(lines, faults);
  const ordered = raw.every((cue, i) => i === 0 || raw[i - 1]!.start <= cue.start);
  if (!ordered)
    faults.push({
      line: 1,
      code: 'order',
      message: 'The captions were out of order; they were sorted by their times.',
    });
  const cues = raw
    .map(({ start, end, lines: payload }) => ({ start, end, text: plainText(payload.join(' ')) }))
    .filter((cue) => cue.text !== '')
    .sort((a, b) => a.start - b.start);
  if (cues.length === 0)
    faults.push({
      line: 1,
      code: 'empty',
      message: 'No caption was found. Export the captions as .vtt or .srt and try again.',
    });
  return { format, cues: mergeRolling(cues), faults };
}

/** Seconds as a WebVTT time, from whole milliseconds. */
export function vttTime(seconds: number): string {
  const ms = Math.round(seconds * 1000);
  const pad = (n: number, width = 2) => String(n).padStart(width, '0');
  return `${pad(Math.floor(ms / 3_600_000))}:${pad(Math.floor(ms / 60_000) % 60)}:${pad(Math.floor(ms / 1000) % 60)}.${pad(ms % 1000, 3)}`;
}

/** Cues as a WebVTT file. */
export function toVtt(cues: readonly Cue[]): string {
  const escape = (text: string) =>
    text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;');
  return [
    'WEBVTT',
    '',
    ...cues.flatMap((cue) => [
      `${vttTime(cue.start)} --> ${vttTime(cue.end)}`,
      escape(cue.text),
      '',
    ]),
  ].join('\n');
}
