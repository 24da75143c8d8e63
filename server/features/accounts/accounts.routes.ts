import { type Request, type Router } from 'express';
import * as api from '../../../shared/api/accounts';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { ApiError, missing, notAllowed } from '../../http/errors';
import { isModerator, isSuspended, suspendedError } from '../../http/person';
import { route, signedIn } from '../../http/route';
import { appendLog } from '../log/log.service';
import {
  endSessions,
  findPersonById,
  savePerson,
  searchPeople,
  sessionsOf,
} from './accounts.repository';
import { presentForAdmin, presentMe } from './accounts.presenter';
import {
  confirmPerson,
  sendConfirmation,
  sendReset,
  setNewPassword,
  signUpPerson,
} from './accounts.service';

const ok = { ok: true as const };

/** Open cases, for moderators only. */
async function openCases(deps: Deps, person: PersonEntity): Promise<number | null> {
  if (!isModerator(person)) return null;
  const rows: { count: string }[] = await deps.db.query(
    `SELECT count(*) FROM cases WHERE state = 'open'`,
  );
  return Number(rows[0]?.count ?? 0);
}

const me = async (deps: Deps, person: PersonEntity) => ({
  me: presentMe(person, await openCases(deps, person)),
});

/** A browser in plain words. */
export function deviceOf(agent: string): string {
  const browser = /Edg\//.test(agent)
    ? 'Edge'
    : /Firefox\//.test(agent)
      ? 'Firefox'
      : /Chrome\//.test(agent)
        ? 'Chrome'
        : /Safari\//.test(agent)
          ? 'Safari'
          : 'a browser';
  const system = /Android/.test(agent)
    ? 'Android'
    : /iPhone|iPad/.test(agent)
      ? 'iOS'
      : /Windows/.test(agent)
        ? 'Windows'
        : /Mac OS/.test(agent)
          ? 'macOS'
          : /Linux/.test(agent)
            ? 'Linux'
            : 'a device';
  return `${browser} on ${system}`;
}

/** passport-local on this request; the person, or the refusal. */
function authenticate(req: Request): Promise<PersonEntity> {
  return new Promise((resolve, reject) => {
    const done = (error: unknown, person: PersonEntity | false | undefined) => {
      if (error) reject(error instanceof Error ? error : new Error('sign-in failed'));
      else if (person) resolve(person);
      else
        reject(
          new ApiError(
            'auth/wrong',
            'That e-mail and password don’t go together. Your e-mail is kept. Try again, or set a new password.',
          ),
        );
    };
    const handler = req.authenticator?.authenticate('local', { session: false }, done) as (
      req: Request,
      res: unknown,
      next: (error?: unknown) => void,
    ) => void;
    handler(req, req.res, (error) =>
      reject(error instanceof Error ? error : new Error('sign-in failed')),
    );
  });
}

/** Begins a new session for the person; the old id is thrown away. */
async function begin(deps: Deps, req: Request, person: PersonEntity): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    // passport regenerates the session itself, so that an id from before cannot be reused.
    req.logIn(person, (error: Error | undefined) => (error ? reject(error) : resolve()));
  });
  req.session.device = deviceOf(req.get('user-agent') ?? '');
  req.session.createdAt = deps.now().toISOString();
  req.session.lastSeenAt = deps.now().toISOString();
}

function sessionRoutes(router: Router, deps: Deps): void {
  route(router, deps, api.signIn, async ({ req }) => {
    const person = await authenticate(req);
    if (isSuspended(person, deps.now())) throw suspendedError(person);
    await begin(deps, req, person);
    return me(deps, person);
  });
  route(router, deps, api.signOut, async ({ req }) => {
    await new Promise<void>((resolve, reject) =>
      req.session.destroy((error?: Error) => (error ? reject(error) : resolve())),
    );
  });
  route(router, deps, api.listSessions, async ({ req, person }) => {
    const rows = await sessionsOf(deps.db, signedIn(person).id);
    const at = (text?: string) => text ?? signedIn(person).createdAt.toISOString();
    return {
      items: rows.map(({ sid, sess }) => ({
        id: sid,
        current: sid === req.sessionID,
        device: sess.device ?? 'a browser',
        createdAt: at(sess.createdAt),
        lastSeenAt: at(sess.lastSeenAt),
      })),
    };
  });
  route(router, deps, api.endSession, async ({ params, person }) => {
    if ((await endSessions(deps.db, signedIn(person).id, params.sessionId)) === 0)
      throw missing('That session');
  });
}

function letterRoutes(router: Router, deps: Deps): void {
  route(router, deps, api.signUp, async ({ body }) => {
    await signUpPerson(deps, body);
    return ok;
  });
  route(router, deps, api.confirmEmail, async ({ body }) => {
    await confirmPerson(deps, body.token);
    return ok;
  });
  route(router, deps, api.resendConfirmation, async ({ person }) => {
    await sendConfirmation(deps, signedIn(person));
    return ok;
  });
  route(router, deps, api.askReset, async ({ body }) => {
    await sendReset(deps, body.email);
    return ok;
  });
  route(router, deps, api.setPassword, async ({ body }) => {
    await setNewPassword(deps, body.token, body.password);
    return ok;
  });
}

function adminRoutes(router: Router, deps: Deps): void {
  route(router, deps, api.listPeople, async ({ query }) => {
    const page = await searchPeople(deps.db, query.q, query.cursor, query.limit);
    return { items: page.people.map(presentForAdmin), next: page.next };
  });
  route(router, deps, api.setRoles, async ({ params, body, person }) => {
    const admin = signedIn(person);
    const other = await findPersonById(deps.db, params.personId);
    if (!other) throw missing('That person');
    if (other.id === admin.id && !body.roles.includes('admin'))
      throw notAllowed('You cannot take the admin role from yourself. Ask another admin.');
    other.roles = [...new Set(body.roles)];
    await deps.db.transaction(async (manager) => {
      await savePerson(manager, other);
      await appendLog(manager, {
        act: 'roles/set',
        actorId: admin.id,
        subjectId: other.id,
        text: `Roles: ${other.roles.join(', ') || 'none'}`,
      });
    });
    return presentForAdmin(other);
  });
}

export function registerAccounts(router: Router, deps: Deps): void {
  route(router, deps, api.getMe, async ({ person }) =>
    person && !isSuspended(person, deps.now()) ? me(deps, person) : { me: null },
  );
  sessionRoutes(router, deps);
  letterRoutes(router, deps);
  route(router, deps, api.updateProfile, async ({ body, person }) => {
    const self = signedIn(person);
    if (body.displayName !== undefined) self.displayName = body.displayName;
    if (body.shopName !== undefined) self.shopName = body.shopName || null;
    if (body.preferences) self.preferences = { ...self.preferences, ...body.preferences };
    await savePerson(deps.db, self);
    return me(deps, self);
  });
  route(router, deps, api.becomeCreator, async ({ person }) => {
    const self = signedIn(person);
    self.roles = [...new Set([...self.roles, 'creator' as const])];
    await savePerson(deps.db, self);
    return me(deps, self);
  });
  adminRoutes(router, deps);
}
