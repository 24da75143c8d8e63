import { preferencesSchema, type Me } from '../../../shared/api/accounts';
import { type PersonRef } from '../../../shared/api/common';
import { type PersonEntity } from '../../db/entities/person';
import { isModerator } from '../../http/person';

/** How others see a person. */
export const presentPerson = (p: PersonEntity): PersonRef => ({
  id: p.id,
  handle: p.handle,
  displayName: p.displayName,
  shopName: p.shopName,
});

/** The person themselves, with what they may do. */
export function presentMe(p: PersonEntity, openCases: number | null): Me {
  const confirmed = p.emailConfirmedAt !== null;
  return {
    ...presentPerson(p),
    email: p.email,
    emailConfirmed: confirmed,
    roles: p.roles,
    preferences: preferencesSchema.parse(p.preferences),
    abilities: {
      talk: confirmed,
      becomeCreator: confirmed && !p.roles.includes('creator'),
      draft: p.roles.includes('creator') || p.roles.includes('admin'),
      moderate: isModerator(p),
      administer: p.roles.includes('admin'),
    },
    openCases,
    createdAt: p.createdAt.toISOString(),
  };
}

/** A row of the admin's list. */
export const presentForAdmin = (p: PersonEntity) => ({
  ...presentPerson(p),
  email: p.email,
  emailConfirmed: p.emailConfirmedAt !== null,
  roles: p.roles,
  suspendedUntil: p.suspendedUntil?.toISOString() ?? null,
  createdAt: p.createdAt.toISOString(),
});
