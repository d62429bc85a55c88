import { z } from 'zod';
import { pageQuery } from './page';
import { queryInteger } from './query-integer';
import { text } from './text';

/**
 * Every act that is recorded, with the kind of thing it is done to. A name once used keeps its
 * meaning: events outlive the code that wrote them.
 */
export const acts = {
  'key.issued': 'key',
  'key.revoked': 'key',
  'session.opened': 'session',
  'session.refused': 'person',
  'session.ended': 'session',
  'session.reused': 'session',
  'organization.chosen': 'organization',
} as const;
export type Act = keyof typeof acts;

/** Events of one page at most: an export takes fewer calls than a screen. */
export const auditPageMost = 1_000;

const actNames = Object.keys(acts) as [Act, ...Act[]];
const exampleMoment = '2026-12-01T09:00:00.000Z';
const id = z.uuid();
const anAct = z.enum(actNames);

const moment = (description: string) =>
  z.iso
    .datetime({ offset: true, error: 'Write a moment as 2026-12-01T09:00:00Z.' })
    .optional()
    .meta({ description, example: exampleMoment });

/** Query of GET /v1/audit-events. */
export const auditQuery = z.strictObject({
  act: anAct.optional().meta({ description: 'Only this act.', example: 'key.revoked' }),
  actor: id.optional().meta({
    description: 'Only acts of this person or key.',
    example: '8c1f2a34-0b7d-4c55-8f43-0d2e9b7a6c02',
  }),
  subject: text(200).optional().meta({
    description: 'Only acts on the key, session, person or organization with this identifier.',
    example: '0d2d7a0e-5a43-4f0f-9c7e-2f1f3c1f7d10',
  }),
  from: moment('Not before this moment.'),
  to: moment('Before this moment.'),
  ...pageQuery,
  limit: queryInteger(1, auditPageMost)
    .default(50)
    .meta({ description: 'Events of a page, 1 to 1,000.', example: 50 }),
});

const person = z
  .strictObject({
    id: id.meta({
      description: 'Identifier of the person.',
      example: '8c1f2a34-0b7d-4c55-8f43-0d2e9b7a6c02',
    }),
    name: z
      .string()
      .nullable()
      .meta({ description: 'Present name; null for somebody gone.', example: 'Demo developer' }),
  })
  .meta({ id: 'AuditPerson', description: 'The person who acted.' });

const key = z
  .strictObject({
    id: id.meta({
      description: 'Identifier of the key’s row.',
      example: '0d2d7a0e-5a43-4f0f-9c7e-2f1f3c1f7d10',
    }),
    publicId: z.string().nullable().meta({
      description: 'Public part of the key; null for a key gone.',
      example: 'axdkhovjww3s',
    }),
  })
  .meta({ id: 'AuditKey', description: 'The key that acted.' });

const subject = z
  .strictObject({
    kind: z.string().meta({ description: 'Kind of thing.', example: 'key' }),
    id: z.string().nullable().meta({
      description: 'Its identifier; null where there is none, as of a person nobody knows.',
      example: '0d2d7a0e-5a43-4f0f-9c7e-2f1f3c1f7d10',
    }),
  })
  .meta({ id: 'AuditSubject', description: 'What the act was done to.' });

const detail = z.union([z.string(), z.int(), z.boolean(), z.null(), z.array(z.string())]);

/** One act, as it was recorded. */
export const auditEvent = z
  .strictObject({
    id: id.meta({
      description: 'Identifier of the event.',
      example: '7f3d1c52-9c1e-4d0b-8c56-1f0e2a9b4d77',
    }),
    at: z.iso.datetime().meta({
      description: 'When, by the database’s clock.',
      example: exampleMoment,
    }),
    act: anAct.meta({ description: 'What was done.', example: 'key.issued' }),
    person: person.nullable(),
    key: key.nullable(),
    session: id.nullable().meta({
      description: 'The session it was done in.',
      example: '3b0f7c7e-2d63-4a55-9a31-5d0f6f1b2c48',
    }),
    subject,
    address: z.string().nullable().meta({
      description: 'Network address it came from; null for an act of the service itself.',
      example: '192.0.2.7',
    }),
    requestId: z.string().nullable().meta({
      description: 'The call, as `X-Request-Id` and our logs have it.',
      example: '0b7c1a52-8f0e-4c57-9f0f-5f7a4a1f2c11',
    }),
    details: z.record(z.string(), detail).meta({
      description: 'What else was true at that moment; never a secret.',
      example: { name: 'lims-nightly', publicId: 'axdkhovjww3s' },
    }),
  })
  .meta({ id: 'AuditEvent', description: 'One act, as it was recorded.' });

/** Answer of GET /v1/audit-events. */
export const auditList = z
  .strictObject({ items: z.array(auditEvent).meta({ description: 'Events, newest first.' }) })
  .meta({ id: 'AuditEventList', description: 'Recorded acts, newest first.' });

export type AuditQuery = z.output<typeof auditQuery>;
export type AuditEventAnswer = z.infer<typeof auditEvent>;
