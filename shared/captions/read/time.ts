const stamp = String.raw`(?:(\d{1,6})\s?:\s?)?(\d{1,3})\s?:\s?(\d{1,2})(?:\s?[.,:]\s?(\d{1,9}))?`;
const stampOnly = new RegExp(`^${stamp}$`);
const timing = new RegExp(String.raw`^\s*${stamp}\s*-{1,3}\s?>\s*${stamp}(?:\s.*)?$`);

/** Seconds of the parts of a time, or null when it is none (minutes or seconds over 59). */
function seconds(parts: readonly (string | undefined)[]): number | null {
  const [h, m, s, fraction] = parts;
  const minutes = Number(m);
  const whole = Number(s);
  if (minutes > 59 || whole > 59) return null;
  const rest = fraction === undefined ? 0 : Number(`0.${fraction}`);
  return Number(h ?? 0) * 3600 + minutes * 60 + whole + Math.round(rest * 1000) / 1000;
}

/** A time of its own, as inside a cue: `00:00:01.400`. */
export function readStamp(text: string): number | null {
  const match = stampOnly.exec(text.trim());
  return match ? seconds(match.slice(1, 5)) : null;
}

/** Start and end of a timing line; null when the line is none; NaN for a time that is none. */
export function readTiming(line: string): { start: number; end: number } | null {
  if (!line.includes('>')) return null;
  const match = timing.exec(line.slice(0, 400));
  if (!match) return null;
  return { start: seconds(match.slice(1, 5)) ?? NaN, end: seconds(match.slice(5, 9)) ?? NaN };
}

/** Seconds as a WebVTT time, from whole milliseconds. */
export function vttTime(seconds: number): string {
  const ms = Math.round(seconds * 1000);
  const pad = (n: number, width = 2) => String(n).padStart(width, '0');
  return `${pad(Math.floor(ms / 3_600_000))}:${pad(Math.floor(ms / 60_000) % 60)}:${pad(Math.floor(ms / 1000) % 60)}.${pad(ms % 1000, 3)}`;
}
