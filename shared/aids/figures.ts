import { type z } from 'zod';
import { parseLength } from '../measure';

type Path = readonly PropertyKey[];

/** Where a schema wanted a number and found a text. */
function texts(issue: z.core.$ZodIssue, under: Path = []): Path[] {
  const path = [...under, ...issue.path];
  if (issue.code === 'invalid_union')
    return issue.errors.flat().flatMap((inner) => texts(inner, path));
  return issue.code === 'invalid_type' && issue.expected === 'number' ? [path] : [];
}

const at = (value: unknown, key: PropertyKey): unknown =>
  typeof value === 'object' && value !== null ? (value as Record<PropertyKey, unknown>)[key] : null;

/** A copy with another value at a path. */
function withValue(value: unknown, [key, ...rest]: Path, put: unknown): unknown {
  if (key === undefined) return put;
  const next = withValue(at(value, key), rest, put);
  if (Array.isArray(value)) return value.map((old: unknown, i) => (i === key ? next : old));
  return { ...(value as object), [key]: next };
}

/**
 * Parses an input; a length where a number is wanted may be written as a maker writes it: `"3/4 in"` is 19.05, in
 * millimetres. What is no length is left for the schema to refuse.
 */
export function readFigures<S extends z.ZodType>(schema: S, raw: unknown) {
  const parsed = schema.safeParse(raw);
  if (parsed.success) return parsed;
  let input = raw;
  for (const path of parsed.error.issues.flatMap((issue) => texts(issue))) {
    const found = path.reduce(at, input);
    if (typeof found !== 'string') continue;
    const length = parseLength(found, { unit: 'mm' });
    if (length.ok) input = withValue(input, path, length.value.mm.toNumber());
  }
  return input === raw ? parsed : schema.safeParse(input);
}
