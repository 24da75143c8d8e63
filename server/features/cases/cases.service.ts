import { In, type EntityManager } from 'typeorm';
import { v7 as uuid } from 'uuid';
import { type BodyOf } from '../../../shared/api/contract';
import {
  problemKinds,
  siteRules,
  type giveRuling,
  type reportThing,
} from '../../../shared/api/cases';
import { CaseEntity, ReportEntity, RulingEntity, type SubjectKind } from '../../db/entities/cases';
import { PersonEntity } from '../../db/entities/person';
import { PlanEntity } from '../../db/entities/plan';
import { CommentEntity } from '../../db/entities/talk';
import { type Deps } from '../../deps';
import { ApiError, missing } from '../../http/errors';
import { outcomeLetter, rulingLetter } from '../../mail/letters';
import { endSessions } from '../accounts/accounts.repository';
import { appendLog } from '../log/log.service';
import { canSeePlan } from '../plans/plans.policy';

/** What a case is about, resolved. */
export interface Subject {
  title: string;
  excerpt: string;
  plan: PlanEntity | null;
  comment: CommentEntity | null;
  person: PersonEntity;
}

/** Finds the thing; null when it is not there any more. */
export async function subjectOf(
  manager: EntityManager,
  kind: SubjectKind,
  id: string,
): Promise<Subject | null> {
  const people = manager.getRepository(PersonEntity);
  const plans = manager.getRepository(PlanEntity);
  if (kind === 'person') {
    const person = await people.findOneBy({ id });
    return (
      person && {
        title: person.displayName,
        excerpt: person.shopName ?? person.displayName,
        plan: null,
        comment: null,
        person,
      }
    );
  }
  const comment =
    kind === 'comment' ? await manager.getRepository(CommentEntity).findOneBy({ id }) : null;
  const plan = await plans.findOneBy({ id: comment?.planId ?? id });
  const person = await people.findOneBy({ id: comment?.authorId ?? plan?.ownerId ?? id });
  if (!plan || !person || (kind === 'comment' && !comment)) return null;
  return comment
    ? {
        title: `A ${comment.kind} on ${plan.draft.title}`,
        excerpt: comment.text,
        plan,
        comment,
        person,
      }
    : {
        title: `The plan ${plan.draft.title}`,
        excerpt: plan.draft.summary ?? '',
        plan,
        comment,
        person,
      };
}

/** Joins the open case on the thing, or opens one. Two at once make one case: the index sees to it. */
async function openCase(
  manager: EntityManager,
  kind: SubjectKind,
  subjectId: string,
  harm: number,
): Promise<{ id: string; number: number; opened: boolean }> {
  const rows: { id: string; number: number; opened: boolean }[] = await manager.query(
    `INSERT INTO cases (id, subject_kind, subject_id, harm, state) VALUES ($1,$2,$3,$4,'open')
     ON CONFLICT (subject_kind, subject_id) WHERE state = 'open' DO UPDATE SET harm = LEAST(cases.harm, EXCLUDED.harm)
     RETURNING id, number, (xmax = 0) AS opened`,
    [uuid(), kind, subjectId, harm],
  );
  return rows[0]!;
}

const receiptOf = (number: number, reportId: string) => `${number}-${reportId.slice(-6)}`;

export async function report(
  deps: Deps,
  body: BodyOf<typeof reportThing>,
  person: PersonEntity | null,
): Promise<string> {
  if (!person && !body.email) {
    throw new ApiError(
      'request/invalid',
      'An e-mail is needed to tell you the outcome. Nothing was sent.',
      {
        issues: [{ path: ['email'], code: 'required', message: 'Give an e-mail, or sign in.' }],
      },
    );
  }
  return deps.db.transaction(async (manager) => {
    const reports = manager.getRepository(ReportEntity);
    const known = await reports.findOneBy({ id: body.id });
    if (known) {
      const before = await manager.getRepository(CaseEntity).findOneByOrFail({ id: known.caseId });
      return receiptOf(before.number, known.id);
    }
    const subject = await subjectOf(manager, body.subject.kind, body.subject.id);
    if (!subject || (subject.plan && !canSeePlan(person, subject.plan)))
      throw missing('What you report');
    const opened = await openCase(
      manager,
      body.subject.kind,
      body.subject.id,
      problemKinds.indexOf(body.problem),
    );
    await reports.insert({
      id: body.id,
      caseId: opened.id,
      problem: body.problem,
      reason: body.reason,
      personId: person?.id ?? null,
      email: person ? null : (body.email ?? null),
    });
    await appendLog(manager, {
      act: opened.opened ? 'case/opened' : 'case/joined',
      actorId: person?.id ?? null,
      subjectId: opened.id,
      text: opened.opened ? 'Case opened from the first report' : 'Another report joined',
    });
    return receiptOf(opened.number, body.id);
  });
}

export async function take(
  deps: Deps,
  caseId: string,
  moderator: PersonEntity,
  over: boolean,
): Promise<void> {
  await deps.db.transaction(async (manager) => {
    const found = await manager
      .getRepository(CaseEntity)
      .findOne({ where: { id: caseId }, lock: { mode: 'pessimistic_write' } });
    if (!found) throw missing('That case');
    if (found.state !== 'open')
      throw new ApiError('cases/ruled', 'This case is ruled already. Nothing was changed.');
    if (found.workedBy === moderator.id) return;
    if (found.workedBy && !over) {
      const worker = await manager.getRepository(PersonEntity).findOneBy({ id: found.workedBy });
      throw new ApiError(
        'cases/taken',
        `${worker?.displayName ?? 'Somebody'} is on this case. Take it over if you have spoken.`,
        { meta: { workedBy: worker?.displayName ?? null } },
      );
    }
    found.workedBy = moderator.id;
    await manager.getRepository(CaseEntity).save(found);
    await appendLog(manager, {
      act: 'case/taken',
      actorId: moderator.id,
      subjectId: caseId,
      text: 'Taken on',
    });
  });
}

