/** Seconds of `1:28`, `88` or `1:02:03.5`; null when it is no time. */
export function readClock(text: string): number | null {
  if (!/^\d+(?::\d{1,2}){0,2}(?:\.\d+)?$/.test(text.trim())) return null;
  return text
    .trim()
    .split(':')
    .reduce((sum, part) => sum * 60 + Number(part), 0);
}
