import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';
import { type Entry } from '../../../shared/plan/bench/entry';
import { type ShopCard } from '../../../shared/api/bench';

/** One builder's working copy of one revision. */
@Entity({ name: 'bench_copies' })
export class BenchCopyEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ name: 'person_id', type: 'uuid' }) personId!: string;
  @Column({ name: 'plan_id', type: 'uuid' }) planId!: string;
  @Column({ name: 'revision_id', type: 'uuid' }) revisionId!: string;
  @CreateDateColumn({ name: 'started_at', type: 'timestamptz' }) startedAt!: Date;
}

/** One line of a bench copy; only ever added. */
@Entity({ name: 'bench_entries' })
export class BenchEntryEntity {
  @PrimaryColumn({ name: 'copy_id', type: 'uuid' }) copyId!: string;
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'bigint', generated: 'identity' }) sequence!: string;
  @Column({ type: 'jsonb' }) entry!: Entry;
  @CreateDateColumn({ name: 'received_at', type: 'timestamptz' }) receivedAt!: Date;
}

@Entity({ name: 'shop_cards' })
export class ShopCardEntity {
  @PrimaryColumn({ name: 'person_id', type: 'uuid' }) personId!: string;
  @Column({ type: 'integer' }) version!: number;
  @Column({ type: 'jsonb' }) card!: ShopCard;
}
