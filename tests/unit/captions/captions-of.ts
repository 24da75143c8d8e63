import { readCaptions, type Captions } from '../../../shared/captions';
import { vttTime } from '../../../shared/captions';

/** Captions of these lines, each of four seconds. */
export function captionsOf(lines: readonly string[]): Captions {
  const cues = lines.map((line, i) => `${vttTime(i * 4)} --> ${vttTime(i * 4 + 4)}\n${line}\n`);
  return readCaptions(`WEBVTT\n\n${cues.join('\n')}`);
}
