import { join } from 'node:path';
import { openCluster } from './cluster.mjs';
import { checkoutHash, inLocal } from './paths.mjs';
import { isRoot } from './privileges.mjs';
import { appRole, makeDatabase } from './roles.mjs';
import { say, step } from './steps.mjs';

/** The user `postgres` cannot enter a checkout under /root, so root's cluster lies elsewhere. */
const place = () => (isRoot ? join('/var/lib/stepwell', checkoutHash) : inLocal('pg'));

/** Away from 5432, where a PostgreSQL of the machine's own would listen. */
const usualPort = 54_320;

const roleIn = (url) => decodeURIComponent(new URL(url).username);

/** The database given by the environment: nothing is started, and nothing of it is stopped. */
function attach({ databaseUrl, migrationUrl }) {
  if (migrationUrl === undefined) {
    say('  MIGRATION_DATABASE_URL is not set: DATABASE_URL also makes the schema.');
  }
  return {
    DATABASE_URL: databaseUrl,
    MIGRATION_DATABASE_URL: migrationUrl ?? databaseUrl,
    APP_ROLE: roleIn(databaseUrl),
  };
}

async function ownCluster(secrets, lock) {
  let urls;
  await step('PostgreSQL', async () => {
    const cluster = await openCluster({
      place: place(),
      password: secrets.databaseAdmin,
      usualPort,
      adopt: (pid) => pid === lock.leftPostmaster,
    });
    if (!cluster.attached) lock.note({ postmaster: cluster.pid });
    urls = await makeDatabase(cluster, secrets);
    const aside =
      cluster.setAsideTo && `; one with a lost password now lies in ${cluster.setAsideTo}`;
    return `${cluster.major} on 127.0.0.1:${cluster.port}${aside ?? ''}`;
  });
  return {
    DATABASE_URL: urls.databaseUrl,
    MIGRATION_DATABASE_URL: urls.migrationUrl,
    APP_ROLE: appRole,
  };
}

/** The part of the server's environment that leads to its database. */
export const openDatabase = (settings, secrets, lock) =>
  settings.databaseUrl === undefined ? ownCluster(secrets, lock) : attach(settings);
