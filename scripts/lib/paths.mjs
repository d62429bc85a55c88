import { createHash } from 'node:crypto';
import { mkdirSync, realpathSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The checkout: every path of the scripts hangs from it, wherever they are called from. */
export const root = realpathSync(join(dirname(fileURLToPath(import.meta.url)), '..', '..'));

export const inRoot = (...parts) => join(root, ...parts);

/** What belongs to this checkout on this machine: secrets, logs, caches. Never committed. */
export const local = inRoot('.local');

/** Makes `.local`, closed to others, and gives the path of something in it. */
export function inLocal(...parts) {
  mkdirSync(local, { recursive: true, mode: 0o700 });
  return join(local, ...parts);
}

/** Tells checkouts apart where they share a folder: 16 hex digits of the path's SHA-256. */
export const checkoutHash = createHash('sha256').update(root).digest('hex').slice(0, 16);
