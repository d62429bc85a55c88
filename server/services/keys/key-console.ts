import { randomUUID } from 'node:crypto';
import { IsNull, type DataSource } from 'typeorm';
import type { IssuedKey, KeyAnswer, KeyList, KeyRequest } from '../../../shared/keys';
import { scopesOfRole, type Role } from '../../../shared/scopes';
import { ApiKey } from '../../database/entities/api-key';
import { Membership } from '../../database/entities/membership';
import { Person } from '../../database/entities/person';
import { Refusal } from '../../refusal';
import { recordAct } from '../audit/record-act';
import type { Actor, Member } from '../caller';
import type { KeyDigests } from './key-digest';
import { makeKey } from './key-format';
import type { KeyNotices } from './key-notices';

interface Row extends ApiKey {
  readonly issuer: { readonly id: string; readonly name: string };
  readonly role: Role | null;
}

/** Rows of one page, after the last row of the page before. */
export interface Page {
  readonly limit: number;
  readonly after?: { readonly at: Date; readonly id: string } | undefined;
}

type KeyKeeper = Member & Actor;

/** What people do with keys: an admin with all of the organization's, a developer with their own. */
export class KeyConsole {
  constructor(
    private readonly database: DataSource,
    private readonly digests: KeyDigests,
    /** Tells the admins, where mail is sent. */
    private readonly notices?: KeyNotices,
    private readonly now: () => Date = () => new Date(),
  ) {}

  /** Issues a key. The key itself is in the answer and nowhere else. */
  async issue(person: KeyKeeper, wanted: KeyRequest): Promise<IssuedKey> {
    const beyond = wanted.scopes.filter((scope) => !scopesOfRole[person.role].includes(scope));
    if (beyond.length > 0) {
      throw new Refusal('role-insufficient', `Your role does not have ${beyond.join(', ')}.`);
    }
    const { key, publicId } = makeKey();
    const { name, scopes, expiresInDays } = wanted;
    const id = randomUUID();
    const createdAt = this.now();
    const expiresAt = new Date(createdAt.getTime() + expiresInDays * 86_400_000);
    const row = {
      id,
      publicId,
      organizationId: person.organizationId,
      issuerId: person.personId,
      name,
      scopes,
      ...this.digests.of(key),
      createdAt,
      expiresAt,
      revokedAt: null,
      lastUsedAt: null,
    };
    const shown = { publicId, name, scopes, expiresAt: expiresAt.toISOString() };
    await this.database.transaction(async (manager) => {
      await manager.insert(ApiKey, row);
      await recordAct(manager, person, { act: 'key.issued', subjectId: id, details: shown });
      await this.notices?.issued(manager, person, row, createdAt);
    });
    this.notices?.send();
    return { id, key, ...shown };
  }

  /** Keys, newest first, and whether there are more. */
  async list(person: Member, page: Page): Promise<KeyList & { hasMore: boolean }> {
    const query = this.rows(person).limit(page.limit + 1);
    if (page.after) {
      query.andWhere('(key.createdAt, key.id) < (:at, :id)', page.after);
    }
    const rows = await this.fetch(query);
    const items = rows.slice(0, page.limit).map((row) => this.answer(row));
    return { items, hasMore: rows.length > page.limit };
  }

  /** One key that this person may see. */
  async read(person: Member, id: string): Promise<KeyAnswer> {
    return this.answer(await this.find(person, id));
  }

  /** Revokes a key for good; done twice it is what it was. It is dead at its next call. */
  async revoke(person: KeyKeeper, id: string): Promise<KeyAnswer> {
    const found = await this.find(person, id);
    if (found.revokedAt === null) {
      const { publicId, name } = found;
      await this.database.transaction(async (manager) => {
        const revokedAt = this.now();
        const { affected } = await manager.update(
          ApiKey,
          { id, revokedAt: IsNull() },
          { revokedAt },
        );
        // Somebody else was first: then that is the act.
        if (affected === 0) return;
        const details = { publicId, name };
        await recordAct(manager, person, { act: 'key.revoked', subjectId: id, details });
        await this.notices?.revoked(manager, person, found, revokedAt);
      });
      this.notices?.send();
    }
    return this.read(person, id);
  }

  private async find(person: Member, id: string): Promise<Row> {
    const [found] = await this.fetch(this.rows(person).andWhere('key.id = :id', { id }));
    if (!found) throw new Refusal('not-found', 'There is no such key.');
    return found;
  }

  private rows({ organizationId, personId, role }: Member) {
    const query = this.database
      .getRepository(ApiKey)
      .createQueryBuilder('key')
      .innerJoin(Person, 'issuer', 'issuer.id = key.issuerId')
      .leftJoin(
        Membership,
        'membership',
        'membership.personId = key.issuerId AND membership.organizationId = key.organizationId',
      )
      .addSelect('issuer.name', 'issuer_name')
      .addSelect('membership.role', 'issuer_role')
      .where('key.organizationId = :organizationId', { organizationId })
      .orderBy('key.createdAt', 'DESC')
      .addOrderBy('key.id', 'DESC');
    return role === 'admin' ? query : query.andWhere('key.issuerId = :personId', { personId });
  }

  private async fetch(query: ReturnType<KeyConsole['rows']>): Promise<Row[]> {
    const { entities, raw } = await query.getRawAndEntities<{
      issuer_name: string;
      issuer_role: Role | null;
    }>();
    return entities.map((key, i) => ({
      ...key,
      issuer: { id: key.issuerId, name: raw[i]?.issuer_name ?? '' },
      role: raw[i]?.issuer_role ?? null,
    }));
  }

  private answer(row: Row): KeyAnswer {
    const { id, publicId, name, scopes, issuer } = row;
    return {
      id,
      publicId,
      name,
      scopes,
      issuer,
      state: this.stateOf(row),
      createdAt: row.createdAt.toISOString(),
      expiresAt: row.expiresAt.toISOString(),
      lastUsedAt: row.lastUsedAt?.toISOString() ?? null,
      revokedAt: row.revokedAt?.toISOString() ?? null,
    };
  }

  private stateOf({ revokedAt, expiresAt, role }: Row): KeyAnswer['state'] {
    if (revokedAt !== null) return 'revoked';
    if (expiresAt <= this.now()) return 'expired';
    return role === null ? 'issuer-left' : 'active';
  }
}
