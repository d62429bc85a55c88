import type { ProblemError } from '../../shared/client';
import type { KeyRequestInput } from '../../shared/keys';
import type { Scope } from '../../shared/scopes';

/** Days that can be chosen for a key to live, as the values of a choice. */
export const lifetimes = ['30', '90', '180', '365'] as const;
export type Lifetime = (typeof lifetimes)[number];

/** A key as it is being asked for. */
export interface IssueDraft {
  readonly name: string;
  readonly scopes: readonly Scope[];
  readonly lifetime: Lifetime;
}

export const firstDraft: IssueDraft = { name: '', scopes: ['compute'], lifetime: '90' };

/** What is wrong with a draft, by field. */
export interface DraftFaults {
  readonly name?: string;
  readonly scopes?: string;
}

const longestName = 80;

/** What has to be put right before the service is asked. */
export function faultsOf({ name, scopes }: IssueDraft): DraftFaults {
  const given = name.trim();
  return {
    ...(given === '' && { name: 'Name the program that will call, such as lims-nightly.' }),
    ...(given.length > longestName && { name: `Keep it to ${longestName} characters.` }),
    ...(scopes.length === 0 && {
      scopes: 'Choose at least one: a key that may do nothing is none.',
    }),
  };
}

/** What the service found wrong, at the fields it is about. */
export function faultsIn({ problem }: ProblemError): DraftFaults {
  const about = (field: string) =>
    problem.errors?.find(({ pointer }) => pointer.split('/')[1] === field)?.detail;
  const name = about('name');
  const scopes = about('scopes');
  return { ...(name !== undefined && { name }), ...(scopes !== undefined && { scopes }) };
}

export const requestOf = ({ name, scopes, lifetime }: IssueDraft): KeyRequestInput => ({
  name: name.trim(),
  scopes: [...scopes],
  expiresInDays: Number(lifetime),
});

/** The day on which a key issued now ends. */
export const endOf = (lifetime: Lifetime, now: Date) =>
  new Date(now.getTime() + Number(lifetime) * 86_400_000);
