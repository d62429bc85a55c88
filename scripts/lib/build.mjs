import { existsSync } from 'node:fs';
import { mkdir, readdir, rename, rm } from 'node:fs/promises';
import { join } from 'node:path';
import { precompress } from './compress.mjs';
import { expoCli, expoEnvironment } from './expo.mjs';
import { inRoot } from './paths.mjs';
import { runNode } from './run.mjs';
import { contentHash, stamp } from './stamp.mjs';

const dist = inRoot('dist');

const serverInputs = ['server', 'shared', 'openapi', 'package-lock.json', 'scripts/lib/build.mjs'];
const webInputs = [
  ...['app', 'components', 'shared', 'assets', 'public', 'scripts/fonts.mjs', 'package-lock.json'],
  ...['app.json', 'babel.config.js', 'metro.config.js', 'tsconfig.json'],
  ...['scripts/lib/build.mjs', 'scripts/lib/compress.mjs', 'scripts/lib/expo.mjs'],
];
const generated = ['public/fonts'];

/**
 * Builds beside what is there and then puts it in its place, so that a build that fails or is cut
 * short leaves the last good one, and a server that runs keeps its files until the last moment.
 */
async function built(name, hash, make) {
  const made = stamp(join(dist, `${name}.stamp`), hash);
  if (made.fresh) return 'up to date';
  const next = join(dist, `${name}.next-${process.pid}`);
  await mkdir(next, { recursive: true });
  try {
    await make(next);
    await rm(join(dist, `${name}.stamp`), { force: true });
    await put(next);
  } finally {
    await rm(next, { recursive: true, force: true });
  }
  await made.set();
  return 'built';
}

async function put(next) {
  for (const folder of await readdir(next)) {
    const place = join(dist, folder);
    await rm(place, { recursive: true, force: true });
    await rename(join(next, folder), place);
  }
}

/** TypeScript to `dist/server`, with what it takes from `shared` and `openapi` beside it. */
export const buildServer = () =>
  built('server', contentHash(serverInputs), (next) =>
    runNode(
      [inRoot('node_modules/typescript/bin/tsc'), '-p', 'server/tsconfig.json', '--outDir', next],
      {
        title: 'tsc',
      },
    ),
  );

/** The web app to `dist/web`: fonts, Metro's bundle, and both compressed forms of every text. */
export const buildWeb = () =>
  built('web', contentHash(webInputs, generated), async (next) => {
    const env = { ...expoEnvironment('production'), CI: '1' };
    if (existsSync(inRoot('scripts/fonts.mjs'))) await runNode(['scripts/fonts.mjs'], { env });
    const output = join(next, 'web');
    await runNode([expoCli, 'export', '--platform', 'web', '--output-dir', output], {
      env,
      title: 'expo export',
    });
    await precompress(output);
  });
