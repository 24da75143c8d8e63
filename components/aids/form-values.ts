import { parseLength } from '../../shared/measure';

/** What stands in a form, by the key of its field; rows of a list as `day.0.level`, their number as `day.count`. */
export type Values = Readonly<Record<string, string>>;

export interface AidField {
  /** Where it goes in the aid's input; a dot goes one deeper. */
  key: string;
  label: string;
  /** Lengths are typed in any form; a bare figure is in the person's unit. Temperatures in °F with inches. */
  kind: 'length' | 'lengths' | 'temperature' | 'number' | 'choice' | 'yes' | 'words';
  unit?: string;
  help?: string;
  options?: readonly { value: string; label: string }[];
  optional?: boolean;
  /** A choice whose values are figures. */
  figures?: boolean;
}

/** A list of rows with the same fields. */
export interface AidRows {
  key: string;
  kind: 'rows';
  /** One of them, e.g. `board`. */
  noun: string;
  columns: readonly AidField[];
}

export type AidPart = AidField | AidRows;
export type Units = 'mm' | 'in';

/** An input as JSON, or what is wrong with which field. */
export interface Read {
  input: unknown;
  errors: Readonly<Record<string, string>>;
}

interface Slot {
  value?: unknown;
  error?: string;
}

const minus = (text: string) => text.replace(/^[−–]/, '-').replace(',', '.');

function length(text: string, unit: Units): Slot {
  const below = /^[-−–]/.test(text);
  const parsed = parseLength(text.replace(/^[-−–]\s*/, ''), { unit });
  if (!parsed.ok) return { error: `${parsed.message} ${parsed.cure}` };
  const mm = parsed.value.mm.toNumber();
  return { value: below ? -mm : mm };
}

function lengths(text: string, unit: Units): Slot {
  const read = text
    .split(/[,;]/)
    .map((each) => each.trim())
    .filter(Boolean)
    .map((each) => length(each, unit));
  const wrong = read.find(({ error }) => error);
  return wrong ?? { value: read.map(({ value }) => value) };
}

function figure(text: string): Slot {
  const value = Number(minus(text.replace(/\s/g, '')));
  return Number.isFinite(value) ? { value } : { error: 'This is no figure. Type it in digits.' };
}

function temperature(text: string, unit: Units): Slot {
  const read = figure(text);
  if (read.error || unit === 'mm') return read;
  return { value: ((Number(read.value) - 32) * 5) / 9 };
}

const readers: Record<AidField['kind'], (text: string, unit: Units) => Slot> = {
  length,
  lengths,
  temperature,
  number: figure,
  choice: (value) => ({ value }),
  words: (value) => ({ value }),
  yes: (value) => ({ value: value === 'yes' }),
};

function slot(field: AidField, typed: string | undefined, unit: Units): Slot {
  const text = (typed ?? '').trim();
  if (field.figures && text !== '') return figure(text);
  if (text !== '' || field.kind === 'yes') return readers[field.kind](text, unit);
  return field.optional || field.kind === 'words' ? {} : { error: 'A figure is missing here.' };
}

function put(into: Record<string, unknown>, key: string, value: unknown): void {
  const [first = '', ...rest] = key.split('.');
  if (rest.length === 0) {
    into[first] = value;
    return;
  }
  const inner = (into[first] ?? {}) as Record<string, unknown>;
  into[first] = inner;
  put(inner, rest.join('.'), value);
}

/** How many rows of a list stand in the form. */
export const rowCount = (values: Values, key: string): number =>
  Math.max(1, Number(values[`${key}.count`] ?? 1) || 1);

/** The aid's input from what stands in the form. */
export function readForm(parts: readonly AidPart[], values: Values, unit: Units): Read {
  const input: Record<string, unknown> = {};
  const errors: Record<string, string> = {};
  const take = (field: AidField, key: string, into: Record<string, unknown>) => {
    const { value, error } = slot(field, values[key], unit);
    if (error) errors[key] = error;
    else if (value !== undefined) put(into, field.key, value);
  };
  for (const part of parts) {
    if (part.kind !== 'rows') {
      take(part, part.key, input);
      continue;
    }
    input[part.key] = Array.from({ length: rowCount(values, part.key) }, (_, i) => {
      const row: Record<string, unknown> = {};
      for (const column of part.columns) take(column, `${part.key}.${i}.${column.key}`, row);
      return row;
    });
  }
  return { input, errors };
}
