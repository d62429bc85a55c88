import { wellFormed } from './well-formed';

/** Form encoding, with the commas of lists left readable. */
const encode = (text: string) =>
  encodeURIComponent(wellFormed(text)).replace(/%20/g, '+').replace(/%2C/g, ',');

/** Undoes `encode`; undefined for a broken escape. */
function decode(text: string): string | undefined {
  try {
    return decodeURIComponent(text.replace(/\+/g, '%20'));
  } catch {
    return undefined;
  }
}

export type Pair = readonly [key: string, value: string | undefined];

/** Pairs as an address's fragment, without the `#`; those without a value are left out. */
export const formatPairs = (pairs: readonly Pair[]): string =>
  pairs
    .flatMap(([key, value]) => (value === undefined ? [] : [`${key}=${encode(value)}`]))
    .join('&');

/**
 * Reads the pairs of a fragment. `faulty` where one of them is broken, or its key is none of
 * `keys`.
 */
export function readPairs(fragment: string, keys: ReadonlySet<string>) {
  const text = fragment.replace(/^#/, '');
  const pairs: (readonly [key: string, value: string])[] = [];
  let faulty = false;
  for (const pair of text === '' ? [] : text.split('&')) {
    const [key = '', ...rest] = pair.split('=');
    const value = decode(rest.join('='));
    if (value === undefined || !keys.has(key)) faulty = true;
    else pairs.push([key, value]);
  }
  return { pairs, faulty };
}

/** The same where each key may stand but once; the first one counts. */
export function readValues(fragment: string, keys: ReadonlySet<string>) {
  const { pairs, faulty: broken } = readPairs(fragment, keys);
  const values = new Map(pairs.toReversed());
  return { values, faulty: broken || values.size < pairs.length };
}
