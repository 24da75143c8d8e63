import { type CaptionFault, type Captions, type Cue, type CaptionFormat } from '../types';
import { readBlocks, type RawCue } from './blocks';
import { cueWords } from './cue-text';
import { mergeRolling } from './rolling';
import { readTiming, vttTime } from './time';

const mostFaults = 100;
/** A caption without an end is held this long, or to the next one. */
const held = 4;

function formatOf(lines: readonly string[], fileName: string): CaptionFormat {
  const first = lines.findIndex((line) => line.trim() !== '');
  const line = lines[first] ?? '';
  if (/^WEBVTT(?:\s|$)/.test(line)) return 'vtt';
  if (readTiming(line) || (/^\s*\d+\s*$/.test(line) && readTiming(lines[first + 1] ?? '')))
    return 'srt';
  if (/\.vtt$/i.test(fileName)) return 'vtt';
  return /\.srt$/i.test(fileName) ? 'srt' : 'unknown';
}

/** Captions in order, none running into the next, none without an end. */
function putRight(raw: readonly RawCue[], faults: CaptionFault[]): RawCue[] {
  const late = raw.findIndex((cue, i) => i > 0 && cue.start < (raw[i - 1]?.start ?? 0));
  if (late > 0)
    faults.push({
      line: raw[late]?.line ?? 1,
      code: 'order',
      sentence: 'The captions were out of order from here. They were sorted by their times.',
    });
  return [...raw].sort((a, b) => a.start - b.start);
}

function endOf(cue: RawCue, next: RawCue | undefined): number {
  const end = Number.isNaN(cue.end) ? cue.start + held : cue.end;
  return next && next.start > cue.start ? Math.min(end, next.start) : end;
}

function joinSameStart(cues: readonly RawCue[]): RawCue[] {
  const joined: RawCue[] = [];
  for (const cue of cues) {
    const last = joined[joined.length - 1];
    if (last && last.start === cue.start) {
      if (last.lines.join(' ') !== cue.lines.join(' ')) last.lines = [...last.lines, ...cue.lines];
      last.end = Number.isNaN(cue.end)
        ? last.end
        : Math.max(Number.isNaN(last.end) ? 0 : last.end, cue.end);
    } else joined.push({ ...cue });
  }
  return joined;
}

function toCue(cue: RawCue, next: RawCue | undefined): Cue {
  const end = endOf(cue, next);
  const words = cueWords(cue.lines.join(' '), cue.start, end);
  return { start: cue.start, end, text: words.map((word) => word.text).join(' '), words };
}

function fewFaults(faults: CaptionFault[]): CaptionFault[] {
  if (faults.length <= mostFaults) return faults;
  const rest = faults.length - mostFaults;
  return [
    ...faults.slice(0, mostFaults),
    {
      line: faults[mostFaults]?.line ?? 1,
      code: 'too-many',
      sentence: `${rest} more faults of this kind are not listed.`,
    },
  ];
}

/**
 * Reads WebVTT or SubRip. Never throws: what cannot be read is named in `faults` and left out, the rest is
 * put in order and rolling repeats are merged. A fault with `fatal` means that the file holds no captions.
 */
export function readCaptions(text: string, options: { fileName?: string } = {}): Captions {
  const lines = text
    .replace(/^\uFEFF/, '')
    .replace(/\u0000/g, '\uFFFD')
    .split(/\r\n|\r|\n/);
  const faults: CaptionFault[] = [];
  const format = formatOf(lines, options.fileName ?? '');
  if (format === 'vtt' && !/^WEBVTT(?:\s|$)/.test(lines[0] ?? ''))
    faults.push({
      line: 1,
      code: 'header',
      sentence: 'The file does not begin with WEBVTT. It was read as if it did.',
    });
  const raw = putRight(readBlocks(lines, format === 'vtt', faults), faults);
  const merged = mergeRolling(joinSameStart(raw));
  const cues = merged
    .map((cue, i) => toCue(cue, merged[i + 1]))
    .filter((cue) => cue.words.length > 0);
  if (cues.length === 0)
    faults.push({
      line: 1,
      code: text.trim() === '' ? 'empty' : 'format',
      fatal: true,
      sentence:
        text.trim() === ''
          ? 'The file is empty. Export the captions as .vtt or .srt and choose that file.'
          : 'No caption was found in this file. Export the captions as .vtt or .srt and choose that file.',
    });
  return { format, cues, faults: fewFaults(faults) };
}

/** Cues as a WebVTT file. */
export function toVtt(cues: readonly Pick<Cue, 'start' | 'end' | 'text'>[]): string {
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
