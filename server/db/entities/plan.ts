import { Column, CreateDateColumn, Entity, PrimaryColumn, UpdateDateColumn } from 'typeorm';
import { type PlanDocumentInput } from '../../../shared/plan/document';

export const planStates = ['draft', 'published', 'unpublished', 'hidden', 'removed'] as const;
export type PlanState = (typeof planStates)[number];

/** A plan with its draft; what is published is in `revisions`. */
@Entity({ name: 'plans' })
export class PlanEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'owner_id', type: 'uuid' }) ownerId!: string;
  @Column({ type: 'text', nullable: true }) slug!: string | null;
  @Column({ type: 'jsonb' }) draft!: PlanDocumentInput;
  @Column({ type: 'integer' }) version!: number;
  @Column({ type: 'text' }) state!: PlanState;
  @Column({ name: 'current_revision_id', type: 'uuid', nullable: true }) currentRevisionId!:
    string | null;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
  @UpdateDateColumn({ name: 'updated_at', type: 'timestamptz' }) updatedAt!: Date;
}

export interface Override {
  rule: string;
  elementId: string | null;
  message: string;
  reason: string;
}

/** A frozen revision: its bytes never change (a trigger sees to it). */
@Entity({ name: 'revisions' })
export class RevisionEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'plan_id', type: 'uuid' }) planId!: string;
  @Column({ type: 'text' }) letter!: string;
  @Column({ type: 'jsonb' }) document!: PlanDocumentInput;
  /** sha256 of the document's RFC 8785 form. */
  @Column({ type: 'text' }) sha256!: string;
  @Column({ type: 'text' }) note!: string;
  @Column({ type: 'jsonb' }) overrides!: Override[];
  @Column({ name: 'published_at', type: 'timestamptz' }) publishedAt!: Date;
}

/** Derived from the current revision, for lists and search. */
@Entity({ name: 'plan_cards' })
export class PlanCardEntity {
  @PrimaryColumn({ name: 'plan_id', type: 'uuid' }) planId!: string;
  @Column({ type: 'text' }) title!: string;
  @Column({ type: 'text' }) summary!: string;
  @Column({ type: 'text', nullable: true }) cover!: string | null;
  @Column({ name: 'cover_alt', type: 'text' }) coverAlt!: string;
  @Column({ type: 'text' }) category!: string;
  @Column({ type: 'text' }) skill!: string;
  @Column({ type: 'text' }) units!: 'mm' | 'in';
  @Column({ type: 'integer' }) steps!: number;
  @Column({ name: 'hands_on', type: 'double precision' }) handsOn!: number;
  @Column({ type: 'double precision' }) elapsed!: number;
  @Column({ type: 'text', array: true }) machines!: string[];
  @Column({ name: 'clip_duration', type: 'double precision', nullable: true }) clipDuration!:
    number | null;
  @Column({ name: 'words', type: 'tsvector', select: false }) words!: string;
}
