import { randomBytes } from 'node:crypto';
import { chmod, readFile, rename, writeFile } from 'node:fs/promises';
import { Failure } from './failure.mjs';

/** 256 bits, written in characters that need no quoting in a URL or in SQL. */
const secret = () => randomBytes(32).toString('base64url');

const names = ['databaseAdmin', 'databaseOwner', 'databaseApp', 'keyPepper', 'sessionSecret'];

async function read(path) {
  const text = await readFile(path, 'utf8').catch((fault) => {
    if (fault.code === 'ENOENT') return undefined;
    throw fault;
  });
  if (text === undefined) return undefined;
  try {
    return JSON.parse(text);
  } catch {
    throw new Failure(
      `${path} is not readable JSON. Restore it: keys made so far and the database need it.`,
    );
  }
}

/**
 * The passwords and the pepper of this checkout, made at first start: a file for its owner's eyes
 * (mode 0600), replaced whole or not at all. What exists is never changed.
 */
export async function loadSecrets(path) {
  const known = (await read(path)) ?? {};
  const missing = names.filter((name) => typeof known[name] !== 'string');
  if (missing.length > 0) {
    for (const name of missing) known[name] = secret();
    const next = `${path}.${process.pid}`;
    await writeFile(next, `${JSON.stringify(known, null, 2)}\n`, { mode: 0o600, flush: true });
    await rename(next, path);
  }
  await chmod(path, 0o600);
  return known;
}
