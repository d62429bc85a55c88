import { randomBytes } from 'node:crypto';
import { mkdtemp } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { openCluster } from './cluster.mjs';
import { removePlace } from './cluster-place.mjs';
import { owns } from './lifetime.mjs';
import { makeTestRoles } from './roles.mjs';

/**
 * A cluster for the tests of one run, on a free port, in a folder that is removed at the end.
 * Answers `{ major, port, url }`; the address is that of a role that may create databases.
 */
export async function throwAwayCluster() {
  const folder = await mkdtemp(join(tmpdir(), 'stepwell-test-'));
  const remove = () => removePlace(folder);
  owns({ stop: remove });
  const password = randomBytes(24).toString('base64url');
  const cluster = await openCluster({ place: folder, password, throwAway: true });
  return { ...cluster, url: await makeTestRoles(cluster, password) };
}
