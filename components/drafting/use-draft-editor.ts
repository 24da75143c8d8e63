import { useCallback, useEffect, useRef, useState } from 'react';
import { type Draft } from '../../shared/api/plans';
import { planDocumentSchema, type PlanDocument } from '../../shared/plan/document';
import { keepLocal, dropLocal } from '../data/kept-draft';
import { ApiProblem, passing, tell } from '../data/problems';
import { putDraft } from './drafting-queries';

export type Kept =
  | { state: 'kept'; at: Date | null }
  | { state: 'not-yet' }
  | { state: 'no-signal' }
  | { state: 'refused'; text: string }
  | { state: 'stale'; version: number; document: PlanDocument };

const pause = 800;
const again = 5000;

/** How things stand after a save that failed. */
function keptAfter(error: unknown): Kept {
  if (passing(error)) return { state: 'no-signal' };
  if (!(error instanceof ApiProblem)) return { state: 'refused', text: tell(error).text };
  if (error.code === 'drafts/stale-version') {
    const meta = error.problem.meta as { version: number; document: unknown };
    return {
      state: 'stale',
      version: meta.version,
      document: planDocumentSchema.parse(meta.document),
    };
  }
  const issue = error.issues[0];
  return {
    state: 'refused',
    text: issue ? `${error.message} ${issue.path.join(' ')}: ${issue.message}` : error.message,
  };
}

/**
 * The draft being edited. Every change is kept in the browser at once and saved 0.8 s after the last one;
 * a save that finds another window was first waits for the person's choice.
 */
export function useDraftEditor(draft: Draft) {
  const [document, setDocument] = useState(draft.document);
  const [kept, setKept] = useState<Kept>({ state: 'kept', at: null });
  const version = useRef(draft.version);
  const dirty = useRef(false);
  const saving = useRef(false);

  const save = useCallback(async (): Promise<void> => {
    if (saving.current || !dirty.current) return;
    saving.current = true;
    dirty.current = false;
    try {
      const saved = await putDraft(draft.id, version.current, document);
      version.current = saved.version;
      if (!dirty.current) {
        setKept({ state: 'kept', at: new Date(saved.updatedAt) });
        void dropLocal(draft.id);
      }
    } catch (error) {
      dirty.current = true;
      setKept(keptAfter(error));
    } finally {
      saving.current = false;
    }
  }, [draft.id, document]);

  useEffect(() => {
    if (!dirty.current || kept.state === 'stale') return;
    const timer = setTimeout(() => void save(), kept.state === 'no-signal' ? again : pause);
    return () => clearTimeout(timer);
  }, [document, save, kept]);

  const change = useCallback(
    (fn: (document: PlanDocument) => PlanDocument) => {
      setDocument((before) => {
        const next = fn(before);
        void keepLocal(draft.id, next);
        return next;
      });
      dirty.current = true;
      setKept((k) => (k.state === 'stale' ? k : { state: 'not-yet' }));
    },
    [draft.id],
  );

  /** Another window was first: keep what is here (it then goes on top), or take the other. */
  const choose = (which: 'mine' | 'other') => {
    if (kept.state !== 'stale') return;
    version.current = kept.version;
    if (which === 'other') {
      dirty.current = false;
      setDocument(kept.document);
      setKept({ state: 'kept', at: new Date() });
    } else {
      dirty.current = true;
      setKept({ state: 'not-yet' });
    }
  };
  return { document, change, kept, choose, save, version: () => version.current };
}
export type DraftEditor = ReturnType<typeof useDraftEditor>;
