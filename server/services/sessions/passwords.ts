import { hash, verify } from '@node-rs/argon2';

/** Argon2id with the parameters that OWASP's cheat sheet gives first (19 MiB, 2 passes, 1 lane). */
const parameters = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

export const hashPassword = (password: string): Promise<string> =>
  hash(password.normalize('NFC'), parameters);

let nobodys: Promise<string> | undefined;

/**
 * Whether the password is the one hashed. Where there is no hash, a hash of nobody's is tried all
 * the same: an unknown person costs what a known one does.
 */
export async function passwordIs(password: string, stored: string | null): Promise<boolean> {
  nobodys ??= hashPassword('nobody has this password');
  const matches = await verify(stored ?? (await nobodys), password.normalize('NFC'));
  return matches && stored !== null;
}
