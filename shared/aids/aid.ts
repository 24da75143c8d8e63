import { z } from 'zod';
import { type Outcome } from './outcome';

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
      const parsed = aid.input.safeParse(raw);
      if (parsed.success) return aid.work(parsed.data);
      const [issue] = parsed.error.issues;
      return {
        ok: false,
        field: issue?.path.join('.') || 'input',
        reason: issue?.message ?? 'This is no input for the aid.',
        cure: 'Give every input in its kind; figures as numbers.',
      };
    },
  };
}
