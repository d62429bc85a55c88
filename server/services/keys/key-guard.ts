import type { DataSource } from 'typeorm';
import { scopesOfRole, type Role } from '../../../shared/scopes';
import { ApiKey } from '../../database/entities/api-key';
import { Membership } from '../../database/entities/membership';
import type { Caller } from '../caller';
import type { KeyDigests } from './key-digest';
import { readKey } from './key-format';

export type Authentication =
  | { ok: true; caller: Caller }
  | {
      ok: false;
      reason: 'malformed' | 'checksum' | 'unknown' | 'expired' | 'revoked' | 'issuer-left';
    };

/** Tells good keys from bad ones, at each call. */
export class KeyGuard {
  constructor(
    private readonly database: DataSource,
    private readonly digests: KeyDigests,
    private readonly now: () => Date = () => new Date(),
  ) {}

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
    await this.touch(found);
    const allowed = scopesOfRole[found.role];
    return {
      ok: true,
      caller: {
        kind: 'key',
        keyId: found.id,
        name: `key:${found.publicId}`,
        organizationId: found.organizationId,
        scopes: new Set(found.scopes.filter((scope) => allowed.includes(scope))),
      },
    };
  }

  /** Notes the use of a key, once a minute at most. */
  private async touch({ id, lastUsedAt }: ApiKey): Promise<void> {
    const now = this.now();
    if (lastUsedAt !== null && now.getTime() - lastUsedAt.getTime() < 60_000) return;
    await this.database.getRepository(ApiKey).update(id, { lastUsedAt: now });
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
