import { rm } from 'node:fs/promises';
import { inRoot } from './paths.mjs';
import { run, runNode } from './run.mjs';
import { contentHash, stamp } from './stamp.mjs';

/** Inside node_modules, so that it goes when they go. */
const stampPath = inRoot('node_modules', '.stepwell-stamp');

/** Build tools are development packages: `NODE_ENV=production` must not leave them out. */
const npmArguments = ['ci', '--include=dev', '--no-audit', '--no-fund'];

/** Installs exactly what the lock file names, when it is not what is installed. */
export async function installPackages() {
  const installed = stamp(stampPath, contentHash(['package-lock.json']));
  if (installed.fresh) return 'as the lock file has them';
  await rm(stampPath, { force: true });
  const npm = process.env.npm_execpath;
  if (npm?.endsWith('.js')) await runNode([npm, ...npmArguments], { title: 'npm ci' });
  else await run('npm', npmArguments);
  await installed.set();
  return 'installed';
}
