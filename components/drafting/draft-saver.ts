import { planDocumentSchema, type PlanDocument } from '../../shared/plan/document';
import { type KeptDraft } from '../data/kept-draft';
import { ApiProblem, passing, tell } from '../data/problems';

export type Kept =
  | { state: 'kept'; at: Date | null }
  | { state: 'not-yet' }
  | { state: 'no-signal' }
  | { state: 'refused'; text: string }
  | { state: 'stale'; version: number; document: PlanDocument };

export interface SaverPorts {
  put: (version: number, document: PlanDocument) => Promise<{ version: number; updatedAt: string }>;
  keep: (kept: KeptDraft) => void;
  drop: () => void;
  /** Told whenever the document or how it is kept changes. */
  changed: (document: PlanDocument, kept: Kept) => void;
}

/** Milliseconds: after the last change · after silence · while nobody is signed in. */
export const delays = { typing: 800, silence: 5000, signedOut: 15_000 } as const;

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
 * Saves a draft: 0.8 s after the last change, one save at a time, again after silence, never again by itself
 * what was refused as it stands, and not at all while another window's version waits for a choice. What the
 * server does not have is kept in the browser with the version it was made from.
 */
export class DraftSaver {
  private changes = 0;
  private saved = 0;
  private kept: Kept = { state: 'kept', at: null };
  private running: Promise<void> | null = null;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private readonly ports: SaverPorts;
  version: number;
  document: PlanDocument;

  constructor(version: number, document: PlanDocument, ports: SaverPorts) {
    this.version = version;
    this.document = document;
    this.ports = ports;
  }

  change(fn: (document: PlanDocument) => PlanDocument): void {
    this.document = fn(this.document);
    this.changes += 1;
    this.ports.keep({ version: this.version, document: this.document });
    if (this.kept.state === 'stale') return this.tell(this.kept);
    this.tell({ state: 'not-yet' });
    this.later(delays.typing);
  }

  /** Takes up what a closed tab left: made from this version it is saved, from an older one the person chooses. */
  restore(local: KeptDraft): void {
    if (JSON.stringify(local.document) === JSON.stringify(this.document)) return this.ports.drop();
    const server = this.document;
    const older = local.version !== this.version;
    this.document = local.document;
    this.changes += 1;
    if (older) return this.tell({ state: 'stale', version: this.version, document: server });
    this.tell({ state: 'not-yet' });
    this.later(0);
  }

  /** Another window was first: put this one on top, or take the other. */
  choose(which: 'mine' | 'other'): void {
    if (this.kept.state !== 'stale') return;
    this.version = this.kept.version;
    if (which === 'mine') {
      this.tell({ state: 'not-yet' });
      this.later(0);
      return;
    }
    this.document = this.kept.document;
    this.saved = this.changes;
    this.ports.drop();
    this.tell({ state: 'kept', at: new Date() });
  }

  /** Saves at once; true when the server has everything that is here. */
  async saveNow(): Promise<boolean> {
    clearTimeout(this.timer);
    while (this.running) await this.running;
    if (this.changes !== this.saved && this.kept.state !== 'stale') await this.run();
    return this.changes === this.saved;
  }

  stop(): void {
    clearTimeout(this.timer);
  }

  private tell(kept: Kept): void {
    this.kept = kept;
    this.ports.changed(this.document, kept);
  }

  private later(delay: number): void {
    clearTimeout(this.timer);
    this.timer = setTimeout(() => {
      // A save that is under way looks for what came since when it ends.
      if (!this.running) void this.run();
    }, delay);
  }

  private run(): Promise<void> {
    this.running = this.save().finally(() => {
      this.running = null;
    });
    return this.running;
  }

  private async save(): Promise<void> {
    if (this.changes === this.saved || this.kept.state === 'stale') return;
    const count = this.changes;
    try {
      const answer = await this.ports.put(this.version, this.document);
      this.version = answer.version;
      this.saved = count;
      if (this.changes === count) {
        this.ports.drop();
        this.tell({ state: 'kept', at: new Date(answer.updatedAt) });
      } else {
        this.ports.keep({ version: this.version, document: this.document });
        this.later(delays.typing);
      }
    } catch (error) {
      this.tell(keptAfter(error));
      if (passing(error)) this.later(delays.silence);
      else if (error instanceof ApiProblem && error.status === 401) this.later(delays.signedOut);
      else if (this.changes !== count) this.later(delays.typing);
    }
  }
}
