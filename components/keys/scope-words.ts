import type { Scope } from '../../shared/scopes';

/** What each scope is for. */
export const scopeWords: Readonly<Record<Scope, string>> = {
  compute: 'Everything that computes',
  'systems:read': 'Stored systems and their constants, read',
  'systems:write': 'Opens nothing yet: the organization’s own systems, change',
  batches: 'Opens nothing yet: a thousand rows at once',
  'usage:read': 'Opens nothing yet: who called how often',
};

/** In the order in which they are offered. */
export const offeredScopes = Object.keys(scopeWords) as readonly Scope[];
