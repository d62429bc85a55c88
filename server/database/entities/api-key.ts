import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';
import type { Scope } from '../../../shared/scopes';

/** An API key's row: everything but the key itself, which is shown once and never stored. */
@Entity('api_keys')
export class ApiKey {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('text', { name: 'public_id' })
  publicId!: string;

  @Column('uuid', { name: 'organization_id' })
  organizationId!: string;

  /** Who issued it: a key is never worth more than its issuer's present role. */
  @Column('uuid', { name: 'issuer_id' })
  issuerId!: string;

  @Column('text')
  name!: string;

  @Column('text', { array: true })
  scopes!: Scope[];

  @Column('integer', { name: 'pepper_version' })
  pepperVersion!: number;

  @Column('bytea')
  digest!: Buffer;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt!: Date;

  @Column('timestamptz', { name: 'expires_at' })
  expiresAt!: Date;

  @Column('timestamptz', { name: 'revoked_at', nullable: true })
  revokedAt!: Date | null;

  /** To the minute. */
  @Column('timestamptz', { name: 'last_used_at', nullable: true })
  lastUsedAt!: Date | null;
}
