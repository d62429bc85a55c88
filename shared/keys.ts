import { z } from 'zod';
import { scope } from './scopes';
import { text } from './text';

/** Days that a key lives where nobody says otherwise, and at most. */
export const keyDays = { default: 90, most: 365 } as const;

const id = z.uuid().meta({
  description: 'Identifier of the key’s row.',
  example: '0d2d7a0e-5a43-4f0f-9c7e-2f1f3c1f7d10',
});
const name = text(80).meta({
  description: 'What the key is for: it names what stops when the key is revoked.',
  example: 'lims-nightly',
});
const scopes = z
  .array(scope)
  .min(1)
  .max(5)
  .meta({
    description: 'What the key may do; never more than its issuer’s present role.',
    example: ['compute'],
  });
const publicId = z.string().meta({
  description: 'Public part of the key, after `stepwell_`.',
  example: 'axdkhovjww3s',
});
const moment = (description: string, example = '2027-03-01T09:00:00.000Z') =>
  z.iso.datetime().meta({ description, example });

/** Body of POST /v1/keys. */
export const keyRequest = z
  .strictObject({
    name,
    scopes: scopes.refine((given) => new Set(given).size === given.length, {
      params: { code: 'repeated' },
      message: 'Name each scope once.',
    }),
    expiresInDays: z
      .int()
      .min(1)
      .max(keyDays.most)
      .default(keyDays.default)
      .meta({ description: 'Days until the key expires.', example: 90, 'x-unit': 'd' }),
  })
  .meta({ id: 'KeyRequest', description: 'Asks for an API key.' });

/** Answer of POST /v1/keys: the one time that the key itself is shown. */
export const issuedKey = z
  .strictObject({
    id,
    key: z.string().meta({
      description: 'The key. It is shown now and never again.',
      example: 'stepwell_<12 public>_<52 secret><7 checksum>',
    }),
    publicId,
    name,
    scopes,
    expiresAt: moment('When it expires.'),
  })
  .meta({ id: 'IssuedKey', description: 'A key, once.' });

/** What is known of a key afterwards. */
export const keyAnswer = z
  .strictObject({
    id,
    publicId,
    name,
    scopes,
    issuer: z
      .strictObject({
        id: z.uuid().meta({
          description: 'Identifier of the person.',
          example: '8c1f2a34-0b7d-4c55-8f43-0d2e9b7a6c02',
        }),
        name: z.string().meta({ description: 'Name.', example: 'Demo developer' }),
      })
      .meta({ id: 'KeyIssuer', description: 'Who issued the key.' }),
    state: z.enum(['active', 'expired', 'revoked', 'issuer-left']).meta({
      description: 'Whether it is good now, and if not, why.',
      example: 'active',
    }),
    createdAt: moment('When it was issued.', '2026-12-01T09:00:00.000Z'),
    expiresAt: moment('When it expires.'),
    lastUsedAt: moment('When it was last used, to the minute.').nullable(),
    revokedAt: moment('When it was revoked.').nullable(),
  })
  .meta({ id: 'Key', description: 'An API key, without the key itself.' });

/** Answer of GET /v1/keys, newest first. */
export const keyList = z
  .strictObject({ items: z.array(keyAnswer).meta({ description: 'Keys, newest first.' }) })
  .meta({ id: 'KeyList', description: 'API keys, newest first.' });

export type KeyRequest = z.infer<typeof keyRequest>;
export type KeyRequestInput = z.input<typeof keyRequest>;
export type IssuedKey = z.infer<typeof issuedKey>;
export type KeyAnswer = z.infer<typeof keyAnswer>;
export type KeyList = z.infer<typeof keyList>;
