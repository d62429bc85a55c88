import { existsSync } from 'node:fs';
import { relative } from 'node:path';
import { root } from './paths.mjs';
import { demoKeyFile } from './server-environment.mjs';

const firstCall = (url, key) => `
  A first call, with the demo key in ${key}:
    curl ${url}/v1/fractions \\
      -H "Authorization: Bearer $(cat ${key})" -H 'Content-Type: application/json' \\
      -d '{"system":{"fullyProtonatedCharge":0,"pKa":["2.148","7.198","12.35"]},"pH":"7.4","digits":4}'
`;

/** What to do now that it serves. */
export function whatNext({ publicUrl }) {
  const key = demoKeyFile();
  const call = existsSync(key) ? firstCall(publicUrl, relative(root, key)) : '';
  return `
  Open ${publicUrl}
  The API's own page is ${publicUrl}/docs
${call}
  The log is in .local/server.log. Ctrl-C stops everything that was started.`;
}
