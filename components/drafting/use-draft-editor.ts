import { useEffect, useMemo, useState } from 'react';
import { type Draft } from '../../shared/api/plans';
import { type PlanDocument } from '../../shared/plan/document';
import { createModel, type DimensionState, type PlanModel } from '../../shared/plan/model';
import { dropLocal, keepLocal, readLocal } from '../data/kept-draft';
import { DraftSaver, type Kept } from './draft-saver';
import { lastGood } from './dimensions/facts';
import { putDraft } from './drafting-queries';

export { type Kept } from './draft-saver';

interface Shown {
  document: PlanDocument;
  kept: Kept;
  /** The plan worked out; only what a change touches is worked out again. */
  model: PlanModel;
  /** Each dimension when it was good last. */
  good: ReadonlyMap<string, DimensionState>;
}

function shownNext(before: Shown, document: PlanDocument, kept: Kept): Shown {
  if (document === before.document) return { ...before, kept };
  const model = before.model.update(document);
  return { document, kept, model, good: lastGood(before.good, model) };
}

/** The draft being edited: its document, how it is kept, and what can be done with it. */
export function useDraftEditor(draft: Draft) {
  const [shown, setShown] = useState<Shown>(() => {
    const model = createModel(draft.document);
    return {
      document: draft.document,
      kept: { state: 'kept', at: null },
      model,
      good: lastGood(new Map(), model),
    };
  });
  const [saver] = useState(
    () =>
      new DraftSaver(draft.version, draft.document, {
        put: (version, document) => putDraft(draft.id, version, document),
        keep: (kept) => keepLocal(draft.id, kept),
        drop: () => void dropLocal(draft.id),
        changed: (document, kept) => setShown((before) => shownNext(before, document, kept)),
      }),
  );
  useEffect(() => {
    let gone = false;
    void readLocal(draft.id).then((local) => {
      if (local && !gone) saver.restore(local);
    });
    return () => {
      gone = true;
      // What is typed in the last second is in the browser already; it goes up on the way out as well.
      void saver.saveNow();
      saver.stop();
    };
  }, [draft.id, saver]);
  const acts = useMemo(
    () => ({
      change: (fn: (document: PlanDocument) => PlanDocument) => saver.change(fn),
      choose: (which: 'mine' | 'other') => saver.choose(which),
      saveNow: () => saver.saveNow(),
      version: () => saver.version,
    }),
    [saver],
  );
  return useMemo(() => ({ ...shown, ...acts }), [shown, acts]);
}
export type DraftEditor = ReturnType<typeof useDraftEditor>;
