import { hash, verify } from '@node-rs/argon2';
import { Queue } from '../queue';

/** Argon2id with the parameters that OWASP's cheat sheet gives first (19 MiB, 2 passes, 1 lane). */
const parameters = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/**
 * Each hash takes 19 MiB and one of libuv's four threads, which files and names are read by too: two
 * at once, and so few waiting that the last of them is still served within seconds.
 */
const turns = new Queue({ places: 2, mostWaiting: 48 });

/** Of a caller who stays. */
const stays = () => new AbortController().signal;
const hashNow = (password: string) => hash(password.normalize('NFC'), parameters);

/** Refused with `unavailable` where too many are waiting; so is `passwordIs`. */
export const hashPassword = (password: string, signal = stays()): Promise<string> =>
  turns.run(1, signal, () => hashNow(password));

let nobodys: Promise<string> | undefined;

/** Made once; a failure is not kept, or unknown people could be told by it from then on. */
const nobodysHash = () =>
  (nobodys ??= hashNow('nobody has this password').catch((error: unknown) => {
    nobodys = undefined;
    throw error;
  }));

/**
 * Whether the password is the one hashed. Where there is no hash, a hash of nobody's is tried all
 * the same: an unknown person costs what a known one does. A caller who has gone leaves the queue.
 */
export const passwordIs = (
  password: string,
  stored: string | null,
  signal = stays(),
): Promise<boolean> =>
  turns.run(1, signal, async () => {
    const tried = stored ?? (await nobodysHash());
    const matches = await verify(tried, password.normalize('NFC'));
    return matches && stored !== null;
  });
