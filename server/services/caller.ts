import type { Role, Scope } from '../../shared/scopes';

/** A person in an organization, as they stand now. */
export interface Member {
  readonly personId: string;
  readonly organizationId: string;
  readonly role: Role;
}

/** The call by which something is done. */
export interface CallSource {
  /** The peer's network address. */
  readonly address: string;
  /** As X-Request-Id answers it. */
  readonly requestId: string;
}

/** Whoever does something, as far as is known; nothing is known of what the service does of itself. */
export interface Actor extends Partial<CallSource> {
  readonly organizationId?: string;
  readonly personId?: string;
  readonly keyId?: string;
  readonly sessionId?: string;
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
  readonly keyId: string;
}

export interface SessionCaller extends Standing, Member {
  readonly kind: 'session';
  readonly sessionId: string;
}

/** Who calls: a pipeline by its key, or a person by a session. */
export type Caller = KeyCaller | SessionCaller;
