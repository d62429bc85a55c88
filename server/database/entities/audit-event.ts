import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Act } from '../../../shared/audit';

/** One act. Rows are written once; nobody changes or removes them. */
@Entity('audit_events')
export class AuditEvent {
  @PrimaryColumn('uuid')
  id!: string;

  /** Null before an organization is known. */
  @Column('uuid', { name: 'organization_id', nullable: true })
  organizationId!: string | null;

  @Column('uuid', { name: 'person_id', nullable: true })
  personId!: string | null;

  @Column('uuid', { name: 'key_id', nullable: true })
  keyId!: string | null;

  @Column('uuid', { name: 'session_id', nullable: true })
  sessionId!: string | null;

  @Column('text', { nullable: true })
  address!: string | null;

  @Column('text', { name: 'request_id', nullable: true })
  requestId!: string | null;

  @Column('text')
  act!: Act;

  @Column('text', { name: 'subject_kind' })
  subjectKind!: string;

  @Column('text', { name: 'subject_id', nullable: true })
  subjectId!: string | null;

  @Column('jsonb')
  details!: object;

  /** The database's own clock: never written by us. */
  @Column({ type: 'timestamptz', precision: 3, insert: false, update: false })
  at!: Date;
}
