import { newestFirst, sortedBy, sortKeys } from '../../../components/keys/sort-keys';
import type { KeyAnswer } from '../../../shared/keys';

const key = (name: string, createdAt: string, lastUsedAt: string | null): KeyAnswer => ({
  id: `id-${name}`,
  publicId: name,
  name,
  scopes: ['compute'],
  issuer: { id: 'someone', name: 'Demo admin' },
  state: 'active',
  createdAt,
  expiresAt: `2027${createdAt.slice(4)}`,
  lastUsedAt,
  revokedAt: null,
});

const keys = [
  key('plate-reader', '2026-11-03T00:00:00.000Z', null),
  key('Balance', '2026-11-01T00:00:00.000Z', '2026-12-01T10:00:00.000Z'),
  key('lims', '2026-11-02T00:00:00.000Z', '2026-12-01T09:00:00.000Z'),
];
const names = (sorting: Parameters<typeof sortKeys>[1]) =>
  sortKeys(keys, sorting).map(({ name }) => name);

test.each([
  ['name', 'ascending', ['Balance', 'lims', 'plate-reader']],
  ['issued', 'descending', ['plate-reader', 'lims', 'Balance']],
  ['used', 'descending', ['Balance', 'lims', 'plate-reader']],
  ['used', 'ascending', ['plate-reader', 'lims', 'Balance']],
  ['ends', 'ascending', ['Balance', 'lims', 'plate-reader']],
] as const)('by %s, %s', (column, direction, sorted) => {
  expect(names({ key: column, direction })).toEqual(sorted);
});

test('a head sorts its own first way, and turns at each press after', () => {
  const first = sortedBy('name', newestFirst);
  expect(first).toEqual({ key: 'name', direction: 'ascending' });
  expect(sortedBy('name', first)).toEqual({ key: 'name', direction: 'descending' });
  expect(sortedBy('used', first)).toEqual({ key: 'used', direction: 'descending' });
});