type RulingBody = BodyOf<typeof giveRuling>;
const actWords = {
  'no-action': 'no action',
  hide: 'hidden from others',
  remove: 'removed',
  suspend: 'the account is suspended',
} as const;

function requireRule(body: RulingBody, subject: Subject, kind: SubjectKind): void {
  const issues = [];
  if (body.act !== 'no-action' && !siteRules.some((r) => r.code === body.rule))
    issues.push({ path: ['rule'], code: 'required', message: 'Name the rule that was broken.' });
  if (kind === 'person' && (body.act === 'hide' || body.act === 'remove'))
    issues.push({
      path: ['act'],
      code: 'unfit',
      message: 'A person can be suspended, not hidden or removed.',
    });
  if (issues.length > 0)
    throw new ApiError('request/invalid', 'The ruling is not complete. Nothing was done.', {
      issues,
    });
}

async function apply(
  deps: Deps,
  manager: EntityManager,
  body: RulingBody,
  subject: Subject,
  until: Date | null,
): Promise<void> {
  if (body.act === 'suspend') {
    subject.person.suspendedUntil = until;
    subject.person.suspendedFor = body.reasons;
    await manager.getRepository(PersonEntity).save(subject.person);
    await endSessions(manager, subject.person.id);
    return;
  }
  if (body.act === 'no-action') return;
  const state = body.act === 'hide' ? 'hidden' : 'removed';
  if (subject.comment)
    await manager.getRepository(CommentEntity).update({ id: subject.comment.id }, { state });
  else if (subject.plan)
    await manager.getRepository(PlanEntity).update({ id: subject.plan.id }, { state });
}

const forGood = new Date('9999-12-31T00:00:00Z');

/** The ruling, what follows from it, its log row and its letters: all or nothing. */
export async function rule(
  deps: Deps,
  caseId: string,
  body: RulingBody,
  moderator: PersonEntity,
): Promise<void> {
  await deps.db.transaction(async (manager) => {
    const rulings = manager.getRepository(RulingEntity);
    if (await rulings.existsBy({ id: body.id, caseId })) return;
    const cases = manager.getRepository(CaseEntity);
    const found = await cases.findOne({
      where: { id: caseId },
      lock: { mode: 'pessimistic_write' },
    });
    if (!found) throw missing('That case');
    if (found.state !== 'open')
      throw new ApiError('cases/ruled', 'This case is ruled already. Nothing was changed.');
    const subject = await subjectOf(manager, found.subjectKind, found.subjectId);
    if (!subject) throw missing('What the case is about');
    if (subject.person.id === moderator.id)
      throw new ApiError(
        'cases/own',
        'The case is about you. Another moderator has to rule. Nothing was done.',
      );
    requireRule(body, subject, found.subjectKind);
    const until =
      body.act === 'suspend'
        ? body.days
          ? new Date(deps.now().getTime() + body.days * 86_400_000)
          : forGood
        : null;
    await apply(deps, manager, body, subject, until);
    await rulings.insert({
      id: body.id,
      caseId,
      act: body.act,
      rule: body.rule,
      reasons: body.reasons,
      until,
      moderatorId: moderator.id,
    });
    await cases.update({ id: caseId }, { state: 'ruled', workedBy: moderator.id });
    await appendLog(manager, {
      act: `ruling/${body.act}`,
      actorId: moderator.id,
      subjectId: caseId,
      text: `Ruling: ${actWords[body.act]}${body.rule ? `, rule ${body.rule}` : ''}`,
    });
    await writeLetters(deps, manager, caseId, body, subject, until);
  });
}

async function writeLetters(
  deps: Deps,
  manager: EntityManager,
  caseId: string,
  body: RulingBody,
  subject: Subject,
  until: Date | null,
): Promise<void> {
  const what = subject.comment
    ? `your ${subject.comment.kind} on ${subject.plan?.draft.title ?? 'a plan'}`
    : subject.plan
      ? `your plan ${subject.plan.draft.title}`
      : 'your account';
  const broken = siteRules.find((r) => r.code === body.rule);
  const letter = rulingLetter({
    name: subject.person.displayName,
    what,
    act: actWords[body.act],
    rule: broken ? `${broken.code}. ${broken.title}. ${broken.text}` : null,
    reasons: body.reasons,
    until: until === forGood ? null : until,
  });
  await deps.jobs.mail(subject.person.email, letter, manager);
  const reports = await manager.getRepository(ReportEntity).findBy({ caseId });
  const people = await manager
    .getRepository(PersonEntity)
    .findBy({ id: In(reports.flatMap((r) => r.personId ?? [])) });
  const addresses = new Set([
    ...people.map((p) => p.email),
    ...reports.flatMap((r) => r.email ?? []),
  ]);
  for (const address of addresses)
    await deps.jobs.mail(address, outcomeLetter(subject.title, actWords[body.act]), manager);
}
