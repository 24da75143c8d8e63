import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';
import { type UploadState } from '../../../shared/api/uploads';

/** A file on its way into the store in parts. */
@Entity({ name: 'uploads' })
export class UploadEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'person_id', type: 'uuid' }) personId!: string;
  @Column({ name: 'plan_id', type: 'uuid', nullable: true }) planId!: string | null;
  @Column({ type: 'text' }) name!: string;
  /** What the browser tells the same file by. */
  @Column({ type: 'text' }) mark!: string;
  @Column({ type: 'bigint' }) bytes!: string;
  @Column({ name: 'part_bytes', type: 'integer' }) partBytes!: number;
  @Column({ type: 'text' }) key!: string;
  /** The store's own id of the file in parts. */
  @Column({ name: 'store_id', type: 'text' }) storeId!: string;
  @Column({ type: 'text' }) state!: UploadState;
  @Column({ type: 'text', nullable: true }) reason!: string | null;
  @Column({ type: 'text', nullable: true }) hash!: string | null;
  @Column({ name: 'lease_until', type: 'timestamptz', nullable: true }) leaseUntil!: Date | null;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
  /** When something last came; an upload nobody touches is swept. */
  @Column({ name: 'touched_at', type: 'timestamptz', default: () => 'now()' }) touchedAt!: Date;
}

/** The ledger: a part the store has taken. */
@Entity({ name: 'upload_parts' })
export class UploadPartEntity {
  @PrimaryColumn({ name: 'upload_id', type: 'uuid' }) uploadId!: string;
  @PrimaryColumn({ type: 'integer' }) number!: number;
  @Column({ type: 'text' }) etag!: string;
  @Column({ type: 'bigint' }) bytes!: string;
}
