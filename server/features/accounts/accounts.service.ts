import { type EntityManager } from 'typeorm';
import { v7 as uuid } from 'uuid';
import { type z } from 'zod';
import { type signUpBody } from '../../../shared/api/accounts';
import { PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { ApiError, uniqueViolation } from '../../http/errors';
import { confirmLetter, knownLetter, resetLetter } from '../../mail/letters';
import {
  endSessions,
  findPersonByEmail,
  findPersonById,
  freeHandle,
  keepToken,
  savePerson,
  useToken,
  voidTokens,
} from './accounts.repository';
import { hashPassword, newToken, tokenHash } from './passwords';

const hour = 3600 * 1000;

async function linkFor(
  deps: Deps,
  manager: EntityManager,
  personId: string,
  purpose: 'confirm' | 'reset',
): Promise<string> {
  const token = newToken();
  const life = purpose === 'confirm' ? 48 * hour : hour;
  await keepToken(manager, {
    tokenHash: tokenHash(token),
    personId,
    purpose,
    expiresAt: new Date(deps.now().getTime() + life),
  });
  const page = purpose === 'confirm' ? 'confirm' : 'new-password';
  return `${deps.env.APP_ORIGIN}/${page}?token=${token}`;
}

async function signUpOnce(deps: Deps, input: z.output<typeof signUpBody>): Promise<void> {
  const passwordHash = await hashPassword(input.password);
  await deps.db.transaction(async (manager) => {
    const known = await findPersonByEmail(manager, input.email);
    if (known) {
      const link = await linkFor(deps, manager, known.id, 'reset');
      await deps.jobs.mail(known.email, knownLetter(known.displayName, link), manager);
      return;
    }
    const person = manager.getRepository(PersonEntity).create({
      id: uuid(),
      email: input.email,
      emailConfirmedAt: null,
      displayName: input.displayName,
      handle: await freeHandle(manager, input.displayName),
      shopName: null,
      passwordHash,
      roles: ['viewer'],
      preferences: { units: input.units },
      suspendedUntil: null,
      suspendedFor: null,
    });
    await savePerson(manager, person);
    const link = await linkFor(deps, manager, person.id, 'confirm');
    await deps.jobs.mail(person.email, confirmLetter(person.displayName, link), manager);
  });
}

const tries = 3;

/**
 * Makes the account, or tells the one who has it; the caller cannot see which. Two at once can meet on
 * the same e-mail or handle: the loser tries again and finds the other there.
 */
export async function signUpPerson(deps: Deps, input: z.output<typeof signUpBody>): Promise<void> {
  for (let n = 1; ; n += 1) {
    try {
      return await signUpOnce(deps, input);
    } catch (error) {
      if (n >= tries || !uniqueViolation(error)) throw error;
    }
  }
}

const spent = () =>
  new ApiError(
    'auth/token',
    'That link was used already or is too old. Nothing was changed; ask for a new letter.',
  );

export async function confirmPerson(deps: Deps, token: string): Promise<void> {
  await deps.db.transaction(async (manager) => {
    const id = await useToken(manager, tokenHash(token), 'confirm', deps.now());
    const person = id ? await findPersonById(manager, id) : null;
    if (!person) throw spent();
    person.emailConfirmedAt ??= deps.now();
    await savePerson(manager, person);
  });
}

export async function sendConfirmation(deps: Deps, person: PersonEntity): Promise<void> {
  if (person.emailConfirmedAt) return;
  await deps.db.transaction(async (manager) => {
    const link = await linkFor(deps, manager, person.id, 'confirm');
    await deps.jobs.mail(person.email, confirmLetter(person.displayName, link), manager);
  });
}

export async function sendReset(deps: Deps, email: string): Promise<void> {
  await deps.db.transaction(async (manager) => {
    const person = await findPersonByEmail(manager, email);
    if (!person) return;
    const link = await linkFor(deps, manager, person.id, 'reset');
    await deps.jobs.mail(person.email, resetLetter(person.displayName, link), manager);
  });
}

/** Sets the password, confirms the e-mail (the letter reached it) and ends every session. */
export async function setNewPassword(deps: Deps, token: string, password: string): Promise<void> {
  const passwordHash = await hashPassword(password);
  await deps.db.transaction(async (manager) => {
    const id = await useToken(manager, tokenHash(token), 'reset', deps.now());
    const person = id ? await findPersonById(manager, id) : null;
    if (!person) throw spent();
    person.passwordHash = passwordHash;
    person.emailConfirmedAt ??= deps.now();
    await savePerson(manager, person);
    await voidTokens(manager, person.id, 'reset', deps.now());
    await endSessions(manager, person.id);
  });
}
