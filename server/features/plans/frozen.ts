import { LRUCache } from 'lru-cache';
import { type PlanDocument } from '../../../shared/plan/document';
import { planFacts, type PlanFacts } from '../../../shared/plan/facts';
import { readDocument } from '../../../shared/plan/upgrade';
import { type RevisionEntity } from '../../db/entities/plan';
import { findRevision } from './plans.repository';

/** A published revision, read once: its bytes never change, so neither does this. */
export interface FrozenRevision {
  row: Omit<RevisionEntity, 'document'>;
  document: PlanDocument;
  facts: PlanFacts;
}

const known = new LRUCache<string, FrozenRevision>({ max: 200 });

/** A revision by id, upgraded and checked on first reading, from memory afterwards. */
export async function frozenRevision(
  db: Parameters<typeof findRevision>[0],
  id: string,
): Promise<FrozenRevision | null> {
  const held = known.get(id);
  if (held) return held;
  const entity = await findRevision(db, id);
  if (!entity) return null;
  const { document: stored, ...row } = entity;
  const document = readDocument(stored);
  const frozen = { row, document, facts: planFacts(document) };
  known.set(id, frozen);
  return frozen;
}
