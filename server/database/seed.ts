import type { DataSource } from 'typeorm';
import type { KeyService } from '../services/keys/key-service';
import { demoKey, demoOrganizations, demoPeople } from './demo-data';
import { Membership } from './entities/membership';
import { Organization } from './entities/organization';
import { Person } from './entities/person';

/** Puts the demo organizations and people in, once; running it again changes nothing. */
export async function seedDemo(database: DataSource): Promise<void> {
  await database.transaction(async (manager) => {
    const insert = (
      entity: typeof Organization | typeof Person | typeof Membership,
      rows: object[],
    ) => manager.createQueryBuilder().insert().into(entity).values(rows).orIgnore().execute();
    await insert(Organization, [...demoOrganizations]);
    await insert(
      Person,
      demoPeople.map(({ id, email, name }) => ({ id, email, name })),
    );
    await insert(
      Membership,
      demoPeople.map(({ id, organizationId, role }) => ({ personId: id, organizationId, role })),
    );
  });
}

/** A key for the first call: the one held, where it is still good, else a new one. */
export async function demoKeyFor(keys: KeyService, held: string | undefined): Promise<string> {
  if (held !== undefined && (await keys.authenticate(held)).ok) return held;
  const { issuerId, organizationId, name, scopes, days } = demoKey;
  const expiresAt = new Date(Date.now() + days * 86_400_000);
  return (await keys.issue({ issuerId, organizationId, name, scopes, expiresAt })).key;
}
