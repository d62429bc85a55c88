import { accountAnswer, organizationChoice, signInRequest } from '../../shared/account';
import { roles } from '../../shared/scopes';
import { operation } from '../http/operation';
import { notSignedIn } from '../services/sessions/session-service';

const json = 'application/json';
const exampleAccount = {
  account: {
    id: '8c1f2a34-0b7d-4c55-8f43-0d2e9b7a6c02',
    email: 'developer@larkmoor.example',
    name: 'Demo developer',
  },
  organization: { id: '5e9b0d0e-7a51-4a0e-9d53-1b3a6f5d8a01', name: 'Larkmoor Assay' },
  organizations: [
    { id: '5e9b0d0e-7a51-4a0e-9d53-1b3a6f5d8a01', name: 'Larkmoor Assay', role: 'developer' },
  ],
  role: 'developer',
};

export const signIn = operation({
  method: 'post',
  path: '/v1/sessions',
  operationId: 'signIn',
  summary: 'Sign in',
  description:
    'Opens a session in two HttpOnly cookies. Unknown people and wrong passwords get the same ' +
    'answer after the same work; ten failures in a quarter of an hour and it is a 429.',
  tag: 'People',
  access: 'own-pages',
  callsPerMinute: 60,
  status: 201,
  body: signInRequest,
  answer: accountAnswer,
  produces: [json],
  refuses: ['sign-in-refused'],
  examples: {
    developer: {
      summary: 'A developer of the demo organization',
      body: { email: 'developer@larkmoor.example', password: 'three steps down to water' },
      answer: exampleAccount,
    },
  },
  handle: async ({ body, source, signal, services }) => {
    const attempt = { ...body, ...source };
    const { account, ...session } = await services.sessions.signIn(attempt, signal);
    return {
      type: json,
      body: JSON.stringify(account),
      headers: { Location: '/v1/sessions/current' },
      session,
    };
  },
});

export const refreshSession = operation({
  method: 'post',
  path: '/v1/sessions/current/refresh',
  operationId: 'refreshSession',
  summary: 'Stay signed in',
  description:
    'Renews both cookies. The refresh token before the last, within ten seconds, is two tabs at ' +
    'once; any other that was replaced was stolen, and ends the session.',
  tag: 'People',
  access: 'own-pages',
  callsPerMinute: 60,
  answer: accountAnswer,
  produces: [json],
  refuses: ['sign-in-needed'],
  examples: {},
  handle: async ({ refreshToken, source, services }) => {
    if (refreshToken === undefined) throw notSignedIn();
    const { account, ...session } = await services.sessions.refresh(refreshToken, source);
    return { type: json, body: JSON.stringify(account), session };
  },
});

export const signOut = operation({
  method: 'delete',
  path: '/v1/sessions/current',
  operationId: 'signOut',
  summary: 'Sign out',
  description: 'Ends the session; its cookies are dead at their next use.',
  tag: 'People',
  access: { roles },
  status: 204,
  produces: [json],
  examples: {},
  handle: async ({ caller, services }) => {
    await services.sessions.end(caller);
    return { session: 'ended' };
  },
});

export const chooseOrganization = operation({
  method: 'put',
  path: '/v1/sessions/current/organization',
  operationId: 'chooseOrganization',
  summary: 'Work in another organization',
  description: 'The session speaks for this organization from the next call on.',
  tag: 'People',
  access: { roles },
  body: organizationChoice,
  answer: accountAnswer,
  produces: [json],
  refuses: ['not-found'],
  examples: {},
  handle: async ({ body, caller, services }) => {
    const account = await services.sessions.choose(caller, body.organizationId);
    return { type: json, body: JSON.stringify(account) };
  },
});

export const account = operation({
  method: 'get',
  path: '/v1/account',
  operationId: 'account',
  summary: 'Who is signed in, and where',
  description: 'The person, their organizations, and their role in the present one.',
  tag: 'People',
  access: { roles },
  answer: accountAnswer,
  produces: [json],
  examples: { developer: { summary: 'A developer', answer: exampleAccount } },
  handle: async ({ caller, services }) => ({
    type: json,
    body: JSON.stringify(await services.sessions.account(caller)),
  }),
});
