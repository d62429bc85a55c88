import { hash, verify } from '@node-rs/argon2';
import { hashPassword, passwordIs } from '../../../server/services/sessions/passwords';

jest.mock('@node-rs/argon2');

/** Hashes under way, in the order they began; each ends when it is told to. */
const underWay: (() => void)[] = [];
let begun = 0;
const pending = (answer: unknown) => () =>
  new Promise((resolve) => {
    begun += 1;
    underWay.push(() => resolve(answer));
  });
jest.mocked(hash).mockImplementation(pending('a hash') as typeof hash);
jest.mocked(verify).mockImplementation(pending(true) as typeof verify);

const settled = () => new Promise((resolve) => setImmediate(resolve));
const isRefused = (outcome: PromiseSettledResult<unknown>) =>
  outcome.status === 'rejected' && outcome.reason.code === 'unavailable';

/** Ends what is under way until nothing is. Answers the most that were under way at once. */
async function finish(): Promise<number> {
  let most = 0;
  for (await settled(); underWay.length > 0; await settled()) {
    most = Math.max(most, underWay.length);
    underWay.shift()?.();
  }
  return most;
}

test('however many sign in, two passwords are hashed at once, and the rest wait or are refused', async () => {
  begun = 0;
  const attempts = Array.from({ length: 200 }, () => passwordIs('a password', 'stored'));
  const outcomes = Promise.allSettled(attempts);
  await settled();
  expect(begun).toBe(2);
  expect(await finish()).toBe(2);
  const answers = await outcomes;
  expect(answers.filter(({ status }) => status === 'fulfilled')).toHaveLength(2 + 48);
  expect(answers.slice(50).filter(isRefused)).toHaveLength(150);
  expect(begun).toBe(50);
});

test('an unknown person’s attempt takes a place as a known one’s does', async () => {
  const attempts = [null, 'stored', null, null].map((stored) => passwordIs('x', stored));
  attempts.push(hashPassword('y').then(() => true));
  expect(await finish()).toBe(2);
  expect(await Promise.all(attempts)).toEqual([false, true, false, false, true]);
});

test('whoever goes away while waiting is not hashed for', async () => {
  const first = [passwordIs('x', 'stored'), passwordIs('x', 'stored')];
  const gone = new AbortController();
  const waiting = passwordIs('x', 'stored', gone.signal);
  await settled();
  begun = 0;
  gone.abort();
  await expect(waiting).rejects.toMatchObject({ code: 'unavailable' });
  await finish();
  expect(await Promise.all(first)).toEqual([true, true]);
  expect(begun).toBe(0);
});
