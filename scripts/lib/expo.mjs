import { mkdirSync } from 'node:fs';
import { inLocal, inRoot } from './paths.mjs';

export const expoCli = inRoot('node_modules/expo/bin/cli');

/**
 * Expo works offline and says nothing home. Metro's and Expo's caches lie with the checkout: in
 * /tmp and $HOME they would be one user's and lock the next one out.
 */
export function expoEnvironment(mode) {
  const cache = inLocal('cache');
  mkdirSync(cache, { recursive: true });
  return {
    ...process.env,
    NODE_ENV: mode,
    EXPO_OFFLINE: '1',
    EXPO_NO_TELEMETRY: '1',
    TMPDIR: cache,
    __UNSAFE_EXPO_HOME_DIRECTORY: inLocal('cache', 'expo'),
  };
}
