import type { EntityManager } from 'typeorm';
import type { AccountAnswer } from '../../../shared/account';
import type { Session } from '../../database/entities/session';
import { recordAct } from '../audit/record-act';
import type { Actor, CallSource, SessionCaller } from '../caller';

type Source = Partial<CallSource>;
type Caller = Actor & Pick<SessionCaller, 'sessionId'>;
type Told = Pick<Session, 'id' | 'personId' | 'organizationId'>;

interface Refused {
  readonly personId: string | undefined;
  /** Where signing in would have led: its admins see whose door is tried. */
  readonly organizationId: string | undefined;
  readonly isRight: boolean;
}

const ownOf = ({ id, personId, organizationId }: Told, source: Source): Actor => ({
  ...source,
  personId,
  organizationId,
  sessionId: id,
});

/** A sign-in that was refused. Nobody acts: whoever tried may be anybody. */
export function recordRefusal(
  manager: EntityManager,
  { address, requestId }: Source,
  { personId, organizationId, isRight }: Refused,
): Promise<void> {
  const known = isRight ? 'no-organization' : 'wrong-password';
  return recordAct(
    manager,
    { address, requestId, organizationId },
    {
      act: 'session.refused',
      subjectId: personId ?? null,
      details: { reason: personId === undefined ? 'unknown-person' : known },
    },
  );
}

export const recordOpening = (manager: EntityManager, session: Told, source: Source) =>
  recordAct(manager, ownOf(session, source), {
    act: 'session.opened',
    subjectId: session.id,
    details: {},
  });

export const recordSignOut = (manager: EntityManager, caller: Caller) =>
  recordAct(manager, caller, {
    act: 'session.ended',
    subjectId: caller.sessionId,
    details: { reason: 'signed-out' },
  });

/** The session ended because its person no longer belongs where it was opened. */
export const recordLeaving = (manager: EntityManager, session: Told, source: Source) =>
  recordAct(manager, ownOf(session, source), {
    act: 'session.ended',
    subjectId: session.id,
    details: { reason: 'left-organization' },
  });

/** The session ended because a token of its past was presented, by nobody knows whom. */
export const recordReuse = (manager: EntityManager, session: Told, source: Source) =>
  recordAct(
    manager,
    { ...ownOf(session, source), personId: undefined },
    { act: 'session.reused', subjectId: session.id, details: { personId: session.personId } },
  );

/** Told in the organization that was chosen; the one before has no part in it. */
export const recordChoice = (
  manager: EntityManager,
  caller: Caller,
  { id, name }: AccountAnswer['organization'],
) =>
  recordAct(
    manager,
    { ...caller, organizationId: id },
    { act: 'organization.chosen', subjectId: id, details: { name } },
  );
