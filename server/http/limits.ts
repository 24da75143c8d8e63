import { type RequestHandler } from 'express';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { type Contract } from '../../shared/api/contract';
import { type Deps } from '../deps';
import { personOf } from './person';
import { ApiError } from './errors';

type Name = NonNullable<Contract['limit']> | 'read';

/** Points per window in seconds, per person or address. They hold across processes (PostgreSQL). */
export const rates: Record<Name, { points: number; duration: number }> = {
  'sign-in': { points: 20, duration: 300 },
  mail: { points: 5, duration: 900 },
  write: { points: 240, duration: 60 },
  upload: { points: 60, duration: 600 },
  part: { points: 3000, duration: 600 },
  report: { points: 20, duration: 3600 },
  read: { points: 1200, duration: 60 },
};

/** A limiter for a named rate. Reads are not limited here: they cost less than counting them. */
export function limiter(deps: Deps, name: Name): RequestHandler {
  const { points, duration } = rates[name];
  const store = new RateLimiterPostgres({
    storeClient: deps.db,
    storeType: 'typeorm',
    tableName: 'rate_limits',
    tableCreated: true,
    keyPrefix: name,
    points: points * deps.env.RATE_FACTOR,
    duration,
  });
  return async (req, res, next) => {
    const key = personOf(req)?.id ?? req.ip ?? 'unknown';
    try {
      await store.consume(key);
    } catch (error) {
      if (!(error instanceof RateLimiterRes)) throw error;
      const wait = Math.ceil(error.msBeforeNext / 1000);
      res.set('Retry-After', String(wait));
      throw new ApiError(
        'request/too-many',
        `Too many of these in a short time. Nothing was changed; try again in ${wait} seconds.`,
        { retryAfter: wait },
      );
    }
    next();
  };
}
