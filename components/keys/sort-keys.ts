import type { KeyAnswer } from '../../shared/keys';

/** What keys can be sorted by, each with the way that is asked for first. */
const columns = {
  name: { value: ({ name }: KeyAnswer) => name.toLocaleLowerCase(), first: 'ascending' },
  issued: { value: ({ createdAt }: KeyAnswer) => createdAt, first: 'descending' },
  // A key that was never used is the longest unused.
  used: { value: ({ lastUsedAt }: KeyAnswer) => lastUsedAt ?? '', first: 'descending' },
  ends: { value: ({ expiresAt }: KeyAnswer) => expiresAt, first: 'ascending' },
} as const;

export type KeyColumn = keyof typeof columns;

export interface KeySorting {
  readonly key: KeyColumn;
  readonly direction: 'ascending' | 'descending';
}

/** As the service lists them. */
export const newestFirst: KeySorting = { key: 'issued', direction: 'descending' };

/** The keys sorted; equal ones stay as they were. ISO moments sort as text. */
export function sortKeys(
  keys: readonly KeyAnswer[],
  { key, direction }: KeySorting,
): readonly KeyAnswer[] {
  const { value } = columns[key];
  const sign = direction === 'ascending' ? 1 : -1;
  return keys.toSorted((one, other) => sign * compare(value(one), value(other)));
}

const compare = (one: string, other: string) => (one < other ? -1 : one > other ? 1 : 0);

/** The sorting after a press on a head: its own first way, then the other. */
export function sortedBy(column: KeyColumn, before: KeySorting): KeySorting {
  if (before.key !== column) return { key: column, direction: columns[column].first };
  const direction = before.direction === 'ascending' ? 'descending' : 'ascending';
  return { key: column, direction };
}
