import { z } from 'zod';
import { elementId } from '../document-values';
import { entrySchema, type Entry } from './entry';

/** An entry and the bench copy it belongs to. */
export interface CopyEntry {
  copyId: string;
  entry: Entry;
}

const fileSchema = z.object({
  scantling: z.literal('bench-entries'),
  version: z.literal(1),
  savedAt: z.iso.datetime({ offset: true }),
  entries: z.array(z.object({ copyId: elementId, entry: entrySchema })).max(20_000),
});

/** Entries that could not be sent as one JSON file, in their order. `savedAt` is an ISO date and time. */
export function writeEntriesFile(entries: readonly CopyEntry[], savedAt: string): string {
  const items = entries.map(({ copyId, entry }) => ({ copyId, entry }));
  return `${JSON.stringify({ scantling: 'bench-entries', version: 1, savedAt, entries: items }, null, 2)}\n`;
}

export type EntriesFile = { ok: true; entries: CopyEntry[] } | { ok: false; message: string };

/** Reads such a file back; a broken one gives the reason and nothing else. */
export function readEntriesFile(text: string): EntriesFile {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return { ok: false, message: 'This is not a JSON file.' };
  }
  const read = fileSchema.safeParse(value);
  if (read.success) return { ok: true, entries: read.data.entries };
  const issue = read.error.issues[0];
  const where = issue?.path.join('.') ?? '';
  return {
    ok: false,
    message: where.startsWith('entries.')
      ? `Entry ${Number(issue?.path[1]) + 1} is broken (${where}: ${issue?.message ?? ''}).`
      : 'This is not a file of bench entries, or of a newer version.',
  };
}
