import { Failure, Interrupted } from './failure.mjs';

const controller = new AbortController();

/** Aborts when somebody asks us to stop: Ctrl-C, SIGTERM, or a closed terminal. */
export const stopping = controller.signal;

const started = [];

/**
 * Notes something that was started: `stop` ends it cleanly, `kill` ends it this instant and
 * synchronously; either may be missing. What was started last is stopped first. Answers a
 * function that forgets it.
 */
export function owns({ stop = async () => {}, kill = () => {} }) {
  const entry = { stop, kill };
  started.push(entry);
  return () => {
    const index = started.indexOf(entry);
    if (index >= 0) started.splice(index, 1);
  };
}

async function stopAll() {
  const faults = [];
  for (let entry = started.pop(); entry; entry = started.pop()) {
    await entry.stop().catch((fault) => faults.push(fault));
  }
  return faults;
}

/**
 * npm passes Ctrl-C on to us although the terminal has sent it to us already, so that one key
 * press arrives twice: a repeat within this time is not a second one.
 */
const sameKeyPress = 400;

/** A reader that left, as in `npm start | head`, is no reason to fall over and leave things behind. */
function outliveReaders() {
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});
}

function listenForSignals() {
  let first;
  const onSignal = () => {
    if (first === undefined) {
      first = Date.now();
      controller.abort(new Interrupted());
    } else if (Date.now() - first > sameKeyPress) {
      for (const { kill } of started.reverse()) kill();
      process.exit(130);
    }
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, onSignal);
}

/** Resolves when somebody asks us to stop. */
export const untilStopped = () =>
  new Promise((resolve) => {
    if (stopping.aborted) resolve();
    else stopping.addEventListener('abort', () => resolve(), { once: true });
  });

const show = (fault) =>
  process.stderr.write(`\n${fault instanceof Failure ? fault.message : fault.stack}\n`);

/**
 * Runs a command of ours from beginning to end: the work, then whatever it started is stopped,
 * on success, failure and Ctrl-C alike. Exits with what `work` answers (0 when it answers
 * nothing), 1 after a fault, 130 when stopped half-way. `atEnd` has the last word.
 */
export async function command(work, atEnd = () => {}) {
  listenForSignals();
  outliveReaders();
  let code;
  try {
    code = (await work()) ?? 0;
  } catch (fault) {
    code = fault instanceof Interrupted ? 130 : 1;
    show(fault);
  }
  for (const fault of await stopAll()) {
    code ||= 1;
    show(fault);
  }
  atEnd(code);
  process.exitCode = code;
}
