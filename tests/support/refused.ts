import { faultsIn, postWithKey } from './calls';
import type { TestServer } from './server';

/** A call that is refused: what is wrong with it, its body, and what the answer must say. */
export type RefusedCall = readonly [
  name: string,
  body: object,
  status: 400 | 422,
  fault: string,
  words: RegExp,
];

/** Sends a call and reports its status, its one fault as `pointer code`, and whether the words are there. */
export async function refusalOf(
  server: TestServer,
  path: string,
  [, body, , , words]: RefusedCall,
): Promise<{ status: number; faults: string[]; says: string }> {
  const answer = await postWithKey(server, path).send(body);
  const detail: string = answer.body.errors?.[0]?.detail ?? '';
  return {
    status: answer.status,
    faults: faultsIn(answer.body),
    says: words.test(detail) ? String(words) : detail,
  };
}

/** What `refusalOf` reports of a call that is refused as it should be. */
export const asItShould = ([, , status, fault, words]: RefusedCall) => ({
  status,
  faults: [fault],
  says: String(words),
});
