import type { Role, Scope } from '../../shared/scopes';

/** A person in an organization, as they stand now. */
export interface Member {
  readonly personId: string;
  readonly organizationId: string;
  readonly role: Role;
}

interface Standing {
  /** What the caller is counted and logged as. */
  readonly name: string;
  readonly organizationId: string;
  /** What may be done at this call: looked up afresh at each one. */
  readonly scopes: ReadonlySet<Scope>;
}

export interface KeyCaller extends Standing {
  readonly kind: 'key';
}

export interface SessionCaller extends Standing, Member {
  readonly kind: 'session';
  readonly sessionId: string;
}

/** Who calls: a pipeline by its key, or a person by a session. */
export type Caller = KeyCaller | SessionCaller;
