import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { mkdir, writeFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { root } from './paths.mjs';

function filesUnder(path) {
  const found = statSync(join(root, path), { throwIfNoEntry: false });
  if (found === undefined) return [];
  if (found.isFile()) return [path];
  return readdirSync(join(root, path))
    .sort()
    .flatMap((name) => filesUnder(join(path, name)));
}

/**
 * SHA-256 over the names and contents of files and folders of the checkout; one that is missing
 * counts as empty. Contents, not times: a fresh clone and a touched file are judged alike.
 */
export function contentHash(paths, leftOut = []) {
  const hash = createHash('sha256');
  for (const file of paths.flatMap(filesUnder)) {
    if (leftOut.some((path) => file === path || file.startsWith(`${path}/`))) continue;
    const content = readFileSync(join(root, file));
    hash.update(`${file}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}

/**
 * Whether what `path` vouches for was made from inputs of this hash, and a way to say so once it
 * has been made again.
 */
export function stamp(path, hash) {
  const found = statSync(path, { throwIfNoEntry: false }) && readFileSync(path, 'utf8').trim();
  return {
    fresh: found === hash,
    async set() {
      await mkdir(dirname(path), { recursive: true });
      await writeFile(path, `${hash}\n`);
    },
  };
}
