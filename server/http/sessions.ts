import connectPgSimple from 'connect-pg-simple';
import { type RequestHandler } from 'express';
import session from 'express-session';
import passport from 'passport';
import { Strategy as LocalStrategy } from 'passport-local';
import { type Pool } from 'pg';
import { checkPassword } from '../features/accounts/passwords';
import { findPersonByEmail, findPersonById } from '../features/accounts/accounts.repository';
import { type Deps } from '../deps';

declare module 'express-session' {
  interface SessionData {
    device?: string;
    createdAt?: string;
    lastSeenAt?: string;
  }
}

const month = 30 * 24 * 3600 * 1000;
const seenEvery = 5 * 60 * 1000;

/** The pool TypeORM already holds; sessions share it. */
function poolOf(deps: Deps): Pool {
  return (deps.db.driver as unknown as { master: Pool }).master;
}

/** Notes when and from what a session was last used, at most every five minutes. */
function lastSeen(deps: Deps): RequestHandler {
  return (req, _res, next) => {
    if (req.user) {
      const now = deps.now();
      const before = req.session.lastSeenAt ? Date.parse(req.session.lastSeenAt) : 0;
      if (now.getTime() - before > seenEvery) req.session.lastSeenAt = now.toISOString();
    }
    next();
  };
}

/** Sessions in PostgreSQL, and who they belong to. */
export function sessions(deps: Deps): RequestHandler[] {
  const Store = connectPgSimple(session);
  const auth = new passport.Passport();
  auth.use(
    new LocalStrategy(
      { usernameField: 'email', passwordField: 'password' },
      (email, password, done) => {
        findPersonByEmail(deps.db, email)
          .then(async (person) =>
            (await checkPassword(person?.passwordHash, password)) && person ? person : false,
          )
          .then((person) => done(null, person), done);
      },
    ),
  );
  auth.serializeUser((person, done) => done(null, (person as { id: string }).id));
  auth.deserializeUser((id: string, done) => {
    findPersonById(deps.db, id).then((person) => {
      done(null, person ?? false);
    }, done);
  });
  return [
    session({
      store: new Store({
        pool: poolOf(deps),
        tableName: 'session',
        pruneSessionInterval: deps.env.NODE_ENV === 'test' ? false : 900,
      }),
      name: 'scantling',
      secret: deps.env.SESSION_SECRET,
      resave: false,
      saveUninitialized: false,
      cookie: {
        httpOnly: true,
        sameSite: 'lax',
        secure: deps.env.APP_ORIGIN.startsWith('https:'),
        maxAge: month,
      },
    }),
    auth.initialize() as RequestHandler,
    auth.session() as RequestHandler,
    lastSeen(deps),
    (req, _res, next) => {
      req.authenticator = auth;
      next();
    },
  ];
}

declare module 'express-serve-static-core' {
  interface Request {
    authenticator?: passport.Authenticator;
  }
}
