import { z } from 'zod';

/** What a key may be good for. */
export const scopes = [
  'compute',
  'systems:read',
  'systems:write',
  'batches',
  'usage:read',
] as const;
export type Scope = (typeof scopes)[number];
export const scope = z.enum(scopes);

/** What a person is in an organization. */
export const roles = ['admin', 'developer', 'scientist'] as const;
export type Role = (typeof roles)[number];

/** What a role may do at all: a key never outlives its issuer's present role. */
export const scopesOfRole: Readonly<Record<Role, readonly Scope[]>> = {
  admin: scopes,
  developer: scopes,
  scientist: ['compute', 'systems:read', 'systems:write', 'batches'],
};
