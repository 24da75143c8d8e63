import { Column, CreateDateColumn, Entity, PrimaryColumn, PrimaryGeneratedColumn } from 'typeorm';

export type CommentState = 'shown' | 'deleted' | 'hidden' | 'removed';

/** A critique, a question, or an answer to one. */
@Entity({ name: 'comments' })
export class CommentEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'plan_id', type: 'uuid' }) planId!: string;
  @Column({ type: 'text' }) letter!: string;
  @Column({ type: 'text' }) kind!: 'critique' | 'question' | 'answer';
  @Column({ name: 'anchor_on', type: 'text' }) anchorOn!: 'plan' | 'step' | 'part' | 'dimension';
  @Column({ name: 'anchor_element_id', type: 'uuid', nullable: true }) anchorElementId!:
    string | null;
  @Column({ type: 'text', nullable: true }) stance!: 'keep' | 'change' | null;
  @Column({ type: 'text' }) text!: string;
  @Column({ type: 'text' }) why!: string;
  @Column({ name: 'author_id', type: 'uuid' }) authorId!: string;
  @Column({ name: 'parent_id', type: 'uuid', nullable: true }) parentId!: string | null;
  @Column({ name: 'settled_by', type: 'uuid', nullable: true }) settledBy!: string | null;
  @Column({ type: 'text' }) state!: CommentState;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
  @Column({ name: 'edited_at', type: 'timestamptz', nullable: true }) editedAt!: Date | null;
}

/** The words before an edit. */
@Entity({ name: 'comment_versions' })
export class CommentVersionEntity {
  @PrimaryGeneratedColumn('identity', { type: 'bigint' }) id!: string;
  @Column({ name: 'comment_id', type: 'uuid' }) commentId!: string;
  @Column({ type: 'text' }) text!: string;
  @Column({ type: 'text' }) why!: string;
  @CreateDateColumn({ name: 'until', type: 'timestamptz' }) until!: Date;
}
