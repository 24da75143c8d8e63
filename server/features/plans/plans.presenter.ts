import { type DraftCard, type PlanCard, type RevisionRef } from '../../../shared/api/plans';
import { type PlanEntity, type RevisionEntity } from '../../db/entities/plan';
import { type CardRow } from './plans.repository';

export const presentRevision = (r: Omit<RevisionEntity, 'document'>): RevisionRef => ({
  id: r.id,
  letter: r.letter,
  sha256: r.sha256,
  publishedAt: r.publishedAt.toISOString(),
  note: r.note,
  overrides: r.overrides,
});

export const presentCard = (row: CardRow): PlanCard => ({
  id: row.id,
  slug: row.slug,
  title: row.title,
  summary: row.summary,
  maker: {
    id: row.maker_id,
    handle: row.handle,
    displayName: row.display_name,
    shopName: row.shop_name,
  },
  letter: row.letter,
  publishedAt: row.published_at.toISOString(),
  cover: row.cover,
  coverAlt: row.cover_alt,
  category: row.category,
  skill: row.skill,
  units: row.units,
  steps: row.steps,
  handsOn: row.hands_on,
  elapsed: row.elapsed,
  machines: row.machines,
  benchCopies: row.bench_copies,
  clipDuration: row.clip_duration,
});

export const presentDraftCard = (plan: PlanEntity, letter: string | null): DraftCard => ({
  id: plan.id,
  title: plan.draft.title,
  version: plan.version,
  updatedAt: plan.updatedAt.toISOString(),
  slug: plan.slug,
  letter,
  state: plan.state,
  steps: plan.draft.steps?.length ?? 0,
});
