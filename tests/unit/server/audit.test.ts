import { acts, type AuditEventAnswer } from '../../../shared/audit';
import { auditCsv } from '../../../server/services/audit/audit-csv';

const event: AuditEventAnswer = {
  id: '7f3d1c52-9c1e-4d0b-8c56-1f0e2a9b4d77',
  at: '2026-12-01T09:00:00.000Z',
  act: 'key.issued',
  person: { id: '8c1f2a34-0b7d-4c55-8f43-0d2e9b7a6c02', name: 'Ada' },
  key: null,
  session: null,
  subject: { kind: 'key', id: null },
  address: '2001:db8::1',
  requestId: null,
  details: { name: 'a, "b"', scopes: ['compute'] },
};

const line = (change: Partial<AuditEventAnswer>) =>
  auditCsv([{ ...event, ...change }]).split('\r\n')[1];
const named = (name: string) => line({ person: { id: 'p', name } })?.split(',')[3];

test.each(Object.keys(acts))('%s reads: of what, dot, what was done', (act) => {
  expect(act).toMatch(/^[a-z]+(-[a-z]+)*\.[a-z]+(-[a-z]+)*$/);
});

test('a file has a header and a line an event, as RFC 4180 writes them', () => {
  expect(auditCsv([event])).toBe(
    'at,act,person_id,person,key_id,key,session_id,subject_kind,subject_id,address,request_id,' +
      'details,id\r\n' +
      '2026-12-01T09:00:00.000Z,key.issued,8c1f2a34-0b7d-4c55-8f43-0d2e9b7a6c02,Ada,,,,key,,' +
      '2001:db8::1,,"{""name"":""a, \\""b\\"""",""scopes"":[""compute""]}",' +
      '7f3d1c52-9c1e-4d0b-8c56-1f0e2a9b4d77\r\n',
  );
});

test('without events a file has its header alone', () => {
  expect(auditCsv([])).toMatch(/^at,act,[a-z_,]*,id\r\n$/);
});

// OWASP, "CSV Injection": = + - @, tab, carriage return, and their full-width forms (recalled).
test.each(['=1+1', '+1', '-1', '@x', '\t=1', '＝1', '＋1', '－1', '＠x'])(
  'a name %j is text to a spreadsheet',
  (name) => {
    expect(named(name)).toBe(`'${name}`);
  },
);

test('a name that only holds such a sign stays as it is', () => {
  expect(named('Smith-Jones')).toBe('Smith-Jones');
});
