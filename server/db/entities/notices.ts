import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';
import { type NoticeKind } from '../../../shared/api/notices';

/** Why a revision changed what builders may have cut; one at most per revision. */
@Entity({ name: 'corrections' })
export class CorrectionEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'plan_id', type: 'uuid' }) planId!: string;
  @Column({ name: 'revision_id', type: 'uuid' }) revisionId!: string;
  @Column({ type: 'text' }) reason!: string;
  @Column({ type: 'boolean' }) safety!: boolean;
  /** By key of the change. */
  @Column({ type: 'jsonb' }) reasons!: Record<string, string>;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
  /** When every bench copy it touches had its notice. */
  @Column({ name: 'spread_at', type: 'timestamptz', nullable: true }) spreadAt!: Date | null;
}

/** One notice to one person; at most one per cause. */
@Entity({ name: 'notices' })
export class NoticeEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'person_id', type: 'uuid' }) personId!: string;
  @Column({ type: 'text' }) kind!: NoticeKind;
  @Column({ name: 'plan_id', type: 'uuid', nullable: true }) planId!: string | null;
  @Column({ type: 'text' }) cause!: string;
  @Column({ type: 'text' }) title!: string;
  @Column({ type: 'text' }) text!: string;
  @Column({ type: 'text' }) path!: string;
  @Column({ type: 'boolean' }) shown!: boolean;
  @Column({ name: 'letter_id', type: 'uuid', nullable: true }) letterId!: string | null;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
  @Column({ name: 'read_at', type: 'timestamptz', nullable: true }) readAt!: Date | null;
}

/** A letter: its id is its Message-ID, its notices are fixed once it is being sent. */
@Entity({ name: 'letters' })
export class LetterEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'person_id', type: 'uuid' }) personId!: string;
  @Column({ name: 'plan_id', type: 'uuid', nullable: true }) planId!: string | null;
  @Column({ type: 'boolean' }) urgent!: boolean;
  @Column({ type: 'text' }) state!: 'waiting' | 'sending' | 'sent' | 'dropped';
  @Column({ name: 'due_at', type: 'timestamptz' }) dueAt!: Date;
  @Column({ name: 'lease_until', type: 'timestamptz', nullable: true }) leaseUntil!: Date | null;
  @Column({ type: 'integer', default: 0 }) tries!: number;
  @Column({ name: 'sent_at', type: 'timestamptz', nullable: true }) sentAt!: Date | null;
}

/** What a person wants of a kind; without a row both. */
@Entity({ name: 'notice_settings' })
export class NoticeSettingEntity {
  @PrimaryColumn({ name: 'person_id', type: 'uuid' }) personId!: string;
  @PrimaryColumn({ type: 'text' }) kind!: NoticeKind;
  @Column({ type: 'boolean' }) mail!: boolean;
  @Column({ type: 'boolean' }) product!: boolean;
}
