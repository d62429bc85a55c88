import { stopping } from './lifetime.mjs';

const live = process.stdout.isTTY === true;
/** A terminal counts every second; a log gets a line now and then, enough to see that it lives. */
const interval = live ? 1_000 : 15_000;
const seconds = (since) => `${((Date.now() - since) / 1_000).toFixed(1)} s`;
const wholeSeconds = (since) => `${Math.round((Date.now() - since) / 1_000)} s`;

export const say = (text = '') => process.stdout.write(`${text}\n`);

/**
 * Shows one step of the way with its elapsed time. The work may answer a word on what it found;
 * a step that throws is shown as failed, and nothing begins once we were asked to stop.
 */
export async function step(title, work) {
  stopping.throwIfAborted();
  const since = Date.now();
  const line = (text) => `${live ? '\r\u001b[K' : ''}  ${title} ${text}`;
  if (live) process.stdout.write(line('…'));
  const timer = setInterval(
    () => process.stdout.write(line(`… ${wholeSeconds(since)}${live ? '' : '\n'}`)),
    interval,
  );
  let outcome = 'failed';
  try {
    const found = await work();
    outcome = found || 'done';
    return found;
  } catch (fault) {
    if (stopping.aborted) outcome = 'stopped';
    throw fault;
  } finally {
    clearInterval(timer);
    say(line(`${outcome} (${seconds(since)})`));
  }
}
