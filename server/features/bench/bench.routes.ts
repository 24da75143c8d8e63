import { isDeepStrictEqual } from 'node:util';
import { type Router } from 'express';
import * as api from '../../../shared/api/bench';
import { limits } from '../../../shared/api/limits';
import { foldEntries } from '../../../shared/plan/bench/fold';
import { BenchCopyEntity, ShopCardEntity } from '../../db/entities/bench';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { ApiError, missing } from '../../http/errors';
import { route, signedIn } from '../../http/route';
import { findPersonById } from '../accounts/accounts.repository';
import { presentPerson } from '../accounts/accounts.presenter';
import { correctionFor } from '../notices/corrections.service';
import { canSeePlan } from '../plans/plans.policy';
import { frozenRevision } from '../plans/frozen';
import { findPlan } from '../plans/plans.repository';
import {
  addEntry,
  copiesOf,
  countEntries,
  entriesOf,
  findCopy,
  findEntry,
  type EntryRow,
} from './bench.repository';

const presentEntry = (row: EntryRow): api.StoredEntry => ({
  entry: row.entry,
  sequence: Number(row.sequence),
  receivedAt: row.received_at.toISOString(),
});

async function ownCopy(deps: Deps, copyId: string, person: PersonEntity): Promise<BenchCopyEntity> {
  const copy = await findCopy(deps.db, copyId);
  if (!copy || copy.personId !== person.id) throw missing('That bench copy');
  return copy;
}

/** A bench copy with its frozen plan. It stays readable whatever became of the plan. */
async function presentCopy(deps: Deps, copy: BenchCopyEntity): Promise<api.BenchCopy> {
  const [plan, revision, rows] = await Promise.all([
    findPlan(deps.db, copy.planId),
    frozenRevision(deps.db, copy.revisionId),
    entriesOf(deps.db, copy.id),
  ]);
  if (!plan || !revision) throw missing('That bench copy');
  const [maker, current] = await Promise.all([
    findPersonById(deps.db, plan.ownerId),
    plan.currentRevisionId ? frozenRevision(deps.db, plan.currentRevisionId) : null,
  ]);
  if (!maker) throw missing('That bench copy');
  const { document, facts } = revision;
  const entries = rows.map(presentEntry);
  const ordered = entries.map(({ entry, sequence }) => ({ entry, sequence }));
  const state = foldEntries(ordered);
  return {
    id: copy.id,
    planId: plan.id,
    slug: plan.slug ?? '',
    title: document.title,
    maker: presentPerson(maker),
    revision: {
      id: revision.row.id,
      letter: revision.row.letter,
      publishedAt: revision.row.publishedAt.toISOString(),
    },
    newerLetter: current && current.row.id !== revision.row.id ? current.row.letter : null,
    startedAt: copy.startedAt.toISOString(),
    lastEntryAt: entries[entries.length - 1]?.receivedAt ?? null,
    steps: document.steps.length,
    stepsDone: document.steps.filter((s) => state.ticks.has(s.id)).length,
    card: {
      cover: document.cover ?? null,
      coverAlt: document.coverAlt,
      handsOn: facts.handsOn,
      clipDuration: facts.clipDuration,
    },
    document,
    entries,
    correction: await correctionFor(deps, copy, plan, ordered),
  };
}

async function start(
  deps: Deps,
  person: PersonEntity,
  copyId: string,
  planId: string,
  revisionId: string,
): Promise<BenchCopyEntity> {
  const known = await findCopy(deps.db, copyId);
  if (known) {
    if (known.personId !== person.id)
      throw new ApiError('thing/exists', 'That id is taken. Nothing was changed.');
    return known;
  }
  const [plan, revision] = await Promise.all([
    findPlan(deps.db, planId),
    frozenRevision(deps.db, revisionId),
  ]);
  if (!plan || !revision || revision.row.planId !== plan.id || !canSeePlan(person, plan))
    throw missing('That plan');
  const copies = deps.db.getRepository(BenchCopyEntity);
  return copies.save(copies.create({ id: copyId, personId: person.id, planId, revisionId }));
}

/** Moves a bench copy on. Entries keep their element ids, so they come along where those are still there. */
async function move(deps: Deps, copy: BenchCopyEntity, revisionId: string): Promise<void> {
  const [from, to] = await Promise.all([
    frozenRevision(deps.db, copy.revisionId),
    frozenRevision(deps.db, revisionId),
  ]);
  if (!from || to?.row.planId !== copy.planId) throw missing('That revision');
  if (to.row.publishedAt < from.row.publishedAt)
    throw new ApiError(
      'bench/older',
      'A bench copy only moves on to later revisions. Nothing was changed.',
    );
  copy.revisionId = revisionId;
  await deps.db.getRepository(BenchCopyEntity).update({ id: copy.id }, { revisionId });
}

