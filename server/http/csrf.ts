import { type RequestHandler } from 'express';
import { type Env } from '../env';
import { ApiError } from './errors';

/** Called by mail programs with a token of their own and no session (RFC 8058). */
const tokenOnly = new Set(['/unsubscribe']);
const safe = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Cookie sessions are SameSite=Lax; besides, every changing request must carry our own header (which a
 * form of another site cannot set) and, where the browser says where it comes from, come from here.
 */
export function csrf(env: Env): RequestHandler {
  return (req, _res, next) => {
    if (safe.has(req.method) || tokenOnly.has(req.path)) return next();
    const site = req.get('sec-fetch-site');
    const origin = req.get('origin');
    const host = req.get('host');
    const here =
      origin === undefined ||
      origin === env.APP_ORIGIN ||
      (host !== undefined && URL.canParse(origin) && new URL(origin).host === host);
    if (
      req.get('x-scantling') !== '1' ||
      !here ||
      (site !== undefined && site !== 'same-origin' && site !== 'none')
    ) {
      throw new ApiError(
        'request/cross-site',
        'The request did not come from this application. Nothing was changed.',
      );
    }
    next();
  };
}
