import {
  endOf,
  faultsIn,
  faultsOf,
  firstDraft,
  lifetimes,
  requestOf,
} from '../../../components/keys/issue-draft';
import { offeredScopes } from '../../../components/keys/scope-words';
import { ProblemError } from '../../../shared/client';
import { keyDays, keyRequest } from '../../../shared/keys';
import { scopes } from '../../../shared/scopes';

const draft = { ...firstDraft, name: ' lims-nightly ' };

test('what the form asks for fits the contract, for each lifetime', () => {
  for (const lifetime of lifetimes) {
    const request = requestOf({ ...draft, lifetime });
    expect(keyRequest.parse(request)).toEqual({
      name: 'lims-nightly',
      scopes: ['compute'],
      expiresInDays: Number(lifetime),
    });
  }
  expect(Number(lifetimes.at(-1))).toBe(keyDays.most);
  expect(Number(firstDraft.lifetime)).toBe(keyDays.default);
});

test('every scope of the contract is offered, with what it is for', () => {
  expect([...offeredScopes].sort()).toEqual([...scopes].sort());
});

test.each([
  [draft, []],
  [{ ...draft, name: 'x'.repeat(80) }, []],
  [{ ...draft, name: '   ' }, ['name']],
  [{ ...draft, name: 'x'.repeat(81) }, ['name']],
  [{ ...draft, scopes: [] }, ['scopes']],
  [{ ...draft, name: '', scopes: [] }, ['name', 'scopes']],
])('the form and the contract find the same wrong with %j', (given, fields) => {
  expect(Object.keys(faultsOf(given))).toEqual(fields);
  expect(keyRequest.safeParse(requestOf(given)).success).toBe(fields.length === 0);
});

test('what the service finds wrong stands at its field', () => {
  const fault = (pointer: string) => ({ pointer, code: 'x', detail: `at ${pointer}` });
  const refused = new ProblemError({
    type: 'about:blank',
    title: 'The request does not fit the contract',
    status: 400,
    requestId: '',
    errors: [fault('/scopes/0'), fault('/name')],
  });
  expect(faultsIn(refused)).toEqual({ name: 'at /name', scopes: 'at /scopes/0' });
});

test('a key issued now for thirty days ends thirty days from now', () => {
  const now = new Date('2026-12-01T12:00:00Z');
  expect(endOf('30', now).toISOString()).toBe('2026-12-31T12:00:00.000Z');
});
