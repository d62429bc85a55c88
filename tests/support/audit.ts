import { auditList, type AuditEventAnswer } from '../../shared/audit';
import type { Signed } from './people';
import type { TestServer } from './server';

type Query = Readonly<Record<string, string>>;

/** Events as an admin reads them, newest first. */
export async function eventsOf(admin: Signed, query: Query = {}): Promise<AuditEventAnswer[]> {
  const answer = await admin.get('/v1/audit-events').query(query).expect(200);
  return auditList.parse(answer.body).items;
}

/** Acts done to one thing, oldest first, as they stand in the table, whoever may read them. */
export async function actsOn({ database }: TestServer, subjectId: string): Promise<string[]> {
  const rows = await database.query<{ act: string }[]>(
    'SELECT act FROM audit_events WHERE subject_id = $1 ORDER BY at, id',
    [subjectId],
  );
  return rows.map(({ act }) => act);
}
