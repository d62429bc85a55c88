import { existsSync } from 'node:fs';
import { Failure } from './failure.mjs';
import { isRoot } from './privileges.mjs';
import { run } from './run.mjs';

const apt = '/usr/bin/apt-get';
const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
const install = ['install', '-y', '--no-install-recommends', '-o', 'DPkg::Lock::Timeout=120'];

/** Installs a package of Debian's, as root; anybody else is told what to type. */
export async function installFromDebian(packageName, what) {
  if (!existsSync(apt)) {
    throw new Failure(`${what} is missing. Install it with this system's package manager.`);
  }
  if (!isRoot) {
    throw new Failure(
      `${what} is missing, and only root may install it. Type this once as root, then try again:\n` +
        `  apt-get update && apt-get install -y --no-install-recommends ${packageName}`,
    );
  }
  await run(apt, ['update'], { env });
  await run(apt, [...install, packageName], { env });
}
