import type { Scope } from '../../../shared/scopes';

type Nothing = Readonly<Record<string, never>>;

/** What an event says beside who, when and on what: never a secret, never a body. */
export interface DetailsOf {
  'key.issued': { publicId: string; name: string; scopes: readonly Scope[]; expiresAt: string };
  'key.revoked': { publicId: string; name: string };
  'session.opened': Nothing;
  /** What was typed is left out: people type passwords into the wrong field. */
  'session.refused': { reason: 'unknown-person' | 'wrong-password' | 'no-organization' };
  'session.ended': { reason: 'signed-out' | 'left-organization' };
  /** Whose session it was; who presented its old token is not known. */
  'session.reused': { personId: string };
  'organization.chosen': { name: string };
}
