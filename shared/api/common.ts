import { z } from 'zod';
import { limits } from './limits';

export const id = z.uuid();
export const timestamp = z.iso.datetime({ offset: true });
/** Parameters of a path with one id in it. */
export const idParams = <N extends string>(name: N) =>
  z.object({ [name]: id } as Record<N, typeof id>);
export const okSchema = z.object({ ok: z.literal(true) });

/** Keyset paging: pass the last page's `next` back. */
export const pageQuery = z.object({
  cursor: z.string().max(300).optional(),
  limit: z.coerce.number().int().min(1).max(limits.pageSizeMax).default(limits.pageSize),
});
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({ items: z.array(item), next: z.string().nullable() });

/** How a person is shown to others. */
export const personRefSchema = z.object({
  id,
  handle: z.string(),
  displayName: z.string(),
  shopName: z.string().nullable(),
});
export type PersonRef = z.infer<typeof personRefSchema>;
