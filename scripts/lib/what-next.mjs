import { existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import { relative } from 'node:path';
import { inRoot, root } from './paths.mjs';
import { demoKeyFile } from './server-environment.mjs';

const firstCall = (url, key) => `
  A first call, with the demo key in ${key}:
    curl ${url}/v1/fractions \\
      -H "Authorization: Bearer $(cat ${key})" -H 'Content-Type: application/json' \\
      -d '{"system":{"fullyProtonatedCharge":0,"pKa":["2.148","7.198","12.35"]},"pH":"7.4","digits":4}'
`;

/** The invented people who can sign in here; there are none in production. */
function demoPeople() {
  const demo = createRequire(import.meta.url)(inRoot('dist/server/services/demo/demo-data.js'));
  const people = demo.demoPeople.map(({ email, role }) => `    ${email.padEnd(32)}${role}`);
  return `
  Sign in as one of these demo people, password: ${demo.demoPassword}
${people.join('\n')}
`;
}

/** What to do now that it serves. */
export function whatNext({ publicUrl, mode, mailUrl }) {
  const key = demoKeyFile();
  const call = existsSync(key) ? firstCall(publicUrl, relative(root, key)) : '';
  return `
  Open ${publicUrl}
  The API's own page is ${publicUrl}/docs${
    mailUrl
      ? `
  E-mail is kept at ${mailUrl} and sent nowhere`
      : ''
  }
${mode === 'production' ? '' : demoPeople()}${call}
  The log is in .local/server.log. Ctrl-C stops everything that was started.`;
}
