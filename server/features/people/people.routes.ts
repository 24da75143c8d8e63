import { type Router } from 'express';
import { getPerson } from '../../../shared/api/cases';
import { PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { missing } from '../../http/errors';
import { route } from '../../http/route';
import { presentPerson } from '../accounts/accounts.presenter';

export function registerPeople(router: Router, deps: Deps): void {
  route(router, deps, getPerson, async ({ params }) => {
    const person = await deps.db.getRepository(PersonEntity).findOneBy({ handle: params.handle });
    if (!person) throw missing('That person');
    return {
      ...presentPerson(person),
      isMaker: person.roles.includes('creator'),
      since: person.createdAt.toISOString(),
    };
  });
}
