import { type CaptionFault } from '../types';
import { readTiming } from './time';

/** A cue as it stands in the file. */
export interface RawCue {
  line: number;
  start: number;
  end: number;
  lines: string[];
}

const skipped = /^(?:NOTE|STYLE|REGION)(?:\s|:|$)/;

/**
 * Cues of the lines, after the W3C parsing algorithm (WebVTT §6.1) made lax enough for SubRip as it is
 * met: a timing line starts a cue wherever it stands, a counter or name before it is not text.
 */
export function readBlocks(
  lines: readonly string[],
  vtt: boolean,
  faults: CaptionFault[],
): RawCue[] {
  const cues: RawCue[] = [];
  let current: RawCue | null = null;
  let skipping = vtt;
  let blank = true;
  // In WebVTT a line of spaces is text; only an empty one ends a block.
  const isBlank = (line: string) => (vtt ? line : line.trim()) === '';
  lines.forEach((line, i) => {
    const times = readTiming(line);
    if (times) {
      // SubRip without the blank line: the counter above belongs to this cue.
      if (current && /^\s*\d+\s*$/.test(current.lines[current.lines.length - 1] ?? ''))
        current.lines.pop();
      current = startCue(times, i + 1, faults);
      if (current) cues.push(current);
      skipping = current === null;
    } else if (line.includes('-->')) {
      faults.push({
        line: i + 1,
        code: 'time',
        sentence: 'The times on this line cannot be read. Its caption was left out.',
      });
      current = null;
      skipping = true;
    } else if (isBlank(line)) {
      skipping = false;
      if (vtt) current = null;
    } else if (blank && skipped.test(line) && vtt) {
      current = null;
      skipping = true;
    } else if (!skipping && current) {
      // In SubRip a blank line may stand inside a caption; only a counter ends it.
      if (!(blank && /^\s*\d+\s*$/.test(line) && nextIsTiming(lines, i))) current.lines.push(line);
    }
    blank = isBlank(line);
  });
  return cues;
}

function nextIsTiming(lines: readonly string[], at: number): boolean {
  return readTiming(lines[at + 1] ?? '') !== null;
}

function startCue(
  times: { start: number; end: number },
  line: number,
  faults: CaptionFault[],
): RawCue | null {
  if (Number.isNaN(times.start)) {
    faults.push({
      line,
      code: 'time',
      sentence: 'This caption starts at a time that does not exist. It was left out.',
    });
    return null;
  }
  if (Number.isNaN(times.end) || times.end <= times.start) {
    faults.push({
      line,
      code: 'time',
      sentence: 'This caption ends before it starts. It was kept up to the next one.',
    });
    return { line, start: times.start, end: NaN, lines: [] };
  }
  return { line, start: times.start, end: times.end, lines: [] };
}
