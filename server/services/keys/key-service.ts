import { randomUUID } from 'node:crypto';
import type { DataSource } from 'typeorm';
import { scopesOfRole, type Role, type Scope } from '../../../shared/scopes';
import { ApiKey } from '../../database/entities/api-key';
import { Membership } from '../../database/entities/membership';
import { KeyDigests } from './key-digest';
import { makeKey, readKey } from './key-format';

/** Who a valid key speaks for, and what it may do now. */
export interface Caller {
  readonly publicId: string;
  readonly organizationId: string;
  readonly scopes: ReadonlySet<Scope>;
}

export type Authentication =
  | { ok: true; caller: Caller }
  | {
      ok: false;
      reason: 'malformed' | 'checksum' | 'unknown' | 'expired' | 'revoked' | 'issuer-left';
    };

interface NewKey {
  readonly organizationId: string;
  readonly issuerId: string;
  readonly name: string;
  readonly scopes: readonly Scope[];
  readonly expiresAt: Date;
}

export class KeyService {
  private readonly digests: KeyDigests;

  constructor(
    private readonly database: DataSource,
    peppers: ReadonlyMap<number, Buffer>,
    private readonly now: () => Date = () => new Date(),
  ) {
    this.digests = new KeyDigests(peppers);
  }

  /** Issues a key. The key itself is in the answer and nowhere else. */
  async issue(wanted: NewKey): Promise<{ id: string; key: string; publicId: string }> {
    const { key, publicId } = makeKey();
    const id = randomUUID();
    await this.database.getRepository(ApiKey).insert({
      ...wanted,
      scopes: [...wanted.scopes],
      id,
      publicId,
      ...this.digests.of(key),
      revokedAt: null,
    });
    return { id, key, publicId };
  }

  /**
   * Whether a presented key is good: form and checksum first, then its row by the public part,
   * then the digest in constant time. Only the holder of the right secret learns whether it has
   * expired or was revoked. Effective scopes are the key's, cut to its issuer's present role.
   */
  async authenticate(key: string): Promise<Authentication> {
    const read = readKey(key);
    if (!read.ok) return read;
    const found = await this.find(read.publicId);
    if (found === null || !this.digests.matches(key, found))
      return { ok: false, reason: 'unknown' };
    if (found.revokedAt !== null) return { ok: false, reason: 'revoked' };
    if (found.expiresAt <= this.now()) return { ok: false, reason: 'expired' };
    if (found.role === null) return { ok: false, reason: 'issuer-left' };
    const allowed = scopesOfRole[found.role];
    return {
      ok: true,
      caller: {
        publicId: found.publicId,
        organizationId: found.organizationId,
        scopes: new Set(found.scopes.filter((scope) => allowed.includes(scope))),
      },
    };
  }

  private async find(publicId: string): Promise<(ApiKey & { role: Role | null }) | null> {
    const { entities, raw } = await this.database
      .getRepository(ApiKey)
      .createQueryBuilder('key')
      .leftJoin(
        Membership,
        'membership',
        'membership.personId = key.issuerId AND membership.organizationId = key.organizationId',
      )
      .addSelect('membership.role', 'issuer_role')
      .where('key.publicId = :publicId', { publicId })
      .getRawAndEntities<{ issuer_role: Role | null }>();
    const [entity] = entities;
    return entity ? Object.assign(entity, { role: raw[0]?.issuer_role ?? null }) : null;
  }
}
