import { randomUUID } from 'node:crypto';
import { IsNull, type DataSource } from 'typeorm';
import type { IssuedKey, KeyAnswer, KeyList, KeyRequest } from '../../../shared/keys';
import { scopesOfRole, type Role } from '../../../shared/scopes';
import { ApiKey } from '../../database/entities/api-key';
import { Membership } from '../../database/entities/membership';
import { Person } from '../../database/entities/person';
import { Refusal } from '../../refusal';
import type { Member } from '../caller';
import type { KeyDigests } from './key-digest';
import { makeKey } from './key-format';

interface Row extends ApiKey {
  readonly issuer: { readonly id: string; readonly name: string };
  readonly role: Role | null;
}

/** Rows of one page, after the last row of the page before. */
export interface Page {
  readonly limit: number;
  readonly after?: { readonly createdAt: Date; readonly id: string } | undefined;
}

/** What people do with keys: an admin with all of the organization's, a developer with their own. */
export class KeyConsole {
  constructor(
    private readonly database: DataSource,
    private readonly digests: KeyDigests,
    private readonly now: () => Date = () => new Date(),
  ) {}

  /** Issues a key. The key itself is in the answer and nowhere else. */
  async issue(person: Member, wanted: KeyRequest): Promise<IssuedKey> {
    const beyond = wanted.scopes.filter((scope) => !scopesOfRole[person.role].includes(scope));
    if (beyond.length > 0) {
      throw new Refusal('role-insufficient', `Your role does not have ${beyond.join(', ')}.`);
    }
    const { key, publicId } = makeKey();
    const { name, scopes, expiresInDays } = wanted;
    const id = randomUUID();
    const createdAt = this.now();
    const expiresAt = new Date(createdAt.getTime() + expiresInDays * 86_400_000);
    await this.database.getRepository(ApiKey).insert({
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
    });
    return { id, key, publicId, name, scopes, expiresAt: expiresAt.toISOString() };
  }

  /** Keys, newest first, and whether there are more. */
  async list(person: Member, page: Page): Promise<KeyList & { hasMore: boolean }> {
    const query = this.rows(person).limit(page.limit + 1);
    if (page.after) {
      query.andWhere('(key.createdAt, key.id) < (:createdAt, :afterId)', {
        createdAt: page.after.createdAt,
        afterId: page.after.id,
      });
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
  async revoke(person: Member, id: string): Promise<KeyAnswer> {
    const found = await this.find(person, id);
    if (found.revokedAt !== null) return this.answer(found);
    const revokedAt = this.now();
    await this.database.getRepository(ApiKey).update({ id, revokedAt: IsNull() }, { revokedAt });
    return this.answer({ ...found, revokedAt });
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
