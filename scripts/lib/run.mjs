import { spawn } from 'node:child_process';
import { Failure } from './failure.mjs';
import { owns, stopping } from './lifetime.mjs';
import { root } from './paths.mjs';

const tailLines = 40;
const keptCharacters = 200_000;

/** The end of a program's output, where its reason usually stands. */
const tail = (text, lines = tailLines) => text.trimEnd().split('\n').slice(-lines).join('\n');

/** Sends a signal; a process that has gone already is no fault. */
export function send(pid, signal) {
  try {
    process.kill(pid, signal);
  } catch (fault) {
    if (fault.code !== 'ESRCH') throw fault;
  }
}

/**
 * Runs a program to its end and answers `{ code, output }`. It has a process group of its own, so
 * that Ctrl-C reaches us alone and we decide what stops when; an interruption is passed on to it
 * unless it is `protected`, as what cleans up must be.
 */
export function attempt(program, args, options = {}) {
  const { cwd = root, env = process.env, identity = {}, input, show = false } = options;
  const out = show ? 'inherit' : 'pipe';
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      cwd,
      env,
      ...identity,
      detached: true,
      stdio: [input === undefined ? 'ignore' : 'pipe', out, out],
    });
    let output = '';
    const keep = (chunk) => (output = (output + chunk).slice(-keptCharacters));
    for (const stream of [child.stdout, child.stderr]) stream?.setEncoding('utf8').on('data', keep);
    child.stdin?.on('error', () => {}).end(input);

    const interrupt = () => send(-child.pid, 'SIGINT');
    if (!options.protected) stopping.addEventListener('abort', interrupt);
    const release = owns({ kill: () => child.pid && send(-child.pid, 'SIGTERM') });
    const forget = () => {
      stopping.removeEventListener('abort', interrupt);
      release();
    };
    child.on('error', (fault) => {
      forget();
      reject(new Failure(`${program} could not be started: ${fault.message}`));
    });
    child.on('close', (code, signal) => {
      forget();
      if (stopping.aborted && !options.protected) reject(stopping.reason);
      else resolve({ code: code ?? signal, output });
    });
  });
}

/**
 * Runs a program that must succeed and answers its output; otherwise throws a Failure with the
 * last `lines` of it.
 */
export async function run(program, args, options = {}) {
  const { code, output } = await attempt(program, args, options);
  if (code === 0) return output;
  const title = options.title ?? [program, ...args].join(' ');
  throw new Failure(`${title} failed (${code}):\n${tail(output, options.lines)}`);
}

/** Runs a JavaScript file with this very Node. */
export const runNode = (args, options) => run(process.execPath, args, options);
