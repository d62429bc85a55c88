import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { acts, type Act } from '../../../shared/audit';
import { AuditEvent } from '../../database/entities/audit-event';
import type { Actor } from '../caller';
import type { DetailsOf } from './details';

interface Done<A extends Act> {
  readonly act: A;
  /** Identifier of what it was done to, of the kind that `acts` names. */
  readonly subjectId: string | null;
  readonly details: DetailsOf[A];
}

/**
 * Records an act. The manager must be that of the transaction the act is done in: then what is
 * recorded happened, and what happened is recorded.
 */
export async function recordAct<A extends Act>(
  manager: EntityManager,
  actor: Actor,
  { act, subjectId, details }: Done<A>,
): Promise<void> {
  await manager.getRepository(AuditEvent).insert({
    id: randomUUID(),
    organizationId: actor.organizationId ?? null,
    personId: actor.personId ?? null,
    keyId: actor.keyId ?? null,
    sessionId: actor.sessionId ?? null,
    address: actor.address || null,
    requestId: actor.requestId ?? null,
    act,
    subjectKind: acts[act],
    subjectId,
    details,
  });
}
