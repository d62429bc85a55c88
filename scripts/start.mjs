import { buildServer, buildWeb } from './lib/build.mjs';
import { openDatabase } from './lib/database.mjs';
import { command, untilStopped } from './lib/lifetime.mjs';
import { takeLock } from './lib/lock.mjs';
import { openMail } from './lib/mail.mjs';
import { requireNode } from './lib/node-version.mjs';
import { installPackages } from './lib/packages.mjs';
import { inLocal } from './lib/paths.mjs';
import { requireFreePort } from './lib/ports.mjs';
import { builtEntry, prepareData } from './lib/prepare-server.mjs';
import { isRoot, requireOwnFolders } from './lib/privileges.mjs';
import { loadSecrets } from './lib/secrets.mjs';
import { serverEnvironment } from './lib/server-environment.mjs';
import { serve } from './lib/serve.mjs';
import { readSettings } from './lib/settings.mjs';
import { say, step } from './lib/steps.mjs';
import { whatNext } from './lib/what-next.mjs';

await command(async () => {
  requireNode();
  const settings = readSettings(process.env);
  requireOwnFolders();
  const lock = takeLock('npm start');
  await requireFreePort(settings.port, settings.host);
  say(`Stepwell, ${settings.mode}${isRoot ? ', started as root' : ''}`);

  await step('Packages', installPackages);
  const secrets = await loadSecrets(inLocal('secrets.json'));
  const database = await openDatabase(settings, secrets, lock);
  const mail = await openMail(settings);
  await step('Server', buildServer);
  await step('Web app', buildWeb);

  const env = serverEnvironment(settings, secrets, { ...database, ...mail.variables });
  await prepareData(settings, env, builtEntry);
  const server = await serve(settings, env);
  say(whatNext({ ...settings, mailUrl: mail.url }));

  const died = await Promise.race([untilStopped(), server.ended.then(server.died)]);
  if (died) throw died;
  say('\nStopping.');
});
