import { z } from 'zod';
import { roles } from './scopes';
import { text } from './text';

const role = z.enum(roles).meta({ description: 'Role in the organization.', example: 'developer' });
const id = z.uuid();
const organizationName = z.string().meta({
  description: 'Name of the organization.',
  example: 'Larkmoor Assay',
});
const organizationId = id.meta({
  description: 'Identifier of the organization.',
  example: '5e9b0d0e-7a51-4a0e-9d53-1b3a6f5d8a01',
});

/** Body of POST /v1/sessions. */
export const signInRequest = z
  .strictObject({
    email: text(254).meta({
      description: 'E-mail address.',
      example: 'developer@larkmoor.example',
    }),
    password: z.string().min(1).max(1_000).meta({
      description: 'Password, as typed.',
      example: 'three steps down to water',
    }),
  })
  .meta({ id: 'SignInRequest', description: 'Signs a person in.' });

/** Body of PUT /v1/sessions/current/organization. */
export const organizationChoice = z
  .strictObject({ organizationId })
  .meta({ id: 'OrganizationChoice', description: 'The organization to work in.' });

/** Who is signed in, and where. */
export const accountAnswer = z
  .strictObject({
    account: z
      .strictObject({
        id: id.meta({
          description: 'Identifier of the person.',
          example: '8c1f2a34-0b7d-4c55-8f43-0d2e9b7a6c02',
        }),
        email: z
          .string()
          .meta({ description: 'E-mail address.', example: 'developer@larkmoor.example' }),
        name: z.string().meta({ description: 'Name.', example: 'Demo developer' }),
      })
      .meta({ id: 'Account', description: 'The person.' }),
    organization: z
      .strictObject({ id: organizationId, name: organizationName })
      .meta({ id: 'Organization', description: 'The organization worked in.' }),
    organizations: z
      .array(
        z
          .strictObject({ id: organizationId, name: organizationName, role })
          .meta({ id: 'Place', description: 'One organization of the person.' }),
      )
      .meta({ description: 'Every organization of the person.' }),
    role,
  })
  .meta({ id: 'AccountAnswer', description: 'Who is signed in, and where.' });

export type SignInRequest = z.infer<typeof signInRequest>;
export type AccountAnswer = z.infer<typeof accountAnswer>;
