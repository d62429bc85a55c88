import { existsSync, realpathSync } from 'node:fs';
import { mkdir, readdir, rm, writeFile } from 'node:fs/promises';
import { delimiter, dirname, join } from 'node:path';
import { installFromDebian } from './apt.mjs';
import { Failure } from './failure.mjs';
import { isRoot } from './privileges.mjs';
import { run } from './run.mjs';

const programs = ['initdb', 'pg_ctl', 'postgres', 'psql'];
const oldest = 13;

/** Debian keeps each version in a folder of its own and puts only psql on the path. */
async function debianFolders() {
  const base = '/usr/lib/postgresql';
  const versions = existsSync(base) ? await readdir(base) : [];
  return versions.map((version) => join(base, version, 'bin'));
}

/** Where programs on the path really live: a lone link to `postgres` leads to its siblings. */
const pathFolders = () =>
  (process.env.PATH ?? '')
    .split(delimiter)
    .map((folder) => join(folder, 'postgres'))
    .filter((file) => existsSync(file))
    .map((file) => dirname(realpathSync(file)));

async function majorOf(folder) {
  const text = await run(join(folder, 'postgres'), ['--version'], { cwd: '/' });
  return Number(/\) (\d+)/.exec(text)?.[1]);
}

async function find() {
  const folders = new Set([...(await debianFolders()), ...pathFolders()]);
  const whole = [...folders].filter((folder) =>
    programs.every((name) => existsSync(join(folder, name))),
  );
  const found = await Promise.all(
    whole.map(async (folder) => ({ folder, major: await majorOf(folder) })),
  );
  return found.filter(({ major }) => major >= oldest).sort((a, b) => b.major - a.major);
}

/** Debian makes and starts a cluster of its own on installation unless told not to. */
async function withoutMainCluster(work) {
  const folder = '/etc/postgresql-common/createcluster.d';
  const file = join(folder, 'stepwell.conf');
  await mkdir(folder, { recursive: true });
  await writeFile(file, 'create_main_cluster = false\n');
  await work().finally(() => rm(file, { force: true }));
}

/**
 * Finds a folder that holds all PostgreSQL programs, installs Debian's when there is none, and
 * answers `{ major, path(program) }`: the newest, or the one that made an existing cluster.
 */
export async function postgresPrograms(major) {
  let found = await find();
  if (found.length === 0) {
    const install = () => installFromDebian('postgresql', `PostgreSQL ${oldest} or newer`);
    await (isRoot ? withoutMainCluster(install) : install());
    found = await find();
  }
  const chosen = found.find((one) => major === undefined || one.major === major);
  if (chosen === undefined) {
    const here = found.map((one) => one.major).join(', ') || 'none';
    throw new Failure(
      `No PostgreSQL ${major ?? oldest} programs (initdb, pg_ctl, postgres and psql in one ` +
        `folder) are here; found: ${here}.`,
    );
  }
  return { major: chosen.major, path: (name) => join(chosen.folder, name) };
}
