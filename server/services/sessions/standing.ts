import type { EntityManager } from 'typeorm';
import type { Role } from '../../../shared/scopes';
import type { AccountAnswer } from '../../../shared/account';
import { Membership } from '../../database/entities/membership';

/** A person's places, by the organization's name. */
const placesOf = (manager: EntityManager, personId: string) =>
  manager.getRepository(Membership).find({
    where: { personId },
    relations: { organization: true, person: true },
    order: { organization: { name: 'ASC', id: 'ASC' } },
  });

/** The first organization a person belongs to, or undefined where there is none. */
export const firstPlace = async (manager: EntityManager, personId: string) =>
  (await placesOf(manager, personId))[0]?.organizationId;

/** Who a person is and where, as the account answer has it; undefined where they left. */
export async function accountIn(
  manager: EntityManager,
  personId: string,
  organizationId: string,
): Promise<AccountAnswer | undefined> {
  const places = await placesOf(manager, personId);
  const here = places.find((place) => place.organizationId === organizationId);
  if (!here?.person || !here.organization) return undefined;
  const { id, email, name } = here.person;
  return {
    account: { id, email, name },
    organization: { id: here.organization.id, name: here.organization.name },
    organizations: places.flatMap(({ organization, role }) =>
      organization ? [{ id: organization.id, name: organization.name, role }] : [],
    ),
    role: here.role,
  };
}

/** A person's present role in an organization. */
export const roleIn = async (
  manager: EntityManager,
  personId: string,
  organizationId: string,
): Promise<Role | undefined> =>
  (await manager.getRepository(Membership).findOneBy({ personId, organizationId }))?.role;
