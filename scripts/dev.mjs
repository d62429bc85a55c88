import { openDatabase } from './lib/database.mjs';
import {
  developmentEnvironment,
  serveSource,
  sourceEntry,
  startMetro,
} from './lib/development.mjs';
import { command, untilStopped } from './lib/lifetime.mjs';
import { takeLock } from './lib/lock.mjs';
import { openMail } from './lib/mail.mjs';
import { requireNode } from './lib/node-version.mjs';
import { installPackages } from './lib/packages.mjs';
import { inLocal, inRoot } from './lib/paths.mjs';
import { freePort, requireFreePort } from './lib/ports.mjs';
import { prepareData } from './lib/prepare-server.mjs';
import { requireOwnFolders } from './lib/privileges.mjs';
import { runNode } from './lib/run.mjs';
import { loadSecrets } from './lib/secrets.mjs';
import { readSettings } from './lib/settings.mjs';
import { say, step } from './lib/steps.mjs';

await command(async () => {
  requireNode();
  const given = readSettings({ ...process.env, NODE_ENV: 'development' });
  requireOwnFolders();
  const lock = takeLock('npm run dev');
  await requireFreePort(given.port, given.host);

  await step('Packages', installPackages);
  const secrets = await loadSecrets(inLocal('secrets.json'));
  const database = await openDatabase(given, secrets, lock);
  const mail = await openMail(given);
  await step('Fonts', async () => void (await runNode([inRoot('scripts/fonts.mjs')])));

  const metroPort = await freePort(8081);
  const settings = { ...given, publicUrl: `http://localhost:${metroPort}` };
  const env = developmentEnvironment(settings, secrets, { ...database, ...mail.variables });
  await prepareData(settings, env, sourceEntry);
  const server = await serveSource(settings, env);
  const metro = await startMetro(settings, metroPort);
  say(`\n  Open ${settings.publicUrl}\n  App and API follow what you save. Ctrl-C stops both.`);

  const died = await Promise.race([
    untilStopped(),
    server.ended.then(server.died),
    metro.ended.then(metro.died),
  ]);
  if (died) throw died;
  say('\nStopping.');
});
