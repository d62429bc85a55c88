import { z } from 'zod';
import { issuedKey, keyAnswer, keyList, keyRequest } from '../../shared/keys';
import { pageQuery } from '../../shared/page';
import { nextLink, readPlace, writePlace } from '../http/cursor';
import { operation } from '../http/operation';

/** A scientist computes and has no keys. */
const keepers = { roles: ['admin', 'developer'] } as const;

const json = 'application/json';
const params = z.strictObject({
  id: z.uuid().meta({
    description: 'Identifier of the key’s row.',
    example: '0d2d7a0e-5a43-4f0f-9c7e-2f1f3c1f7d10',
  }),
});

export const issueKey = operation({
  method: 'post',
  path: '/v1/keys',
  operationId: 'issueKey',
  summary: 'Issue an API key',
  description: 'The answer shows the key once. Developers and admins issue keys.',
  tag: 'Keys',
  access: keepers,
  status: 201,
  body: keyRequest,
  answer: issuedKey,
  produces: [json],
  refuses: ['role-insufficient'],
  examples: {},
  handle: async ({ body, caller, services }) => {
    const issued = await services.keyConsole.issue(caller, body);
    const headers = { Location: `/v1/keys/${issued.id}` };
    return { type: json, body: JSON.stringify(issued), headers };
  },
});

export const listKeys = operation({
  method: 'get',
  path: '/v1/keys',
  operationId: 'listKeys',
  summary: 'The organization’s keys',
  description: 'Newest first: an admin sees all of them, a developer their own.',
  tag: 'Keys',
  access: keepers,
  query: z.strictObject(pageQuery),
  answer: keyList,
  produces: [json],
  examples: {},
  handle: async ({ query: { limit, cursor }, caller, services }) => {
    const after = readPlace(cursor);
    const { items, hasMore } = await services.keyConsole.list(caller, { limit, after });
    const last = hasMore ? items.at(-1) : undefined;
    const next = last && writePlace(last.createdAt, last.id);
    return {
      type: json,
      body: JSON.stringify({ items }),
      ...(next && { headers: nextLink('/v1/keys', { limit: `${limit}`, cursor: next }) }),
    };
  },
});

export const readKey = operation({
  method: 'get',
  path: '/v1/keys/{id}',
  operationId: 'readKey',
  summary: 'One key',
  description: 'What is known of a key: never the key itself.',
  tag: 'Keys',
  access: keepers,
  params,
  answer: keyAnswer,
  produces: [json],
  refuses: ['not-found'],
  examples: {},
  handle: async ({ params: { id }, caller, services }) => ({
    type: json,
    body: JSON.stringify(await services.keyConsole.read(caller, id)),
  }),
});

export const revokeKey = operation({
  method: 'post',
  path: '/v1/keys/{id}/revocation',
  operationId: 'revokeKey',
  summary: 'Revoke a key',
  description: 'For good, from its next call on. Revoking twice changes nothing.',
  tag: 'Keys',
  access: keepers,
  params,
  answer: keyAnswer,
  produces: [json],
  refuses: ['not-found'],
  examples: {},
  handle: async ({ params: { id }, caller, services }) => ({
    type: json,
    body: JSON.stringify(await services.keyConsole.revoke(caller, id)),
  }),
});
