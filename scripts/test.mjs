import { buildServer, buildWeb } from './lib/build.mjs';
import { findChromium } from './lib/chromium.mjs';
import { closingLine, runJest } from './lib/jest.mjs';
import { command } from './lib/lifetime.mjs';
import { requireNode } from './lib/node-version.mjs';
import { installPackages } from './lib/packages.mjs';
import { inRoot } from './lib/paths.mjs';
import { requireOwnFolders } from './lib/privileges.mjs';
import { findProgram } from './lib/program.mjs';
import { say, step } from './lib/steps.mjs';
import { throwAwayCluster } from './lib/throw-away-cluster.mjs';

/** Runs the calls that are copied from the pages, as a pipeline would. */
const curl = { names: ['curl'], packageName: 'curl', what: 'curl, which runs the copied calls,' };

let counts = { passed: 0, failed: 1, skipped: 0 };

await command(
  async () => {
    requireNode();
    requireOwnFolders();
    await step('Packages', installPackages);
    let database;
    await step('PostgreSQL', async () => {
      database = await throwAwayCluster();
      return `${database.major} on 127.0.0.1:${database.port}`;
    });
    const browser = await step('Chromium', findChromium);
    await step('curl', () => findProgram(curl));
    await step('Server', buildServer);
    await step('Web app', buildWeb);
    say();

    counts = await runJest(process.argv.slice(2), {
      ...process.env,
      NODE_ENV: 'test',
      TEST_DATABASE_URL: database.url,
      CHROMIUM: browser,
      WEB_ROOT: inRoot('dist', 'web'),
    });
    return counts.ok ? 0 : 1;
  },
  () => say(closingLine(counts)),
);
