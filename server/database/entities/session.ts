import { Column, Entity, PrimaryColumn } from 'typeorm';

/** One sign-in of one person, in one organization at a time. */
@Entity('sessions')
export class Session {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'person_id' })
  personId!: string;

  @Column('uuid', { name: 'organization_id' })
  organizationId!: string;

  /** SHA-256 of the refresh token in force. */
  @Column('bytea', { name: 'refresh_digest' })
  refreshDigest!: Buffer;

  /** That of the one before: presented again, it was stolen or raced. */
  @Column('bytea', { name: 'previous_digest', nullable: true })
  previousDigest!: Buffer | null;

  @Column('timestamptz', { name: 'rotated_at' })
  rotatedAt!: Date;

  @Column('timestamptz', { name: 'created_at' })
  createdAt!: Date;

  @Column('timestamptz', { name: 'expires_at' })
  expiresAt!: Date;

  @Column('timestamptz', { name: 'ended_at', nullable: true })
  endedAt!: Date | null;
}
