import { accessSync, constants, existsSync, readFileSync, statSync } from 'node:fs';
import { userInfo } from 'node:os';
import { Failure, Interrupted } from './failure.mjs';
import { inRoot, local, root } from './paths.mjs';
import { attempt } from './run.mjs';

export const isRoot = process.getuid?.() === 0;

/** Rows of the machine's list of users: name, password, uid, gid, … */
const users = () =>
  readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .map((line) => line.split(':'));

/** `{ uid, gid }` of a user of this machine, or undefined. */
export function identityOf(wanted) {
  const [, , uid, gid] = users().find(([name]) => name === wanted) ?? [];
  return uid === undefined ? undefined : { uid: Number(uid), gid: Number(gid) };
}

const nameOf = (wanted) =>
  users().find(([, , uid]) => Number(uid) === wanted)?.[0] ?? `user ${wanted}`;

const ours = ['.local', 'node_modules', 'dist', '.expo', 'public/fonts'];

const ownerOf = (path) => statSync(path).uid;

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
  const present = [root, ...ours.map((name) => inRoot(name))].filter((path) => existsSync(path));
  const foreign = existsSync(local) && ownerOf(local) !== process.getuid() ? local : undefined;
  const inTheWay = foreign ?? present.find((path) => !writable(path));
  if (inTheWay === undefined) return;
  const before = nameOf(ownerOf(inTheWay));
  const me = userInfo().username;
  throw new Failure(
    `${inTheWay} belongs to ${before}; this start is by ${me}.\n` +
      `Start as ${before}, or hand the checkout over (a database of ${before} stays behind):\n` +
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
