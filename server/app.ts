import { existsSync } from 'node:fs';
import express, {
  Router,
  type ErrorRequestHandler,
  type Express,
  type RequestHandler,
} from 'express';
import helmet from 'helmet';
import { pinoHttp } from 'pino-http';
import { v7 as uuid } from 'uuid';
import { limits } from '../shared/api/limits';
import { planJsonSchema } from '../shared/plan/interchange';
import { type Deps } from './deps';
import { registerFeatures } from './features';
import { headFor } from './features/plans/plans.head';
import { registerMediaFiles } from './features/media/media.files';
import { csrf } from './http/csrf';
import { ApiError, toApiError } from './http/errors';
import { openApi } from './http/openapi';
import { sessions } from './http/sessions';
import { scriptHashes, serveWeb } from './http/web';

/** The policy of what a page may load: our own files, and media from the media origin. */
function contentPolicy(deps: Deps): RequestHandler {
  const media = new URL(deps.env.MEDIA_ORIGIN ?? deps.env.S3_ENDPOINT).origin;
  const { WEB_DIR } = deps.env;
  const hashes = WEB_DIR && existsSync(WEB_DIR) ? scriptHashes(WEB_DIR) : [];
  return helmet({
    contentSecurityPolicy: {
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'", ...hashes],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:', media],
        mediaSrc: ["'self'", 'blob:', media],
        connectSrc: ["'self'", media],
        fontSrc: ["'self'"],
        workerSrc: ["'self'", 'blob:'],
        objectSrc: ["'none'"],
        frameAncestors: ["'none'"],
        upgradeInsecureRequests: null,
      },
    },
    strictTransportSecurity: deps.env.APP_ORIGIN.startsWith('https:') ? undefined : false,
    crossOriginEmbedderPolicy: false,
  });
}

/** One handler, one shape: RFC 9457 problem details; never a stack. */
function problems(deps: Deps): ErrorRequestHandler {
  return (error: unknown, req, res, next) => {
    if (res.headersSent) return next(error);
    const known = toApiError(error);
    if (!known) deps.log.error({ err: error, path: req.path }, 'a request failed');
    const answer =
      known ??
      new ApiError(
        'server/broke',
        'The fault is ours and has been noted. What you sent was not kept; try again in a minute.',
      );
    res
      .status(answer.status)
      .type('application/problem+json')
      .json(answer.problem(req.originalUrl));
  };
}

function apiRouter(deps: Deps): Router {
  const api = Router();
  api.get('/healthz', async (_req, res) => {
    await deps.db.query('SELECT 1');
    res.json({ ok: true });
  });
  api.get('/openapi.json', (_req, res) => {
    res.json(openApi());
  });
  const planSchema = planJsonSchema();
  api.get('/plan-schema.json', (_req, res) => {
    res.type('application/schema+json').json(planSchema);
  });
  registerFeatures(api, deps);
  api.use((req) => {
    throw new ApiError('thing/missing', `There is no ${req.method} ${req.baseUrl}${req.path}.`);
  });
  return api;
}

/** The whole application on what it is given; it does not listen yet. */
export function createApp(deps: Deps): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', 'loopback');
  app.use(
    pinoHttp({
      logger: deps.log,
      genReqId: () => uuid(),
      autoLogging: { ignore: (req) => !req.url?.startsWith('/api') },
      serializers: {
        req: (req: { method: string; url: string }) => ({
          method: req.method,
          url: req.url.split('?')[0],
        }),
        res: (res: { statusCode: number }) => ({ status: res.statusCode }),
      },
    }),
  );
  app.use(contentPolicy(deps));
  app.use(['/api', '/media'], ...sessions(deps));
  app.use('/api', (_req, res, next) => {
    res.set('Cache-Control', 'no-store');
    next();
  });
  app.use(
    '/api',
    csrf(deps.env),
    express.json({ limit: limits.draftBytes + 64 * 1024 }),
    apiRouter(deps),
  );
  registerMediaFiles(app, deps);
  if (deps.env.WEB_DIR) {
    serveWeb(app, {
      dir: deps.env.WEB_DIR,
      development: deps.env.NODE_ENV === 'development',
      headFor: (path) => headFor(deps, path),
    });
  }
  app.use(problems(deps));
  return app;
}
