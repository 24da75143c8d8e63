import { z } from 'zod';
import { readFigures } from './figures';
import { refused, type Outcome } from './outcome';

/** A bench aid without its types: what the list, the command line and the screens' frame need. */
export interface AnyAid {
  /** Its folder's name and the end of its address. */
  id: string;
  title: string;
  /** What it answers, in one line. */
  what: string;
  /** Sources in one line, with "common practice" and "from memory" said. */
  sources: string;
  /** The usual caution where the work can hurt. */
  caution?: string;
  /** An input that works, as JSON. */
  example: unknown;
  /** Reads any input and works it out; what does not fit the input is refused too. */
  run: (raw: unknown) => Outcome<unknown>;
  /** JSON Schema of the input. */
  schema: () => unknown;
}

export interface Aid<S extends z.ZodType, R> extends AnyAid {
  input: S;
  example: z.input<S>;
  work: (input: z.output<S>) => Outcome<R>;
  run: (raw: unknown) => Outcome<R>;
}

/** An aid from its input, its pure function and its words; `run` and `schema` follow from them. */
export function defineAid<S extends z.ZodType, R>(
  aid: Omit<Aid<S, R>, 'run' | 'schema'>,
): Aid<S, R> {
  return {
    ...aid,
    schema: () => z.toJSONSchema(aid.input, { io: 'input' }),
    run: (raw) => {
      const strict = aid.input instanceof z.ZodObject ? aid.input.strict() : aid.input;
      const parsed = readFigures(strict, raw);
      if (!parsed.success) return refusal(parsed.error);
      const outcome = aid.work(parsed.data as z.output<S>);
      return outcome.ok && !allFinite(outcome.result)
        ? refused('input', 'These figures lead to no finite answer.', 'Check them again.')
        : outcome;
    },
  };
}

/** The first thing that does not fit, by its place in the input. */
function refusal(error: z.ZodError): Outcome<never> {
  const [issue] = error.issues;
  if (issue?.code === 'unrecognized_keys')
    return refused(
      issue.keys.join(', '),
      `There is no input ${issue.keys.join(', ')}.`,
      'Leave it out; the list of aids names the inputs.',
    );
  return refused(
    issue?.path.join('.') || 'input',
    issue?.message ?? 'This is no input for the aid.',
    'Give every input in its kind; lengths as millimetres or as written, "3/4 in".',
  );
}

/** No figure that is not a number leaves an aid. */
function allFinite(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (typeof value !== 'object' || value === null) return true;
  return Object.values(value).every(allFinite);
}
