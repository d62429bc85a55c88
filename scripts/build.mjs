import { buildServer, buildWeb } from './lib/build.mjs';
import { command } from './lib/lifetime.mjs';
import { requireNode } from './lib/node-version.mjs';
import { installPackages } from './lib/packages.mjs';
import { requireOwnFolders } from './lib/privileges.mjs';
import { step } from './lib/steps.mjs';

await command(async () => {
  requireNode();
  requireOwnFolders();
  await step('Packages', installPackages);
  await step('Server', buildServer);
  await step('Web app', buildWeb);
});