function entryRoutes(router: Router, deps: Deps): void {
  route(router, deps, api.listEntries, async ({ params, query, person }) => {
    const copy = await ownCopy(deps, params.copyId, signedIn(person));
    return { items: (await entriesOf(deps.db, copy.id, query.after)).map(presentEntry) };
  });
  route(router, deps, api.putEntry, async ({ params, body, person }) => {
    const copy = await ownCopy(deps, params.copyId, signedIn(person));
    if (body.id !== params.entryId) {
      throw new ApiError(
        'request/invalid',
        'The id in the address and in the entry differ. Nothing was stored.',
        { issues: [{ path: ['id'], code: 'mismatch', message: 'Differs from the address.' }] },
      );
    }
    const known = await findEntry(deps.db, copy.id, body.id);
    const row =
      known ??
      (await addIfRoom(deps, copy.id, body)) ??
      (await findEntry(deps.db, copy.id, body.id));
    if (!row) throw missing('That entry');
    if (!isDeepStrictEqual(row.entry, JSON.parse(JSON.stringify(body)))) {
      throw new ApiError(
        'bench/entry-differs',
        'An entry with this id is there with other content. The one stored first is kept.',
      );
    }
    return presentEntry(row);
  });
}

async function addIfRoom(
  deps: Deps,
  copyId: string,
  entry: EntryRow['entry'],
): Promise<EntryRow | null> {
  if ((await countEntries(deps.db, copyId)) >= limits.entriesPerCopy) {
    throw new ApiError(
      'bench/full',
      'This bench copy holds as many entries as it can. The entry was not stored; start a new bench copy.',
    );
  }
  return addEntry(deps.db, copyId, entry);
}

function shopCardRoutes(router: Router, deps: Deps): void {
  const cards = deps.db.getRepository(ShopCardEntity);
  const empty = api.shopCardSchema.parse({});
  route(router, deps, api.getShopCard, async ({ person }) => {
    const row = await cards.findOneBy({ personId: signedIn(person).id });
    return { version: row?.version ?? 0, card: api.shopCardSchema.parse(row?.card ?? empty) };
  });
  route(router, deps, api.saveShopCard, async ({ body, person }) => {
    const rows: { version: number }[] = await deps.db.query(
      `INSERT INTO shop_cards (person_id, version, card) SELECT $1, 1, $3 WHERE $2 = 0
       ON CONFLICT (person_id) DO NOTHING RETURNING version`,
      [signedIn(person).id, body.version, JSON.stringify(body.card)],
    );
    if (rows[0]) return { version: 1, card: body.card };
    const [updated]: [{ version: number }[], number] = await deps.db.query(
      `UPDATE shop_cards SET card = $3, version = version + 1 WHERE person_id = $1 AND version = $2 RETURNING version`,
      [signedIn(person).id, body.version, JSON.stringify(body.card)],
    );
    if (updated[0]) return { version: updated[0].version, card: body.card };
    const known = await cards.findOneBy({ personId: signedIn(person).id });
    throw new ApiError(
      'shop-card/stale-version',
      'Another device saved the shop card first. What you have here is kept; look at both and save again.',
      {
        meta: { version: known?.version ?? 0, card: known?.card ?? empty },
      },
    );
  });
}

export function registerBench(router: Router, deps: Deps): void {
  route(router, deps, api.listCopies, async ({ person }) => {
    const copies = await copiesOf(deps.db, signedIn(person).id);
    return {
      items: await Promise.all(
        copies.map(async (copy) => api.benchCopyRefSchema.parse(await presentCopy(deps, copy))),
      ),
    };
  });
  route(router, deps, api.startCopy, async ({ params, body, person }) =>
    presentCopy(
      deps,
      await start(deps, signedIn(person), params.copyId, body.planId, body.revisionId),
    ),
  );
  route(router, deps, api.getCopy, async ({ params, person }) =>
    presentCopy(deps, await ownCopy(deps, params.copyId, signedIn(person))),
  );
  route(router, deps, api.moveCopy, async ({ params, body, person }) => {
    const copy = await ownCopy(deps, params.copyId, signedIn(person));
    await move(deps, copy, body.revisionId);
    return presentCopy(deps, copy);
  });
  route(router, deps, api.removeCopy, async ({ params, person }) => {
    const copy = await ownCopy(deps, params.copyId, signedIn(person));
    await deps.db.getRepository(BenchCopyEntity).delete({ id: copy.id });
  });
  entryRoutes(router, deps);
  shopCardRoutes(router, deps);
}
