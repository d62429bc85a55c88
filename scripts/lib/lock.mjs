import { readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { Failure } from './failure.mjs';
import { owns } from './lifetime.mjs';
import { inLocal } from './paths.mjs';
import { lifeOf } from './processes.mjs';

function read(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    return {};
  }
}

function write(path, content) {
  const next = `${path}.${process.pid}`;
  writeFileSync(next, JSON.stringify(content), { mode: 0o600 });
  renameSync(next, path);
}

/**
 * One start or dev at a time in a checkout: refuses while another runs, without touching it.
 * Answers what a run that was killed left behind, and a way to note what the next should know.
 */
export function takeLock(command, path = inLocal('running.json')) {
  const before = read(path);
  const alive =
    before.life !== undefined && lifeOf(Number.parseInt(before.life, 10)) === before.life;
  if (alive) {
    throw new Failure(
      `${before.command} already runs in this checkout (process ${Number.parseInt(before.life, 10)}).\n` +
        'Stop it with Ctrl-C where it runs, or use another clone.',
    );
  }
  const content = { command, life: lifeOf(process.pid), postmaster: before.postmaster };
  write(path, content);
  if (read(path).life !== content.life) throw new Failure('Another start came first.');
  const release = () => rmSync(path, { force: true });
  owns({ stop: async () => release(), kill: release });
  return {
    leftPostmaster: before.postmaster,
    note: (fields) => write(path, Object.assign(content, fields)),
  };
}
