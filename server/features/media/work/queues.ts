import { type EntityManager } from 'typeorm';
import { wholeSeconds } from '../../../../shared/api/media';
import { type PlanDocument } from '../../../../shared/plan/document';
import { type MediaEntity } from '../../../db/entities/media';
import { type Deps } from '../../../deps';

export interface FileJob {
  hash: string;
}
export interface StretchJob {
  hash: string;
  /** Whole seconds. */
  stretches: { start: number; end: number }[];
}

export const queues = {
  clip: 'media-clip',
  photo: 'media-photo',
  stretches: 'media-stretches',
  sweep: 'media-sweep',
} as const;

/** Queues cutting the stretches a published plan's steps show; joins the transaction. */
export async function queueStretches(
  deps: Deps,
  { clip, steps }: Pick<PlanDocument, 'clip' | 'steps'>,
  manager: EntityManager,
): Promise<void> {
  if (clip.source !== 'upload') return;
  const stretches = steps.flatMap((step) => step.stretches);
  if (stretches.length === 0) return;
  const job: StretchJob = { hash: clip.media, stretches: stretches.map(wholeSeconds) };
  await deps.jobs.send(queues.stretches, clip.media, job, manager);
}

/** Queues the work on a file; with a manager it joins that transaction. */
export async function queueWork(
  deps: Deps,
  media: Pick<MediaEntity, 'hash' | 'kind'>,
  manager?: EntityManager,
): Promise<void> {
  if (media.kind === 'captions') return;
  const { hash } = media;
  await deps.jobs.send(queues[media.kind], hash, { hash } satisfies FileJob, manager);
}
