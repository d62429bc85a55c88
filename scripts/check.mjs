import { checks } from './lib/checks.mjs';
import { Failure, Interrupted } from './lib/failure.mjs';
import { command } from './lib/lifetime.mjs';
import { requireNode } from './lib/node-version.mjs';
import { installPackages } from './lib/packages.mjs';
import { inRoot } from './lib/paths.mjs';
import { requireOwnFolders } from './lib/privileges.mjs';
import { attempt } from './lib/run.mjs';
import { say, step } from './lib/steps.mjs';

const failed = [];

/** One check after the other, all of them, whatever the first ones say. */
async function check(title, work) {
  try {
    await step(title, async () => void (await work()));
  } catch (fault) {
    if (!(fault instanceof Failure) || fault instanceof Interrupted) throw fault;
    failed.push(title);
    say(fault.message);
  }
}

async function tests() {
  const { code } = await attempt(process.execPath, [inRoot('scripts', 'test.mjs')], { show: true });
  if (code !== 0) throw new Failure('See above.');
}

await command(async () => {
  requireNode();
  requireOwnFolders();
  await step('Packages', installPackages);
  for (const [title, work] of Object.entries(checks)) await check(title, work);
  if (!process.argv.includes('--fast')) await check('Tests', tests);
  say(failed.length === 0 ? '\nAll checks passed.' : `\nFailed: ${failed.join(', ')}.`);
  return failed.length === 0 ? 0 : 1;
});
