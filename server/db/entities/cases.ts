import { Column, CreateDateColumn, Entity, PrimaryColumn, PrimaryGeneratedColumn } from 'typeorm';

export type SubjectKind = 'comment' | 'plan' | 'person';
export type CaseState = 'open' | 'ruled';
export type RulingAct = 'no-action' | 'hide' | 'remove' | 'suspend';

/** Reports on one thing, gathered. */
@Entity({ name: 'cases' })
export class CaseEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'integer', generated: 'identity' }) number!: number;
  @Column({ name: 'subject_kind', type: 'text' }) subjectKind!: SubjectKind;
  @Column({ name: 'subject_id', type: 'uuid' }) subjectId!: string;
  /** Index into the kinds of problem: 0 is the gravest. */
  @Column({ type: 'integer' }) harm!: number;
  @Column({ type: 'text' }) state!: CaseState;
  @Column({ name: 'worked_by', type: 'uuid', nullable: true }) workedBy!: string | null;
  @CreateDateColumn({ name: 'opened_at', type: 'timestamptz' }) openedAt!: Date;
}

@Entity({ name: 'reports' })
export class ReportEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'case_id', type: 'uuid' }) caseId!: string;
  @Column({ type: 'text' }) problem!: string;
  @Column({ type: 'text' }) reason!: string;
  @Column({ name: 'person_id', type: 'uuid', nullable: true }) personId!: string | null;
  @Column({ type: 'text', nullable: true }) email!: string | null;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
}

@Entity({ name: 'rulings' })
export class RulingEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'case_id', type: 'uuid' }) caseId!: string;
  @Column({ type: 'text' }) act!: RulingAct;
  @Column({ type: 'text', nullable: true }) rule!: string | null;
  @Column({ type: 'text' }) reasons!: string;
  @Column({ type: 'timestamptz', nullable: true }) until!: Date | null;
  @Column({ name: 'moderator_id', type: 'uuid' }) moderatorId!: string;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
}

/** One link of the log's chain: opaque ids and a hash of what was said; rows can only be added. */
@Entity({ name: 'log' })
export class LogEntity {
  @PrimaryGeneratedColumn('identity', { type: 'bigint' }) id!: string;
  @CreateDateColumn({ type: 'timestamptz' }) at!: Date;
  @Column({ type: 'text' }) act!: string;
  @Column({ name: 'actor_id', type: 'uuid', nullable: true }) actorId!: string | null;
  @Column({ name: 'subject_id', type: 'text' }) subjectId!: string;
  @Column({ name: 'text_hash', type: 'text' }) textHash!: string;
  @Column({ type: 'text' }) previous!: string;
  @Column({ type: 'text' }) hash!: string;
}

/** The words of a log row, beside the chain so that they can be erased without breaking it. */
@Entity({ name: 'log_texts' })
export class LogTextEntity {
  @PrimaryColumn({ name: 'log_id', type: 'bigint' }) logId!: string;
  @Column({ type: 'text' }) text!: string;
}
