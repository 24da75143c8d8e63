import { type Request } from 'express';
import { type Access } from '../../shared/api/contract';
import { type PersonEntity } from '../db/entities/person';
import { ApiError } from './errors';

/** Who asks, or null. */
export function personOf(req: Request): PersonEntity | null {
  return (req.user as PersonEntity | undefined) ?? null;
}

export const isModerator = (person: PersonEntity | null): boolean =>
  person !== null && (person.roles.includes('moderator') || person.roles.includes('admin'));

/** Is the account closed at this moment by a ruling? */
export const isSuspended = (person: PersonEntity, now: Date): boolean =>
  person.suspendedUntil !== null && person.suspendedUntil > now;

/** The refusal that says why and until when. */
export function suspendedError(person: PersonEntity): ApiError {
  const until = person.suspendedUntil?.toISOString().slice(0, 10) ?? '';
  return new ApiError(
    'auth/suspended',
    `This account is suspended ${until.startsWith('9999') ? 'for good' : `until ${until}`}: ${person.suspendedFor ?? ''} You may appeal by answering the letter.`,
  );
}

/** Does the person stand above the floor? */
export function meetsAccess(person: PersonEntity | null, access: Access): boolean {
  if (access === 'public') return true;
  if (!person) return false;
  if (access === 'person') return true;
  if (access === 'confirmed') return person.emailConfirmedAt !== null;
  if (access === 'moderator') return isModerator(person);
  return person.roles.includes(access) || person.roles.includes('admin');
}

/** Throws the fitting refusal when somebody stands below the floor. */
export function requireAccess(person: PersonEntity | null, access: Access, now: Date): void {
  if (person && access !== 'public' && isSuspended(person, now)) throw suspendedError(person);
  if (meetsAccess(person, access)) return;
  if (!person)
    throw new ApiError(
      'auth/needed',
      'You are not signed in, or the session has ended. What you typed is still with you; sign in and try again.',
    );
  if (access === 'confirmed')
    throw new ApiError(
      'auth/unconfirmed',
      'Your e-mail is not confirmed yet. Open the letter we sent, then try again.',
    );
  throw new ApiError(
    'auth/not-allowed',
    `This is for people with the role ${access}. Nothing was changed.`,
  );
}
