import { answers } from './answers.mjs';
import { startInBackground } from './background.mjs';
import { inLocal, inRoot } from './paths.mjs';
import { builtEntry } from './prepare-server.mjs';
import { isRoot, serverIdentity } from './privileges.mjs';
import { runningEnvironment } from './server-environment.mjs';
import { openLog } from './server-log.mjs';
import { say, step } from './steps.mjs';

const leash = inRoot('scripts', 'lib', 'leash.mjs');

/** /readyz is asked under the public name, as callers will. */
export const isReady = ({ host, port, publicUrl }) =>
  answers({ host, port, path: '/readyz', name: new URL(publicUrl).host });

/** Starts the built server, as a user with fewer rights where that is possible, and waits for it. */
export async function serve(settings, env) {
  const [entry] = builtEntry('index');
  const identity = await serverIdentity([entry, leash, inRoot('node_modules', 'express')]);
  let server;
  await step('Serving', async () => {
    server = startInBackground({
      name: 'The server',
      args: ['--import', './scripts/lib/leash.mjs', entry],
      env: runningEnvironment(env),
      identity,
      log: openLog(inLocal('server.log'), say),
    });
    await server.until(() => isReady(settings));
    if (!isRoot) return 'ready';
    return identity.uid === undefined
      ? 'ready, as root: the user nobody cannot read this folder'
      : 'ready, as the user nobody';
  });
  return server;
}
