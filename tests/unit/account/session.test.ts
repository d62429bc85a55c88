import { sameStanding, whoOf, withoutSession } from '../../../components/account/session';
import type { AccountAnswer } from '../../../shared/account';

const who: AccountAnswer = {
  account: { id: 'person', email: 'developer@larkmoor.example', name: 'Demo developer' },
  organization: { id: 'larkmoor', name: 'Larkmoor Assay' },
  organizations: [{ id: 'larkmoor', name: 'Larkmoor Assay', role: 'developer' }],
  role: 'developer',
};

test('a session that is over leaves whose it was; nobody stays nobody', () => {
  const ended = withoutSession({ state: 'signed-in', who });
  expect(ended).toEqual({ state: 'ended', who });
  expect(withoutSession(ended)).toEqual(ended);
  expect(withoutSession(undefined)).toEqual({ state: 'nobody' });
  expect(withoutSession({ state: 'nobody' })).toEqual({ state: 'nobody' });
});

test('whose screen it is stays known after the session is over', () => {
  expect(whoOf(undefined)).toBeUndefined();
  expect(whoOf({ state: 'nobody' })).toBeUndefined();
  expect(whoOf({ state: 'ended', who })).toBe(who);
});

test('another person, organization or role may not see what was fetched', () => {
  expect(sameStanding(who, { ...who, organizations: [] })).toBe(true);
  expect(sameStanding(who, { ...who, role: 'scientist' })).toBe(false);
  expect(sameStanding(who, { ...who, organization: { id: 'tarn', name: '' } })).toBe(false);
  expect(sameStanding(who, { ...who, account: { ...who.account, id: 'other' } })).toBe(false);
});
