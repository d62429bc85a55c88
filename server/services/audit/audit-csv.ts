import { stringify } from 'csv-stringify/sync';
import type { AuditEventAnswer } from '../../../shared/audit';

const columns = [
  ...['at', 'act', 'person_id', 'person', 'key_id', 'key', 'session_id', 'subject_kind'],
  ...['subject_id', 'address', 'request_id', 'details', 'id'],
];

const row = ({ person, key, subject, ...event }: AuditEventAnswer) => [
  ...[event.at, event.act, person?.id, person?.name, key?.id, key?.publicId, event.session],
  ...[subject.kind, subject.id, event.address, event.requestId],
  ...[JSON.stringify(event.details), event.id],
];

/**
 * Events as RFC 4180 text. What people typed may begin like a formula: such a cell gets an
 * apostrophe in front, so that a spreadsheet shows it and does not run it.
 */
export const auditCsv = (events: readonly AuditEventAnswer[]): string =>
  stringify([columns, ...events.map(row)], {
    record_delimiter: 'windows',
    escape_formulas: true,
  });
