import type { Role } from '../../../shared/scopes';

/** Invented organizations and people; nobody's data, and no check value. */
export const demoOrganizations = [
  { id: '5e9b0d0e-7a51-4a0e-9d53-1b3a6f5d8a01', name: 'Larkmoor Assay' },
  { id: '5e9b0d0e-7a51-4a0e-9d53-1b3a6f5d8a02', name: 'Tarn Street Water' },
] as const;

const larkmoor = demoOrganizations[0].id;
const tarn = demoOrganizations[1].id;

interface DemoPerson {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly organizationId: string;
  readonly role: Role;
}

const person = (end: string, email: string, name: string, organizationId: string, role: Role) =>
  ({
    id: `8c1f2a34-0b7d-4c55-8f43-0d2e9b7a6c${end}`,
    email,
    name,
    organizationId,
    role,
  }) satisfies DemoPerson;

export const demoPeople = [
  person('01', 'admin@larkmoor.example', 'Demo admin', larkmoor, 'admin'),
  person('02', 'developer@larkmoor.example', 'Demo developer', larkmoor, 'developer'),
  person('03', 'scientist@larkmoor.example', 'Demo scientist', larkmoor, 'scientist'),
  person('04', 'admin@tarnstreet.example', 'Demo admin', tarn, 'admin'),
] as const;

/** Everybody's password; made only outside production, where the server binds 127.0.0.1 alone. */
export const demoPassword = 'three steps down to water';

/** The key that the first call of the README uses. */
export const demoKey = {
  issuer: {
    personId: '8c1f2a34-0b7d-4c55-8f43-0d2e9b7a6c02',
    organizationId: larkmoor,
    role: 'developer',
  },
  name: 'first-call',
  scopes: ['compute', 'systems:read'],
  expiresInDays: 90,
} as const;
