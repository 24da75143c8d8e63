import { numberWords } from './number-words';
import { type StickStep } from './types';

const plural = (n: number, one: string, many: string) => `${n} ${n === 1 ? one : many}`;

/** A time on the stick as it is said: `2 minutes 48`, `48 seconds`, `1 hour 2 minutes`. */
export function spokenTime(seconds: number): string {
  const whole = Math.max(0, Math.round(Number.isFinite(seconds) ? seconds : 0));
  const h = Math.floor(whole / 3600);
  const m = Math.floor((whole % 3600) / 60);
  const s = whole % 60;
  if (h) return `${plural(h, 'hour', 'hours')}${m ? ` ${plural(m, 'minute', 'minutes')}` : ''}`;
  if (m) return `${plural(m, 'minute', 'minutes')}${s ? ` ${s}` : ''}`;
  return plural(s, 'second', 'seconds');
}

/** The same as it is written: `2:48`, `1:02:03`. */
export function clockTime(seconds: number): string {
  const whole = Math.max(0, Math.floor(Number.isFinite(seconds) ? seconds : 0));
  const two = (n: number) => String(n).padStart(2, '0');
  const h = Math.floor(whole / 3600);
  const m = Math.floor((whole % 3600) / 60);
  return h ? `${h}:${two(m)}:${two(whole % 60)}` : `${m}:${two(whole % 60)}`;
}

/** What its readings say: `two of three readings hold, one fails`. */
function spokenReadings({ verdicts }: StickStep): string {
  const total = verdicts.length;
  if (total === 0) return '';
  const count = (v: string) => verdicts.filter((x) => x.verdict === v).length;
  const holds = count('holds');
  const fails = count('fails');
  if (count('need') === total)
    return total === 1 ? 'one reading to take' : `${numberWords(total)} readings to take`;
  const hold =
    total === 1
      ? holds
        ? 'its reading holds'
        : ''
      : `${holds === 0 ? 'none' : numberWords(holds)} of ${numberWords(total)} readings ${holds === 1 ? 'holds' : 'hold'}`;
  const fail = fails
    ? total === 1
      ? 'its reading fails'
      : `${numberWords(fails)} ${fails === 1 ? 'fails' : 'fail'}`
    : '';
  return [hold, fail].filter(Boolean).join(', ');
}

/** The slider's words: `Step 4 of 9, Glue bed B to base A, 2 minutes 48, two of three readings hold`. */
export function stickValueText(step: StickStep, count: number): string {
  const running = step.waits.find((w) => w.running);
  return [
    `Step ${step.number} of ${count}`,
    step.title,
    spokenTime(step.start),
    step.failing ? 'a check fails' : '',
    spokenReadings(step),
    running
      ? `a wait runs${running.left === undefined ? '' : `, ${spokenTime(running.left)} left`}`
      : '',
    step.state === 'done' ? 'done' : '',
  ]
    .filter(Boolean)
    .join(', ');
}
