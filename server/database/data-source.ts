import 'reflect-metadata';
import { DataSource } from 'typeorm';
import { ApiKey } from './entities/api-key';
import { AuditEvent } from './entities/audit-event';
import { Membership } from './entities/membership';
import { Organization } from './entities/organization';
import { Person } from './entities/person';
import { Session } from './entities/session';
import { System } from './entities/system';
import { SystemConstant } from './entities/system-constant';
import { SystemRevision } from './entities/system-revision';
import { OrganizationsAndKeys1764547200000 } from './migrations/1764547200000-organizations-and-keys';
import { Handbook1764547300000 } from './migrations/1764547300000-handbook';
import { Sessions1764547400000 } from './migrations/1764547400000-sessions';
import { AuditEvents1764547500000 } from './migrations/1764547500000-audit-events';
import { MailOutbox1764547600000 } from './migrations/1764547600000-mail-outbox';

/** The database, not yet connected. The schema is made by migrations alone. */
export const createDataSource = (url: string): DataSource =>
  new DataSource({
    type: 'postgres',
    url,
    applicationName: 'stepwell',
    entities: [
      ...[Organization, Person, Membership, ApiKey, Session, AuditEvent],
      ...[System, SystemRevision, SystemConstant],
    ],
    migrations: [
      OrganizationsAndKeys1764547200000,
      Handbook1764547300000,
      Sessions1764547400000,
      AuditEvents1764547500000,
      MailOutbox1764547600000,
    ],
    migrationsTableName: 'schema_migrations',
    migrationsTransactionMode: 'each',
    synchronize: false,
    poolSize: 10,
    connectTimeoutMS: 5_000,
    extra: { statement_timeout: 10_000, idle_in_transaction_session_timeout: 10_000 },
  });
