import { In } from 'typeorm';
import { problemKinds, type CaseCard, type CaseView } from '../../../shared/api/cases';
import { CaseEntity, ReportEntity, RulingEntity } from '../../db/entities/cases';
import { PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { missing } from '../../http/errors';
import { presentPerson } from '../accounts/accounts.presenter';
import { logOf } from '../log/log.service';
import { presentComment } from '../talk/talk.presenter';
import { subjectOf } from './cases.service';

type Problem = (typeof problemKinds)[number];

async function peopleById(deps: Deps, ids: (string | null)[]): Promise<Map<string, PersonEntity>> {
  const known = ids.filter((id): id is string => id !== null);
  const people = known.length
    ? await deps.db.getRepository(PersonEntity).findBy({ id: In(known) })
    : [];
  return new Map(people.map((p) => [p.id, p]));
}

/** A row of the queue. */
export async function presentCase(deps: Deps, found: CaseEntity): Promise<CaseCard> {
  const [subject, reports, people] = await Promise.all([
    subjectOf(deps.db.manager, found.subjectKind, found.subjectId),
    deps.db.getRepository(ReportEntity).countBy({ caseId: found.id }),
    peopleById(deps, [found.workedBy]),
  ]);
  const worker = found.workedBy ? people.get(found.workedBy) : undefined;
  return {
    id: found.id,
    number: found.number,
    problem: problemKinds[found.harm] ?? 'other',
    subject: {
      kind: found.subjectKind,
      id: found.subjectId,
      title: subject?.title ?? 'Something that is gone',
      excerpt: subject?.excerpt.slice(0, 280) ?? '',
      planSlug: subject?.plan?.slug ?? null,
    },
    reports,
    openedAt: found.openedAt.toISOString(),
    state: found.state,
    workedBy: worker ? presentPerson(worker) : null,
  };
}

/** One case with all that belongs to it, for a moderator. */
export async function presentWholeCase(
  deps: Deps,
  caseId: string,
  moderator: PersonEntity,
): Promise<CaseView> {
  const found = await deps.db.getRepository(CaseEntity).findOneBy({ id: caseId });
  if (!found) throw missing('That case');
  const [card, subject, reports, rulings, log] = await Promise.all([
    presentCase(deps, found),
    subjectOf(deps.db.manager, found.subjectKind, found.subjectId),
    deps.db.getRepository(ReportEntity).find({ where: { caseId }, order: { createdAt: 'ASC' } }),
    deps.db.getRepository(RulingEntity).find({ where: { caseId }, order: { createdAt: 'ASC' } }),
    logOf(deps.db, [caseId]),
  ]);
  const people = await peopleById(deps, [
    ...reports.map((r) => r.personId),
    ...rulings.map((r) => r.moderatorId),
    ...log.map((l) => l.actor_id),
  ]);
  const ref = (id: string | null) => (id && people.has(id) ? presentPerson(people.get(id)!) : null);
  return {
    ...card,
    comment:
      subject?.comment && subject.plan
        ? presentComment(subject.comment, subject.person, subject.plan, moderator)
        : null,
    person: subject ? presentPerson(subject.person) : null,
    reportList: reports.map((r) => ({
      id: r.id,
      problem: r.problem as Problem,
      reason: r.reason,
      by: ref(r.personId),
      at: r.createdAt.toISOString(),
    })),
    rulings: rulings.flatMap((r) => {
      const by = ref(r.moderatorId);
      return by
        ? [
            {
              id: r.id,
              act: r.act,
              rule: r.rule,
              reasons: r.reasons,
              until: r.until?.toISOString() ?? null,
              by,
              at: r.createdAt.toISOString(),
            },
          ]
        : [];
    }),
    log: log.map((l) => ({
      id: l.id,
      at: l.at.toISOString(),
      by: ref(l.actor_id),
      act: l.act,
      text: l.text ?? 'erased',
    })),
  };
}
