import { createHash } from 'node:crypto';
import { existsSync } from 'node:fs';
import { chmod, chown, mkdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { Failure } from './failure.mjs';
import { identityOf, isRoot } from './privileges.mjs';

/** PostgreSQL refuses to run as root: its programs then run as Debian's user for it. */
export function clusterIdentity() {
  if (!isRoot) return {};
  const identity = identityOf('postgres');
  if (identity === undefined) throw new Failure('This machine has no user named postgres.');
  return identity;
}

/** Folders on the way keep the usual rights: the cluster's user must get through them. */
export async function makePlace(place) {
  await mkdir(dirname(place), { recursive: true });
  await mkdir(place, { recursive: true });
  await chmod(place, 0o700);
  const { uid, gid } = clusterIdentity();
  if (uid !== undefined) await chown(place, uid, gid);
}

export const dataOf = (place) => join(place, 'data');

/** Major version of the programs that made the cluster in `place`, or undefined. */
export async function majorOfPlace(place) {
  const file = join(dataOf(place), 'PG_VERSION');
  return existsSync(file) ? Number(await readFile(file, 'utf8')) : undefined;
}

/** `{ pid, port }` as a running server notes them in its folder, or undefined. */
export async function postmasterOf(place) {
  const file = join(dataOf(place), 'postmaster.pid');
  if (!existsSync(file)) return undefined;
  const [pid, , , port] = (await readFile(file, 'utf8')).split('\n');
  return { pid: Number(pid), port: Number(port) };
}

const fingerprint = (password) => createHash('sha256').update(password).digest('hex');
const sealOf = (place) => join(place, 'password.sha256');

/** Notes which password opens the cluster, without telling it. */
export const seal = (place, password) => writeFile(sealOf(place), fingerprint(password));

/**
 * Whether the cluster in `place` was made with this password. It was not when the checkout was
 * deleted and cloned again: its secrets are gone, and nobody can open that cluster any more.
 */
export async function opensWith(place, password) {
  const file = sealOf(place);
  return existsSync(file) && (await readFile(file, 'utf8')) === fingerprint(password);
}

/** Moves a cluster that cannot be opened out of the way; its data stay. Answers the new place. */
export async function setAside(place, when = new Date()) {
  const aside = `${place}.set-aside-${when
    .toISOString()
    .replace(/[^0-9]/g, '')
    .slice(0, 14)}`;
  await rename(place, aside);
  return aside;
}

export const removePlace = (place) => rm(place, { recursive: true, force: true });
