import { inLocal, inRoot } from './paths.mjs';

/**
 * What the server is told, on top of what the caller's environment says: the caller's pepper and
 * public address win, and what leads to database and mail comes from whoever opened them.
 */
export const serverEnvironment = (settings, secrets, opened) => ({
  ...process.env,
  ...opened,
  NODE_ENV: settings.mode,
  HOST: settings.host,
  PORT: String(settings.port),
  KEY_PEPPERS: process.env.KEY_PEPPERS || `1:${secrets.keyPepper}`,
  SESSION_SECRET: process.env.SESSION_SECRET || secrets.sessionSecret,
  WEB_ROOT: inRoot('dist', 'web'),
  ...(settings.mode === 'production' ? {} : { DEMO_KEY_FILE: demoKeyFile() }),
});

/** The running server needs neither the owner's password nor the way to the demo key. */
export function runningEnvironment(environment) {
  const { MIGRATION_DATABASE_URL, APP_ROLE, DEMO_KEY_FILE, ...rest } = environment;
  return rest;
}

export const demoKeyFile = () => inLocal('demo-key');
