import { spawn } from 'node:child_process';
import { get } from 'node:http';
import { setTimeout as after } from 'node:timers/promises';
import { Failure } from './failure.mjs';
import { owns, stopping } from './lifetime.mjs';
import { root } from './paths.mjs';
import { send } from './run.mjs';

const patience = 60_000;
const pause = 100;
/** How long running calls may take to finish once we were asked to stop. */
const graceful = 15_000;

/** Whether /readyz answers 200. It is asked under the public name: other hosts are refused. */
const isReady = ({ host, port, publicUrl }) =>
  new Promise((resolve) => {
    const headers = { host: new URL(publicUrl).host };
    const request = get({ host, port, path: '/readyz', headers, timeout: 2_000 }, (response) => {
      response.resume();
      resolve(response.statusCode === 200);
    });
    request.on('timeout', () => request.destroy()).on('error', () => resolve(false));
  });

/**
 * Starts the server in a process group of its own. `ended` resolves to its exit code or signal;
 * `ready()` resolves once /readyz says so and throws with the log's end when it never does.
 */
export function startServer({ args, env, identity = {}, log, address }) {
  const child = spawn(process.execPath, args, {
    ...{ cwd: root, env, ...identity, detached: true },
    stdio: ['ignore', 'pipe', 'pipe', 'pipe'],
  });
  log.take(child.stdout);
  log.take(child.stderr);
  let over;
  const ended = new Promise((resolve) => {
    child.on('error', (fault) => resolve((over = fault.message)));
    child.on('close', (code, signal) => resolve((over = code ?? signal)));
  });
  owns({
    stop: async () => {
      if (over === undefined) send(child.pid, 'SIGTERM');
      const late = setTimeout(() => send(-child.pid, 'SIGKILL'), graceful);
      await ended;
      clearTimeout(late);
      await log.close();
    },
    kill: () => send(-child.pid, 'SIGKILL'),
  });
  const died = () => new Failure(`The server ended by itself (${over}):\n${log.end()}`);

  async function ready() {
    const deadline = Date.now() + patience;
    while (!(await isReady(address))) {
      stopping.throwIfAborted();
      if (over !== undefined) throw died();
      if (Date.now() > deadline) throw new Failure(`The server is not ready:\n${log.end()}`);
      await after(pause);
    }
  }
  return { pid: child.pid, ended, ready, died };
}
