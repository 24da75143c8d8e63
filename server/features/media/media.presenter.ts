import { type Media } from '../../../shared/api/media';
import { type MediaEntity } from '../../db/entities/media';

/** A file as its owner sees it, under the name they gave it. */
export const presentMedia = (m: MediaEntity, name: string): Media => ({
  hash: m.hash,
  kind: m.kind,
  bytes: Number(m.bytes),
  type: m.type,
  name,
  width: m.width,
  height: m.height,
  duration: m.duration,
  renditions: Object.keys(m.renditions),
  state: m.state,
  progress: m.progress,
  reason: m.reason,
  createdAt: m.createdAt.toISOString(),
});
