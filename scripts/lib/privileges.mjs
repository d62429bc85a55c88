import { accessSync, constants, readFileSync, statSync } from 'node:fs';
import { userInfo } from 'node:os';
import { Failure, Interrupted } from './failure.mjs';
import { inRoot, local, root } from './paths.mjs';
import { attempt } from './run.mjs';

export const isRoot = process.getuid?.() === 0;

/** `{ uid, gid }` of a user of this machine, or undefined. */
export function identityOf(name) {
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith(`${name}:`));
  const [, , uid, gid] = line?.split(':') ?? [];
  return uid === undefined ? undefined : { uid: Number(uid), gid: Number(gid) };
}

const nameOf = (uid) =>
  readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .map((entry) => entry.split(':'))
    .find(([, , id]) => Number(id) === uid)?.[0] ?? `user ${uid}`;

const ours = ['.local', 'node_modules', 'dist', '.expo', 'public/fonts'];

const ownerOf = (path) => statSync(path, { throwIfNoEntry: false })?.uid;

const writable = (path) => {
  try {
    accessSync(path, constants.W_OK);
    return true;
  } catch {
    return false;
  }
};

/**
 * A checkout is started by one user: root's files cannot be renewed by another, and what root
 * adds to a user's folder locks that user out. Throws a Failure that says who and what to type.
 */
export function requireOwnFolders() {
  if (process.getuid === undefined) return;
  if (!writable(root)) throw new Failure(`${root} cannot be written by ${userInfo().username}.`);
  const owner = ownerOf(local);
  const foreign = owner !== undefined && owner !== process.getuid();
  const locked = ours.filter(
    (name) => ownerOf(inRoot(name)) !== undefined && !writable(inRoot(name)),
  );
  if (!foreign && locked.length === 0) return;
  const before = nameOf(foreign ? owner : ownerOf(inRoot(locked[0])));
  const me = userInfo().username;
  throw new Failure(
    `This checkout was started by ${before} before and is now started by ${me}.\n` +
      `Start it as ${before} again, or hand it over (the database of ${before} stays behind):\n` +
      `  sudo chown -R ${me} "${root}"`,
  );
}

const canRead = `
  const { accessSync, constants } = require('node:fs');
  for (const path of process.argv.slice(1)) accessSync(path, constants.R_OK);
`;

/**
 * Who the server runs as: `nobody`, when we are root and nobody can read what it needs; ourselves
 * otherwise. Set-up needs root's rights, answering calls does not.
 */
export async function serverIdentity(needed) {
  const nobody = isRoot ? identityOf('nobody') : undefined;
  if (nobody === undefined) return {};
  const { code } = await attempt(process.execPath, ['-e', canRead, ...needed], {
    cwd: '/',
    identity: nobody,
  }).catch((fault) => {
    if (fault instanceof Interrupted) throw fault;
    return { code: 1 };
  });
  return code === 0 ? nobody : {};
}
