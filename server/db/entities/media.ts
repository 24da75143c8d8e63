import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';
import { type MediaState } from '../../../shared/api/media';

/** A file, named by the sha256 of its stored bytes. */
@Entity({ name: 'media' })
export class MediaEntity {
  @PrimaryColumn({ type: 'text' }) hash!: string;
  @Column({ type: 'text' }) kind!: 'clip' | 'photo' | 'captions';
  @Column({ type: 'text' }) type!: string;
  @Column({ type: 'bigint' }) bytes!: string;
  @Column({ type: 'integer', nullable: true }) width!: number | null;
  @Column({ type: 'integer', nullable: true }) height!: number | null;
  @Column({ type: 'double precision', nullable: true }) duration!: number | null;
  /** Rendition name to its key in the store and its type. */
  @Column({ type: 'jsonb' }) renditions!: Record<string, { key: string; type: string }>;
  /** How far the work on it is; `refused` and `failed` have a reason. */
  @Column({ type: 'text', default: 'ready' }) state!: MediaState;
  @Column({ type: 'text', nullable: true }) reason!: string | null;
  /** Per cent of the work that goes on. */
  @Column({ type: 'smallint', default: 0 }) progress!: number;
  /** The file as it was uploaded; it is never shown, since it may say where it was made. */
  @Column({ name: 'source_key', type: 'text', nullable: true }) sourceKey!: string | null;
  /** Until then one process works on it; afterwards another may take it. */
  @Column({ name: 'lease_until', type: 'timestamptz', nullable: true }) leaseUntil!: Date | null;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
}

/** Who uploaded a file; identical files are stored once and may have several owners. */
@Entity({ name: 'media_owners' })
export class MediaOwnerEntity {
  @PrimaryColumn({ type: 'text' }) hash!: string;
  @PrimaryColumn({ name: 'person_id', type: 'uuid' }) personId!: string;
  @Column({ type: 'text' }) name!: string;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
}

/** Which plans' revisions show a file; derived at publishing, so that permission is one look-up. */
@Entity({ name: 'media_uses' })
export class MediaUseEntity {
  @PrimaryColumn({ type: 'text' }) hash!: string;
  @PrimaryColumn({ name: 'plan_id', type: 'uuid' }) planId!: string;
}
