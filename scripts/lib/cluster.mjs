import { chown, rename, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import {
  clusterIdentity,
  dataOf,
  majorOfPlace,
  makePlace,
  opensWith,
  postmasterOf,
  seal,
  setAside,
} from './cluster-place.mjs';
import { Failure } from './failure.mjs';
import { owns } from './lifetime.mjs';
import { freePort } from './ports.mjs';
import { postgresPrograms } from './postgres-programs.mjs';
import { attempt, run, send } from './run.mjs';

const host = '127.0.0.1';
const admin = 'stepwell_admin';

/** The caller's PG* variables must not lead our programs elsewhere; messages stay English. */
const env = { PATH: process.env.PATH, LC_ALL: 'C' };

/** Reachable on the loopback address alone: no socket, no other interface. */
const settings = {
  listen_addresses: host,
  unix_socket_directories: '',
  password_encryption: 'scram-sha-256',
  log_checkpoints: 'off',
};

/** For data that nobody will miss. */
const throwAwaySettings = {
  fsync: 'off',
  synchronous_commit: 'off',
  full_page_writes: 'off',
  max_connections: 200,
};

/** Makes the data folder under another name first: a half-made one is never taken for whole. */
async function initialize(place, programs, password) {
  const identity = clusterIdentity();
  const partial = join(place, 'data.partial');
  const passwordFile = join(place, 'password');
  await rm(partial, { recursive: true, force: true });
  await writeFile(passwordFile, password, { mode: 0o600 });
  if (identity.uid !== undefined) await chown(passwordFile, identity.uid, identity.gid);
  const access = ['--auth=scram-sha-256', `--pwfile=${passwordFile}`, `--username=${admin}`];
  const args = ['-D', partial, ...access, '--encoding=UTF8', '--locale=C.UTF-8'];
  const forget = () => rm(passwordFile, { force: true });
  await run(programs.path('initdb'), args, { cwd: place, env, identity }).finally(forget);
  await rename(partial, dataOf(place));
  await seal(place, password);
}

/** Options of a `pg_ctl` call on a cluster: as its user, and not cut short by Ctrl-C. */
const control = (place) => ({ cwd: place, env, identity: clusterIdentity(), protected: true });

async function isRunning(place, programs) {
  const args = ['status', '-D', dataOf(place)];
  return (await attempt(programs.path('pg_ctl'), args, control(place))).code === 0;
}

async function launch(place, programs, usualPort, throwAway) {
  const chosen = {
    port: await freePort(usualPort),
    ...settings,
    ...(throwAway && throwAwaySettings),
  };
  const options = Object.entries(chosen).map(([name, value]) => `-c ${name}=${value}`);
  const log = join(place, 'postgres.log');
  const args = ['start', '-D', dataOf(place), '-l', log, '-w', '-t', '60', '-o', options.join(' ')];
  const { code } = await attempt(programs.path('pg_ctl'), args, control(place));
  if (code === 0) return;
  // It may have begun to start all the same, too slowly for us.
  const abandon = ['stop', '-D', dataOf(place), '-m', 'immediate'];
  await attempt(programs.path('pg_ctl'), abandon, control(place));
  const end = await run('tail', ['-n', '20', log], { protected: true }).catch(() => '');
  throw new Failure(`PostgreSQL did not start; the end of ${log}:\n${end}`);
}

async function makeUsable(place, programs, password) {
  await makePlace(place);
  if ((await majorOfPlace(place)) === undefined) return initialize(place, programs, password);
  if (await opensWith(place, password)) return undefined;
  if (await isRunning(place, programs)) {
    const { pid } = await postmasterOf(place);
    throw new Failure(
      `The PostgreSQL of an earlier checkout at this path still runs (process ${pid}).\n` +
        `Its password went with that checkout. End it with: kill -INT ${pid}`,
    );
  }
  const aside = await setAside(place);
  await makePlace(place);
  await initialize(place, programs, password);
  return aside;
}

/**
 * Opens the cluster in `place`, made when there is none, and starts it unless it runs. It is
 * stopped at the end of this command only if this command started it, or if `adopt(pid)` knows
 * it for one that an earlier run of ours was killed away from.
 */
export async function openCluster({ place, password, usualPort = 0, throwAway = false, adopt }) {
  const programs = await postgresPrograms(await majorOfPlace(place));
  const setAsideTo = await makeUsable(place, programs, password);
  const attached = await isRunning(place, programs);
  if (!attached) await launch(place, programs, usualPort, throwAway);
  const { pid, port } = await postmasterOf(place);
  const stop = () =>
    run(programs.path('pg_ctl'), ['stop', '-D', dataOf(place), '-m', 'fast', '-w'], control(place));
  const kill = () => send(pid, 'SIGQUIT');
  if (!attached || adopt?.(pid)) owns({ stop, kill });

  const url = (role, secret, database) =>
    `postgresql://${role}:${secret}@${host}:${port}/${database}`;
  const address = ['-h', host, '-p', String(port), '-U', admin, '-w'];
  const asAdmin = { cwd: '/', env: { ...env, PGPASSWORD: password }, title: 'psql' };
  /** Runs SQL as the cluster's administrator; secrets in it travel by stdin, not as arguments. */
  const sql = (text, database = 'postgres') => {
    const args = ['-X', '-q', '-v', 'ON_ERROR_STOP=1', ...address, '-d', database];
    return run(programs.path('psql'), args, { ...asAdmin, input: text });
  };
  return { major: programs.major, pid, port, attached, setAsideTo, url, sql, admin };
}
