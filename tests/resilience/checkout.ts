import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { cp, mkdtemp, readdir, rm, symlink } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';

const root = path.resolve(__dirname, '..', '..');
/** What a clone does not bring, and tests that would run inside tests. */
const leftOut = new Set(['.git', '.local', '.expo', 'node_modules', 'tests', 'docs']);

/** Commands that have not ended: a test that fails must not leave them behind. */
const running = new Set<ChildProcess>();

export interface Checkout {
  readonly folder: string;
  readonly path: (...parts: string[]) => string;
  readonly remove: () => Promise<void>;
}

/** A clone in a folder with a space in its name, with packages and builds as they are here. */
export async function makeCheckout(): Promise<Checkout> {
  const folder = await mkdtemp(path.join(tmpdir(), 'stepwell clone '));
  for (const name of await readdir(root)) {
    if (!leftOut.has(name)) {
      await cp(path.join(root, name), path.join(folder, name), { recursive: true });
    }
  }
  await symlink(path.join(root, 'node_modules'), path.join(folder, 'node_modules'));
  return {
    folder,
    path: (...parts) => path.join(folder, ...parts),
    remove: async () => {
      for (const child of running) child.kill('SIGKILL');
      await rm(folder, { recursive: true, force: true });
    },
  };
}

export interface Command {
  readonly child: ChildProcess;
  /** Everything it wrote so far. */
  readonly output: () => string;
  /** Resolves once it wrote `text`; rejects when it ends without. */
  readonly says: (text: string) => Promise<void>;
  /** Its exit code. */
  readonly ended: Promise<number | null>;
}

/** Runs a script of a checkout with nothing in its environment but what is given. */
export function runScript(
  checkout: Pick<Checkout, 'folder'>,
  args: readonly string[],
  variables: Readonly<Record<string, string>> = {},
): Command {
  const { PATH, HOME, CHROMIUM } = process.env;
  const child = spawn(process.execPath, args, {
    cwd: checkout.folder,
    env: { PATH, HOME, CHROMIUM, ...variables, NODE_ENV: variables.NODE_ENV },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  running.add(child);
  child.once('close', () => running.delete(child));
  let output = '';
  const ended = once(child, 'close').then(([code]) => code as number | null);
  for (const stream of [child.stdout, child.stderr]) {
    stream.setEncoding('utf8').on('data', (chunk: string) => (output += chunk));
  }
  const says = (text: string) =>
    new Promise<void>((resolve, reject) => {
      const look = () => output.includes(text) && resolve();
      child.stdout.on('data', look);
      child.stderr.on('data', look);
      look();
      void ended.then(() => reject(new Error(`It never said "${text}" but:\n${output}`)));
    });
  return { child, output: () => output, says, ended };
}
