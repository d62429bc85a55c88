import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { installFromDebian } from './apt.mjs';
import { Failure } from './failure.mjs';

const names = ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome'];

const executable = (path) => {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
};

const onPath = () =>
  (process.env.PATH ?? '')
    .split(delimiter)
    .flatMap((folder) => names.map((name) => join(folder, name)))
    .find(executable);

/** Path of a Chromium: the one that CHROMIUM names, one on the path, or Debian's, installed now. */
export async function findChromium() {
  const given = process.env.CHROMIUM;
  if (given) {
    if (!executable(given)) throw new Failure(`CHROMIUM names no program: ${given}`);
    return given;
  }
  const found = onPath();
  if (found) return found;
  await installFromDebian('chromium', 'Chromium, in which the browser tests run,');
  const installed = onPath();
  if (installed) return installed;
  throw new Failure('Chromium was installed but is not on the path.');
}
