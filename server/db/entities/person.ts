import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';
import { type Preferences, type Role } from '../../../shared/api/accounts';

@Entity({ name: 'people' })
export class PersonEntity {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'text' }) email!: string;
  @Column({ name: 'email_confirmed_at', type: 'timestamptz', nullable: true })
  emailConfirmedAt!: Date | null;
  @Column({ name: 'display_name', type: 'text' }) displayName!: string;
  @Column({ type: 'text' }) handle!: string;
  @Column({ name: 'shop_name', type: 'text', nullable: true }) shopName!: string | null;
  @Column({ name: 'password_hash', type: 'text' }) passwordHash!: string;
  @Column({ type: 'text', array: true }) roles!: Role[];
  @Column({ type: 'jsonb', default: {} }) preferences!: Partial<Preferences>;
  @Column({ name: 'suspended_until', type: 'timestamptz', nullable: true })
  suspendedUntil!: Date | null;
  @Column({ name: 'suspended_for', type: 'text', nullable: true }) suspendedFor!: string | null;
  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' }) createdAt!: Date;
}

/** A letter's link: only the hash of its token is kept. */
@Entity({ name: 'email_tokens' })
export class EmailTokenEntity {
  @PrimaryColumn({ name: 'token_hash', type: 'text' }) tokenHash!: string;
  @Column({ name: 'person_id', type: 'uuid' }) personId!: string;
  @Column({ type: 'text' }) purpose!: 'confirm' | 'reset';
  @Column({ name: 'expires_at', type: 'timestamptz' }) expiresAt!: Date;
  @Column({ name: 'used_at', type: 'timestamptz', nullable: true }) usedAt!: Date | null;
}
