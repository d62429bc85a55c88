import { Failure } from './failure.mjs';
import { findProgram, isExecutable } from './program.mjs';

/** Path of a Chromium: the one that CHROMIUM names, one on the path, or Debian's, installed now. */
export async function findChromium() {
  const given = process.env.CHROMIUM;
  if (!given) {
    return findProgram({
      names: ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome'],
      packageName: 'chromium',
      what: 'Chromium, in which the browser tests run,',
    });
  }
  if (!isExecutable(given)) throw new Failure(`CHROMIUM names no program: ${given}`);
  return given;
}
