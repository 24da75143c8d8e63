import { type z } from 'zod';

/**
 * Who may call a route at all. Finer rules (is it theirs? is it published?) are policies on the
 * server; this is the floor, spelled out on every route.
 * `public` anyone · `person` signed in · `confirmed` signed in with a confirmed e-mail ·
 * `creator`, `moderator`, `admin` by role (an admin may do what a moderator may; roles are a set).
 */
export type Access = 'public' | 'person' | 'confirmed' | 'creator' | 'moderator' | 'admin';

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/** How a file is taken by a route that receives one (multipart field name and largest size). */
export interface UploadSpec {
  field: string;
  maxBytes: number;
}

/** One API route: the server mounts it, the client calls it, the OpenAPI document lists it. */
export interface Contract<
  P extends z.ZodType = z.ZodType,
  Q extends z.ZodType = z.ZodType,
  B extends z.ZodType = z.ZodType,
  R extends z.ZodType = z.ZodType,
> {
  /** Stable operation id, camelCase, e.g. `listPlans`. */
  id: string;
  method: Method;
  /** Express path below `/api`, e.g. `/plans/:planId`. */
  path: string;
  access: Access;
  summary: string;
  params?: P;
  query?: Q;
  body?: B;
  upload?: UploadSpec;
  /** Success status, 200 unless said. A 204 has no `response`. */
  status?: 200 | 201 | 204;
  response?: R;
  /** Name of the rate limit that applies (see the server's table); reads are limited generally. */
  limit?: 'sign-in' | 'mail' | 'write' | 'upload' | 'part' | 'report';
}

/** Keeps the literal types of a contract while checking its shape. */
export function contract<
  P extends z.ZodType = z.ZodUndefined,
  Q extends z.ZodType = z.ZodUndefined,
  B extends z.ZodType = z.ZodUndefined,
  R extends z.ZodType = z.ZodUndefined,
>(c: Contract<P, Q, B, R>): Contract<P, Q, B, R> {
  return c;
}

export type ParamsOf<C> =
  C extends Contract<infer P, z.ZodType, z.ZodType, z.ZodType> ? z.output<P> : never;
export type QueryOf<C> =
  C extends Contract<z.ZodType, infer Q, z.ZodType, z.ZodType> ? z.output<Q> : never;
export type BodyOf<C> =
  C extends Contract<z.ZodType, z.ZodType, infer B, z.ZodType> ? z.output<B> : never;
export type ResponseOf<C> =
  C extends Contract<z.ZodType, z.ZodType, z.ZodType, infer R> ? z.output<R> : never;
/** What a caller passes in (before defaults are filled in). */
export type BodyInput<C> =
  C extends Contract<z.ZodType, z.ZodType, infer B, z.ZodType> ? z.input<B> : never;
export type QueryInput<C> =
  C extends Contract<z.ZodType, infer Q, z.ZodType, z.ZodType> ? z.input<Q> : never;
