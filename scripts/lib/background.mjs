import { spawn } from 'node:child_process';
import { setTimeout as after } from 'node:timers/promises';
import { Failure } from './failure.mjs';
import { owns, stopping } from './lifetime.mjs';
import { root } from './paths.mjs';
import { send } from './run.mjs';

const patience = 60_000;
const pause = 100;
/** How long work under way may take to finish once we were asked to stop. */
const graceful = 15_000;

/**
 * Starts a Node program that goes on running, in a process group of its own, with a pipe at its
 * third descriptor that closes when we are gone. `ended` resolves to its exit code or signal;
 * `until(ready)` resolves once `ready()` does to true, and throws with the log's end when the
 * program ends before, or is never ready. It is stopped at the end of this command.
 */
export function startInBackground({ name, args, env, identity = {}, log }) {
  const child = spawn(process.execPath, args, {
    cwd: root,
    env,
    ...identity,
    detached: true,
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
    kill: () => child.pid && send(-child.pid, 'SIGKILL'),
  });
  const died = () => new Failure(`${name} ended by itself (${over}):\n${log.end()}`);

  async function until(ready) {
    const deadline = Date.now() + patience;
    while (!(await ready())) {
      stopping.throwIfAborted();
      if (over !== undefined) throw died();
      if (Date.now() > deadline) throw new Failure(`${name} is not ready:\n${log.end()}`);
      await after(pause);
    }
  }
  return { ended, until, died };
}
