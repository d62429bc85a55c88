import { auditList, auditQuery } from '../../shared/audit';
import { nextLink, readPlace, writePlace } from '../http/cursor';
import { operation } from '../http/operation';
import { auditCsv } from '../services/audit/audit-csv';

const json = 'application/json';
const csv = 'text/csv';

export const listAuditEvents = operation({
  method: 'get',
  path: '/v1/audit-events',
  operationId: 'listAuditEvents',
  summary: 'Who did what in the organization',
  description:
    'Newest first, for admins: acts on keys, sessions and organizations as they were recorded, ' +
    'which nobody can change. `Accept: text/csv` gives the same page as a file; text that begins ' +
    'like a formula has an apostrophe in front there.',
  tag: 'Audit',
  access: { roles: ['admin'] },
  callsPerMinute: 120,
  query: auditQuery,
  answer: auditList,
  produces: [json, csv],
  examples: {},
  handle: async ({ query: { limit, cursor, ...filter }, caller, services, accepted }) => {
    const after = readPlace(cursor);
    const { items, hasMore } = await services.audit.list(caller.organizationId, filter, {
      limit,
      after,
    });
    const last = hasMore ? items.at(-1) : undefined;
    const query = { ...filter, limit: `${limit}` };
    const headers = last
      ? nextLink('/v1/audit-events', { ...query, cursor: writePlace(last.at, last.id) })
      : {};
    return accepted === csv
      ? { type: `${csv}; charset=utf-8; header=present`, body: auditCsv(items), headers }
      : { type: json, body: JSON.stringify({ items }), headers };
  },
});
