import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { installFromDebian } from './apt.mjs';
import { Failure } from './failure.mjs';

export const isExecutable = (path) => {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
};

const onPath = (names) =>
  (process.env.PATH ?? '')
    .split(delimiter)
    .flatMap((folder) => names.map((name) => join(folder, name)))
    .find(isExecutable);

/** Path of a program: one of these names on the path, or Debian's package, installed now. */
export async function findProgram({ names, packageName, what }) {
  const found = onPath(names);
  if (found) return found;
  await installFromDebian(packageName, what);
  const installed = onPath(names);
  if (installed) return installed;
  throw new Failure(`${packageName} was installed but is not on the path.`);
}
