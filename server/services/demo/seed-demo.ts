import type { DataSource } from 'typeorm';
import type { Services } from '..';
import { hashPassword } from '../sessions/passwords';
import { demoKey, demoOrganizations, demoPassword, demoPeople } from './demo-data';
import { Membership } from '../../database/entities/membership';
import { Organization } from '../../database/entities/organization';
import { Person } from '../../database/entities/person';

/** Puts the demo organizations and people in, once; running it again changes nothing. */
export async function seedDemo(database: DataSource): Promise<void> {
  const passwordHash = await hashPassword(demoPassword);
  await database.transaction(async (manager) => {
    const insert = (
      entity: typeof Organization | typeof Person | typeof Membership,
      rows: object[],
    ) => manager.createQueryBuilder().insert().into(entity).values(rows).orIgnore().execute();
    await insert(
      Organization,
      demoOrganizations.map(({ id, name }) => ({ id, name })),
    );
    await insert(
      Person,
      demoPeople.map(({ id, email, name }) => ({ id, email, name, passwordHash })),
    );
    await insert(
      Membership,
      demoPeople.map(({ id, organizationId, role }) => ({ personId: id, organizationId, role })),
    );
  });
}

/** A key for the first call: the one held, where it is still good, else a new one. */
export async function demoKeyFor(
  { keys, keyConsole }: Pick<Services, 'keys' | 'keyConsole'>,
  held: string | undefined,
): Promise<string> {
  if (held !== undefined && (await keys.authenticate(held)).ok) return held;
  const { issuer, name, scopes, expiresInDays } = demoKey;
  return (await keyConsole.issue(issuer, { name, scopes: [...scopes], expiresInDays })).key;
}
