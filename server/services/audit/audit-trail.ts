import type { DataSource } from 'typeorm';
import type { AuditEventAnswer, AuditQuery } from '../../../shared/audit';
import { ApiKey } from '../../database/entities/api-key';
import { AuditEvent } from '../../database/entities/audit-event';
import { Person } from '../../database/entities/person';

/** Which events are asked for: where nothing is named, all of the organization's. */
export type AuditFilter = Pick<AuditQuery, 'act' | 'actor' | 'subject' | 'from' | 'to'>;

/** Events of one page, after the last of the page before. */
export interface AuditPage {
  readonly limit: number;
  readonly after?: { readonly at: Date; readonly id: string } | undefined;
}

interface Names {
  readonly person_name: string | null;
  readonly key_public_id: string | null;
}

/** Reads what was recorded. */
export class AuditTrail {
  constructor(private readonly database: DataSource) {}

  /**
   * The organization's events, newest first, and whether there are more. Events of no organization
   * (a stranger's sign-in) are nobody's here.
   */
  async list(
    organizationId: string,
    filter: AuditFilter,
    { limit, after }: AuditPage,
  ): Promise<{ items: AuditEventAnswer[]; hasMore: boolean }> {
    const query = this.matching(organizationId, filter).limit(limit + 1);
    if (after) query.andWhere('(event.at, event.id) < (:at, :id)', after);
    const { entities, raw } = await query.getRawAndEntities<Names>();
    const items = entities.slice(0, limit).map((event, i) => answer(event, raw[i]));
    return { items, hasMore: entities.length > limit };
  }

  private matching(organizationId: string, { act, actor, subject, from, to }: AuditFilter) {
    const query = this.database
      .getRepository(AuditEvent)
      .createQueryBuilder('event')
      .leftJoin(Person, 'person', 'person.id = event.personId')
      .leftJoin(ApiKey, 'key', 'key.id = event.keyId')
      .addSelect('person.name', 'person_name')
      .addSelect('key.publicId', 'key_public_id')
      .where('event.organizationId = :organizationId', { organizationId })
      .orderBy('event.at', 'DESC')
      .addOrderBy('event.id', 'DESC');
    if (act !== undefined) query.andWhere('event.act = :act', { act });
    if (actor !== undefined) query.andWhere(':actor IN (event.personId, event.keyId)', { actor });
    if (subject !== undefined) query.andWhere('event.subjectId = :subject', { subject });
    if (from !== undefined) query.andWhere('event.at >= :from', { from: new Date(from) });
    if (to !== undefined) query.andWhere('event.at < :to', { to: new Date(to) });
    return query;
  }
}

const answer = (event: AuditEvent, names: Names | undefined): AuditEventAnswer => ({
  id: event.id,
  at: event.at.toISOString(),
  act: event.act,
  person: event.personId === null ? null : { id: event.personId, name: names?.person_name ?? null },
  key: event.keyId === null ? null : { id: event.keyId, publicId: names?.key_public_id ?? null },
  session: event.sessionId,
  subject: { kind: event.subjectKind, id: event.subjectId },
  address: event.address,
  requestId: event.requestId,
  details: event.details as AuditEventAnswer['details'],
});
