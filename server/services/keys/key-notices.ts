import type { EntityManager } from 'typeorm';
import type { Role } from '../../../shared/scopes';
import { Membership } from '../../database/entities/membership';
import { Organization } from '../../database/entities/organization';
import { Person } from '../../database/entities/person';
import type { Actor, Member } from '../caller';
import type { Letter } from '../mail/letter';
import type { Outbox } from '../mail/outbox';
import { keyIssuedLetter, keyRevokedLetter, type KeyAct } from './key-letters';

type Keeper = Member & Actor;
type Key = KeyAct['key'];

const admin: Role = 'admin';

/** Tells an organization's admins by e-mail what was done to its keys, whoever did it. */
export class KeyNotices {
  constructor(
    private readonly outbox: Outbox,
    private readonly publicUrl: string,
  ) {}

  /** Within the transaction that issues the key. */
  issued(manager: EntityManager, keeper: Keeper, key: Key, at: Date): Promise<void> {
    return this.tell(manager, keeper, keyIssuedLetter, key, at);
  }

  /** Within the transaction that revokes the key. */
  revoked(manager: EntityManager, keeper: Keeper, key: Key, at: Date): Promise<void> {
    return this.tell(manager, keeper, keyRevokedLetter, key, at);
  }

  /** Once that transaction is through. */
  send(): void {
    this.outbox.wake();
  }

  private async tell(
    manager: EntityManager,
    { organizationId, personId, address }: Keeper,
    letterOf: (act: KeyAct) => Letter,
    key: Key,
    at: Date,
  ): Promise<void> {
    const organization = await manager.findOneByOrFail(Organization, { id: organizationId });
    const person = await manager.findOneByOrFail(Person, { id: personId });
    const letter = letterOf({
      organization: organization.name,
      person,
      key,
      at,
      address,
      keysUrl: `${this.publicUrl}/keys`,
    });
    const admins = await manager.find(Membership, {
      where: { organizationId, role: admin },
      relations: { person: true },
    });
    const mails = admins.flatMap((one) =>
      one.person ? [{ ...letter, to: one.person.email }] : [],
    );
    await this.outbox.leave(manager, mails);
  }
}
