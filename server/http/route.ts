import { type Request, type RequestHandler, type Response, type Router } from 'express';
import { type z } from 'zod';
import {
  type BodyOf,
  type Contract,
  type ParamsOf,
  type QueryOf,
  type ResponseOf,
} from '../../shared/api/contract';
import { type Issue } from '../../shared/api/problem';
import { type PersonEntity } from '../db/entities/person';
import { type Deps } from '../deps';
import { ApiError } from './errors';
import { limiter } from './limits';
import { personOf, requireAccess } from './person';

/*
 * How to add a route:
 * 1. Describe it in shared/api/<noun>.ts with `contract({...})` and list it in the noun's array.
 * 2. In server/features/<noun>/<noun>.routes.ts call `route(router, deps, contract, handler)`.
 * 3. The handler loads, asks the policy, acts through the service, and presents.
 * Rate limit, sign-in, access floor, validation and the shape of the answer are done here.
 */

type AnyContract = Contract<z.ZodType, z.ZodType, z.ZodType, z.ZodType>;

export interface Call<C> {
  params: ParamsOf<C>;
  query: QueryOf<C>;
  body: BodyOf<C>;
  /** Null only on public routes. */
  person: PersonEntity | null;
  req: Request;
  res: Response;
}

export type Handler<C> = (call: Call<C>) => Promise<ResponseOf<C> | void>;

/** The person on a route whose floor is at least `person`. */
export function signedIn(person: PersonEntity | null): PersonEntity {
  if (!person) throw new ApiError('auth/needed', 'You are not signed in. Sign in and try again.');
  return person;
}

const mounted = new Map<string, AnyContract>();
/** Contracts that have been mounted, by id; the route walk of the tests compares it with the list. */
export const mountedContracts = (): ReadonlyMap<string, AnyContract> => mounted;

function issuesOf(error: z.ZodError, part: string): Issue[] {
  return error.issues.map((issue) => ({
    path: (part === 'body' ? issue.path : [part, ...issue.path]).map((p) =>
      typeof p === 'symbol' ? String(p) : p,
    ),
    code: issue.code,
    message: issue.message,
  }));
}

function readInput(contract: AnyContract, req: Request) {
  const issues: Issue[] = [];
  const read = (
    part: 'params' | 'query' | 'body',
    schema: z.ZodType | undefined,
    value: unknown,
  ): unknown => {
    if (!schema) return undefined;
    const parsed = schema.safeParse(value ?? {});
    if (parsed.success) return parsed.data;
    issues.push(...issuesOf(parsed.error, part));
    return undefined;
  };
  const params = read('params', contract.params, req.params);
  const query = read('query', contract.query, req.query);
  const body = read('body', contract.body, req.body);
  if (issues.length > 0) {
    throw new ApiError(
      'request/invalid',
      'Some fields are not right; each is named. Nothing was changed.',
      { issues },
    );
  }
  return { params, query, body };
}

/** Mounts one contract. Extra middleware (a file receiver) comes after the access floor. */
export function route<C extends AnyContract>(
  router: Router,
  deps: Deps,
  contract: C,
  handler: Handler<C>,
  ...middleware: RequestHandler[]
): void {
  mounted.set(contract.id, contract);
  const floor: RequestHandler = (req, _res, next) => {
    requireAccess(personOf(req), contract.access, deps.now());
    next();
  };
  const act: RequestHandler = async (req, res) => {
    const input = readInput(contract, req) as Pick<Call<C>, 'params' | 'query' | 'body'>;
    const answer = await handler({ ...input, person: personOf(req), req, res });
    if (contract.status === 204 || !contract.response) {
      res.status(contract.status ?? 204).end();
      return;
    }
    // Outside production the answer goes through its schema, so that a presenter cannot drift from it.
    const body = deps.env.NODE_ENV === 'production' ? answer : contract.response.parse(answer);
    res.status(contract.status ?? 200).json(body);
  };
  const limits = contract.limit ? [limiter(deps, contract.limit)] : [];
  const method = contract.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  router[method](contract.path, ...limits, floor, ...middleware, act);
}
