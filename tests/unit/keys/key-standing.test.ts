import { canRevoke, soonDays, standingOf } from '../../../components/keys/key-standing';
import { revokeWords } from '../../../components/keys/revoke-words';

const now = new Date('2026-12-01T12:00:00Z');
const inDays = (days: number) => new Date(now.getTime() + days * 86_400_000).toISOString();
const wordOf = (state: Parameters<typeof standingOf>[0]['state'], days: number) =>
  standingOf({ state, expiresAt: inDays(days) }, now).word;

test.each([
  ['active', 90, 'Working'],
  ['active', soonDays + 0.01, 'Working'],
  ['active', soonDays, 'Ends in 7 days'],
  ['active', 0.2, 'Ends in 5 hours'],
  ['expired', -1, 'Expired'],
  ['revoked', 90, 'Revoked'],
  ['issuer-left', 90, 'Stopped: its issuer left'],
] as const)('a key that is %s and ends in %d days reads “%s”', (state, days, word) => {
  expect(wordOf(state, days)).toBe(word);
});

test('what calls no more for good cannot be revoked', () => {
  const states = ['active', 'issuer-left', 'expired', 'revoked'] as const;
  expect(states.filter((state) => canRevoke({ state }))).toEqual(['active', 'issuer-left']);
});

test.each([
  ['active', null, 'lims stops at its next call. It was never used.'],
  ['active', '2026-12-01T11:57:00Z', 'lims stops at its next call. Last used 3 minutes ago.'],
  [
    'issuer-left',
    null,
    'lims calls no more since its issuer left, and will not if they come back. It was never used.',
  ],
] as const)('revoking a key that is %s, used %s, names what stops', (state, lastUsedAt, words) => {
  expect(revokeWords({ name: 'lims', state, lastUsedAt }, now)).toBe(words);
});
