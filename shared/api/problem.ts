import { z } from 'zod';

/** One thing wrong with the input: where (path from the body's root), a stable code, and a sentence. */
export const issueSchema = z.object({
  path: z.array(z.union([z.string(), z.number()])),
  code: z.string(),
  message: z.string(),
});
export type Issue = z.infer<typeof issueSchema>;

/** RFC 9457 problem details, with every validation issue and what was kept. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  /** Stable code, e.g. `plans/stale-version`; shown to the person as "if somebody asks". */
  code: z.string(),
  /** What happened, what was kept, what to do. */
  detail: z.string().optional(),
  instance: z.string().optional(),
  issues: z.array(issueSchema).optional(),
  /** Seconds to wait before trying again, with 429 and 503. */
  retryAfter: z.number().optional(),
  /** Extra facts of a kind of problem, e.g. the current version of a draft. */
  meta: z.record(z.string(), z.unknown()).optional(),
});
export type Problem = z.infer<typeof problemSchema>;
