import { type PlanDocument } from './document';
import { elapsedOf, scheduleOf } from './schedule';

/** What lists, filters and the plan page say about a plan at a glance; derived, never stored by hand. */
export interface PlanFacts {
  steps: number;
  /** Hands-on minutes, added up. */
  handsOn: number;
  /** Minutes along the longest chain, waits included. */
  elapsed: number;
  /** Machine classes that are needed and have no "instead". */
  machines: string[];
  clipDuration: number | null;
}

/** Works out the facts of a plan. A wait that lets the next step start counts only if it outlasts the rest. */
export function planFacts(document: PlanDocument): PlanFacts {
  const machines = document.tools
    .filter((tool) => tool.needed && tool.instead === '' && tool.machine !== 'hand-tool')
    .map((tool) => tool.machine);
  return {
    steps: document.steps.length,
    handsOn: document.steps.reduce((sum, step) => sum + step.handsOn, 0),
    elapsed: elapsedOf(scheduleOf(document)),
    machines: [...new Set(machines)],
    clipDuration: document.clip.source === 'none' ? null : document.clip.duration,
  };
}

const reference = /\{\{(?:dim|part):[0-9a-f-]+\}\}/g;

/** The words a plan is found by, weightiest first: title, then summary and names, then step texts. */
export function planWords(document: PlanDocument): { title: string; names: string; text: string } {
  return {
    title: document.title,
    names: [
      document.summary,
      ...document.parts.map((p) => p.name),
      ...document.tools.map((t) => `${t.name} ${t.machine.replace('-', ' ')}`),
      ...document.stock.map((s) => `${s.name} ${s.material}`),
      ...document.hardware.map((h) => h.name),
      ...document.steps.map((s) => s.title),
    ].join(' \n'),
    text: document.steps.map((s) => s.text.replace(reference, ' ')).join(' \n'),
  };
}

/** Media hashes a document shows: cover, clip, its captions and poster, photos. */
export function mediaOf(document: PlanDocument): string[] {
  const { clip } = document;
  return [
    document.cover,
    ...(clip.source === 'upload' ? [clip.media, clip.poster, clip.captions] : []),
    ...(clip.source === 'hosted' ? [clip.captions] : []),
    ...document.photos.map((p) => p.media),
  ].filter((hash): hash is string => hash !== undefined);
}

/** The letter after `letter`: A … Z, AA, AB … */
export function nextLetter(letter: string | null): string {
  if (letter === null) return 'A';
  const last = letter.charCodeAt(letter.length - 1);
  if (last < 90) return letter.slice(0, -1) + String.fromCharCode(last + 1);
  return letter.length === 1 ? 'AA' : nextLetter(letter.slice(0, -1)) + 'A';
}
