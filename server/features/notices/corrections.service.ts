import { type EntityManager } from 'typeorm';
import {
  type CopyCorrection,
  type CorrectionBody,
  type CorrectionPreview,
} from '../../../shared/api/notices';
import { type OrderedEntry } from '../../../shared/plan/bench/fold';
import { compareRevisions } from '../../../shared/plan/compare';
import { describeItem, noticeFor, type Notice } from '../../../shared/plan/notice';
import { readDocument } from '../../../shared/plan/upgrade';
import { type BenchCopyEntity } from '../../db/entities/bench';
import { CorrectionEntity } from '../../db/entities/notices';
import { PersonEntity } from '../../db/entities/person';
import { type PlanEntity } from '../../db/entities/plan';
import { type Deps } from '../../deps';
import { frozenRevision } from '../plans/frozen';
import { findPlan } from '../plans/plans.repository';
import { noticesOf } from './copies';
import { notify } from './notify';
import { queues } from './queues';

/** What publishing the draft now would mean at the benches. */
export async function previewOf(deps: Deps, plan: PlanEntity): Promise<CorrectionPreview> {
  const draft = readDocument(plan.draft);
  const newest = plan.currentRevisionId
    ? await frozenRevision(deps.db, plan.currentRevisionId)
    : null;
  const preview: CorrectionPreview = {
    changes: newest ? compareRevisions(newest.document, draft).changes : [],
    copies: 0,
    touched: 0,
    worst: {},
    byChange: {},
  };
  for await (const { notice } of noticesOf(deps.db, plan.id, draft, null)) {
    preview.copies += 1;
    if (!notice.worst) continue;
    preview.touched += 1;
    preview.worst[notice.worst] = (preview.worst[notice.worst] ?? 0) + 1;
    for (const { change, means } of notice.items) {
      const counts = (preview.byChange[change.key] ??= {});
      counts[means] = (counts[means] ?? 0) + 1;
    }
  }
  return preview;
}

/** Records the correction of a revision that is being published; the notices follow as a job of the same transaction. */
export async function addCorrection(
  deps: Deps,
  manager: EntityManager,
  planId: string,
  revisionId: string,
  body: CorrectionBody,
): Promise<void> {
  await manager.getRepository(CorrectionEntity).insert({
    ...body,
    planId,
    revisionId,
    createdAt: deps.now(),
    spreadAt: null,
  });
  await deps.jobs.send(queues.spread, body.id, { correctionId: body.id }, manager);
}

const shownLines = 8;

function wordsOf(reason: string, notice: Notice, person: PersonEntity): string {
  const { units = 'mm', inchGrid = 16 } = person.preferences;
  const pref = { system: units, instrument: 'calipers' as const, grid: inchGrid };
  const lines = notice.items
    .slice(0, shownLines)
    .map((item) => `${item.change.name}: ${describeItem(item, pref)}`);
  const more = notice.items.length - lines.length;
  return [reason, lines.join('\n'), ...(more > 0 ? [`And ${more} more.`] : [])].join('\n\n');
}

/** Tells every bench copy a correction touches, each what it means there. Doing it again tells nobody twice. */
export async function spreadCorrection(deps: Deps, correctionId: string): Promise<number> {
  const corrections = deps.db.getRepository(CorrectionEntity);
  const correction = await corrections.findOneBy({ id: correctionId });
  if (!correction || correction.spreadAt) return 0;
  const [plan, revision] = await Promise.all([
    findPlan(deps.db, correction.planId),
    frozenRevision(deps.db, correction.revisionId),
  ]);
  let told = 0;
  if (plan && revision)
    for await (const { copy, notice } of noticesOf(
      deps.db,
      plan.id,
      revision.document,
      revision.row.id,
    )) {
      const person = await deps.db.getRepository(PersonEntity).findOneBy({ id: copy.person_id });
      if (!notice.worst || !person) continue;
      const { title } = revision.document;
      const added = await deps.db.transaction((manager) =>
        notify(
          manager,
          {
            personId: person.id,
            kind: correction.safety ? 'safety' : 'correction',
            planId: plan.id,
            cause: `correction ${correction.id} ${copy.id}`,
            title: `${correction.safety ? 'Safety: ' : ''}${title}, rev ${revision.row.letter}`,
            text: wordsOf(correction.reason, notice, person),
            path: `/bench/${copy.id}`,
          },
          deps.now(),
        ),
      );
      if (added) told += 1;
    }
  await corrections.update({ id: correction.id }, { spreadAt: deps.now() });
  if (correction.safety) await deps.jobs.send(queues.letters, 'now', {});
  return told;
}

interface NoteRow {
  id: string;
  letter: string;
  created_at: Date;
  reason: string;
  safety: boolean;
  reasons: Record<string, string>;
}

/** The creator's words on revisions after one and up to another, the newest first. */
export async function notesBetween(
  deps: Deps,
  planId: string,
  fromRevisionId: string,
  toRevisionId: string,
): Promise<CopyCorrection['notes']> {
  const rows: NoteRow[] = await deps.db.query(
    `SELECT c.id, r.letter, c.created_at, c.reason, c.safety, c.reasons FROM corrections c
     JOIN revisions r ON r.id = c.revision_id
     WHERE c.plan_id = $1 AND r.published_at > (SELECT published_at FROM revisions WHERE id = $2)
       AND r.published_at <= (SELECT published_at FROM revisions WHERE id = $3)
     ORDER BY r.published_at DESC`,
    [planId, fromRevisionId, toRevisionId],
  );
  return rows.map(({ id, letter, created_at, reason, safety, reasons }) => ({
    id,
    letter,
    at: created_at.toISOString(),
    reason,
    safety,
    reasons,
  }));
}

/** What newer revisions mean for one bench copy as it stands; null when nothing newer was corrected. */
export async function correctionFor(
  deps: Deps,
  copy: BenchCopyEntity,
  plan: PlanEntity,
  entries: readonly OrderedEntry[],
): Promise<CopyCorrection | null> {
  const { currentRevisionId } = plan;
  if (!currentRevisionId || currentRevisionId === copy.revisionId) return null;
  const notes = await notesBetween(deps, plan.id, copy.revisionId, currentRevisionId);
  const [before, after] = await Promise.all([
    frozenRevision(deps.db, copy.revisionId),
    frozenRevision(deps.db, currentRevisionId),
  ]);
  if (notes.length === 0 || !before || !after) return null;
  const { items } = noticeFor(before.document, after.document, entries);
  if (items.length === 0) return null;
  return { revisionId: after.row.id, letter: after.row.letter, notes, items };
}
