import { answers } from './answers.mjs';
import { startInBackground } from './background.mjs';
import { expoCli, expoEnvironment } from './expo.mjs';
import { inLocal } from './paths.mjs';
import { serverEnvironment } from './server-environment.mjs';
import { openLog } from './server-log.mjs';
import { isReady } from './serve.mjs';
import { say, step } from './steps.mjs';

/** TypeScript as it stands, by tsx; the app's origin is the public one, Metro hands calls on. */
export const developmentEnvironment = (settings, secrets, opened) => ({
  ...serverEnvironment(settings, secrets, opened),
  PUBLIC_URL: settings.publicUrl,
  TSX_TSCONFIG_PATH: 'server/tsconfig.json',
});

export const sourceEntry = (name) => ['--import', 'tsx', `server/${name}.ts`];

/** The server, started anew whenever one of its files changes. */
export async function serveSource(settings, env) {
  let server;
  await step('API', async () => {
    server = startInBackground({
      name: 'The server',
      args: ['--watch', '--watch-preserve-output', ...sourceEntry('index')],
      env,
      log: openLog(inLocal('server.log'), say),
    });
    await server.until(() => isReady(settings));
  });
  return server;
}

/** Metro on the loopback address, handing what is the API's on to the server. */
export async function startMetro(settings, port) {
  let metro;
  await step('Metro', async () => {
    metro = startInBackground({
      name: 'Metro',
      args: [expoCli, 'start', '--localhost', '--port', String(port)],
      env: { ...expoEnvironment('development'), API_URL: `http://127.0.0.1:${settings.port}` },
      log: openLog(inLocal('metro.log'), say),
    });
    const name = `localhost:${port}`;
    await metro.until(() => answers({ host: '127.0.0.1', port, path: '/status', name }));
  });
  return metro;
}
