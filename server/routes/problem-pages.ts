import { Router } from 'express';
import { problemTypes, type ProblemName } from '../../shared/problem';
import { Refusal } from '../refusal';

/** What a caller does about each kind of problem. */
const advice: Readonly<Record<ProblemName, string>> = {
  'malformed-json':
    'Send one JSON value in UTF-8. A trailing comma or a comment is enough to fail.',
  'invalid-request':
    'Each entry of errors names a place in the body (a JSON Pointer), a code and what to write there. Decimals are strings, and fields that the operation does not know are refused.',
  'credential-missing': 'Send Authorization: Bearer followed by a key of your organization.',
  'credential-malformed':
    'The key was cut or mistyped: its checksum does not fit. Paste it whole, in lower case.',
  'credential-invalid': 'The key is unknown, has expired or was revoked. Ask an admin for another.',
  'sign-in-needed': 'Sign in on the page, or POST /v1/sessions, and send the cookies it gives.',
  'sign-in-refused':
    'Look at both once more. Unknown people and wrong passwords get the same answer.',
  'origin-refused':
    'Requests with a session must carry Origin (or Sec-Fetch-Site) of this service. Pipelines use a key.',
  'role-insufficient': 'Ask an admin of your organization.',
  'scope-insufficient':
    'The WWW-Authenticate header names the scope that the operation needs. Issue a key that has it.',
  'not-found': 'Look at /openapi.json for the addresses there are.',
  'method-not-allowed': 'The Allow header names the methods that this address takes.',
  'not-acceptable': 'Ask for application/json, or for text/csv where the operation offers it.',
  'body-too-large':
    'GET /v1/limits says how large a body may be. Split the work over several calls.',
  'unsupported-media-type': 'Send Content-Type: application/json, in UTF-8.',
  'misdirected-request':
    'Call the service under its public address. Behind a proxy, have the proxy pass the Host on as it came.',
  'no-answer':
    'The request is well formed, but the chemistry has no such answer, or no model here can give it honestly. The detail says why, in the trade’s words, and what would help.',
  'over-limit':
    'GET /v1/limits says how the cost of a call is counted and how much one may ask for. Ask for fewer points, systems or digits.',
  'too-many-requests': 'Wait for the seconds that Retry-After names.',
  internal: 'The fault is ours. Quote the requestId when you report it.',
  unavailable: 'Wait for the seconds that Retry-After names, then try again.',
};

const isProblem = (name: string): name is ProblemName => Object.hasOwn(advice, name);

const style = `
:root { color-scheme: light dark; --page: #FBF9F4; --ink: #1D2529; --soft: #4C585D; --well: #0B5563; }
@media (prefers-color-scheme: dark) {
  :root { --page: #0F1719; --ink: #EEF2EF; --soft: #A9B7B8; --well: #6CC3CF; }
}
body { margin: 0; background: var(--page); color: var(--ink); font: 15px/22px "Hanken Grotesk", system-ui, sans-serif; }
main { max-width: 70ch; padding: 40px 24px; }
h1 { font-size: 26px; line-height: 32px; margin: 0 0 8px; }
p, li { margin: 0 0 16px; }
.status, code { font-family: "JetBrains Mono", ui-monospace, monospace; color: var(--soft); }
a { color: var(--well); }
`;

const page = (title: string, body: string) => `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${title} · Stepwell</title>
<link rel="stylesheet" href="/fonts/fonts.css">
<link rel="stylesheet" href="/problems/style.css">
</head>
<body><main>${body}</main></body>
</html>
`;

const pageOf = (name: ProblemName) => {
  const [status, title] = problemTypes[name];
  return page(
    title,
    `<p class="status">${status} ${name}</p><h1>${title}</h1><p>${advice[name]}</p>
<p><a href="/problems">All problems</a> · <a href="/docs">API description</a></p>`,
  );
};

const names = Object.keys(problemTypes).filter(isProblem);
const list = page(
  'Problems',
  `<h1>Problems</h1><ul>${names
    .map((name) => `<li><a href="/problems/${name}">${problemTypes[name][1]}</a></li>`)
    .join('')}</ul>`,
);

/** The pages that the `type` of a problem opens. */
export function problemPages(): Router {
  const router = Router();
  router.get('/problems', (_request, response) => void response.type('html').send(list));
  router.get('/problems/style.css', (_request, response) => void response.type('css').send(style));
  router.get('/problems/:name', ({ params }, response) => {
    if (!isProblem(params.name))
      throw new Refusal('not-found', 'There is no such kind of problem.');
    response.type('html').send(pageOf(params.name));
  });
  return router;
}
