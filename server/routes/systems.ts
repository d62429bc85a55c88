import { z } from 'zod';
import { fractionsAnswer, fractionsQuery, fractionsRequest } from '../../shared/fractions';
import { limits } from '../../shared/limits';
import {
  storedSystem,
  systemList,
  systemsQuery,
  type SystemsQuery,
} from '../../shared/stored-system';
import { systemReference } from '../../shared/system';
import { nextLink, readCursor, writeCursor } from '../http/cursor';
import { operation, type Reply } from '../http/operation';
import type { Services } from '../services';
import { place, type Reader } from '../services/systems/search-systems';
import { summaryOf } from '../services/systems/stored-system';
import { exampleSystem } from './example-systems';
import { computeReply, computeTerms, curveForms, exampleOf } from './compute';

const json = 'application/json';

const params = z.strictObject({ id: systemReference });

/** A cursor is good for the query it was made for. */
const positionOf = (query: string | undefined) =>
  z.strictObject({ query: z.literal(query ?? null), after: place });

async function listed(
  path: string,
  { query, limit, cursor }: SystemsQuery,
  reader: Reader,
  services: Services,
): Promise<Reply> {
  const after = cursor === undefined ? undefined : readCursor(cursor, positionOf(query)).after;
  const { items, last } = await services.systems.list(reader, { query, limit, after });
  const next = last && writeCursor({ query: query ?? null, after: last });
  const again = { ...(query === undefined ? {} : { query }), limit: `${limit}` };
  const headers = next ? nextLink(path, { ...again, cursor: next }) : {};
  return { type: json, body: JSON.stringify({ items }), headers };
}

const read = async (id: string, reader: Reader, services: Services): Promise<Reply> => ({
  type: json,
  body: JSON.stringify(await services.systems.read(reader, id)),
});

const finding = {
  method: 'get',
  tag: 'Systems',
  query: systemsQuery,
  answer: systemList,
  produces: [json],
  examples: {
    byCas: {
      summary: 'Citric acid by its CAS number',
      query: { query: '77-92-9' },
      answer: { items: [summaryOf(exampleSystem('citric-acid'))] },
    },
    byFormula: {
      summary: 'By the formula of a form',
      query: { query: 'H2PO4^-', limit: '5' },
      answer: { items: [summaryOf(exampleSystem('phosphoric-acid'))] },
    },
  },
} as const;

const reading = {
  method: 'get',
  tag: 'Systems',
  params,
  answer: storedSystem,
  produces: [json],
  refuses: ['not-found'],
  revalidates: true,
  examples: {
    boricAcid: {
      summary: 'Boric acid',
      params: { id: 'boric-acid' },
      answer: exampleSystem('boric-acid'),
    },
  },
} as const;

const pages =
  'Follow `Link: rel="next"` for more; nothing is repeated or left out while systems come and go.';

export const listSystems = operation({
  ...finding,
  path: '/v1/systems',
  operationId: 'listSystems',
  summary: 'Find systems by name, alias, formula or CAS number',
  description: `The handbook’s and the organization’s own, best matches first; all by name without a query. ${pages}`,
  access: { scope: 'systems:read' },
  callsPerMinute: limits.keyedCallsPerMinute,
  handle: ({ query, caller, services }) =>
    listed('/v1/systems', query, caller.organizationId, services),
});

export const readSystem = operation({
  ...reading,
  path: '/v1/systems/{id}',
  operationId: 'readSystem',
  summary: 'One system with every determination',
  description:
    'Each constant with its kind, temperature, medium, source and provenance. `id@2` reads a ' +
    'revision.',
  access: { scope: 'systems:read' },
  callsPerMinute: limits.keyedCallsPerMinute,
  handle: ({ params: { id }, caller, services }) => read(id, caller.organizationId, services),
});

const tris = exampleOf('fractions', fractionsRequest)('Tris', {
  system: { id: 'tris' },
  pH: '7.4',
  digits: 10,
});

export const systemFractions = operation({
  method: 'get',
  path: '/v1/systems/{id}/fractions',
  operationId: 'systemFractions',
  summary: 'Species fractions of a stored system, in one line',
  description: 'The answer that POST /v1/fractions gives for the same system, pH and digits.',
  tag: 'Compute',
  access: { scope: 'compute' },
  callsPerMinute: limits.keyedCallsPerMinute,
  params,
  query: fractionsQuery,
  answer: fractionsAnswer,
  produces: curveForms,
  refuses: ['not-found', 'no-answer', 'over-limit'],
  examples: {
    tris: {
      summary: 'Tris at pH 7.4',
      params: { id: 'tris' },
      query: { pH: '7.4', digits: '10' },
      answer: tris.answer,
    },
  },
  handle: async ({ params: { id }, query, caller, services, ...asked }) => {
    const terms = computeTerms(caller.organizationId, limits.cost, asked);
    const answer = await services.compute.answerAbout(id, query, terms);
    return computeReply(answer, asked.accepted);
  },
});

export const listPublicSystems = operation({
  ...finding,
  path: '/v1/public/systems',
  operationId: 'listPublicSystems',
  summary: 'The same over the handbook, without a key',
  description: `What the public Curves page searches. ${pages}`,
  access: 'public',
  callsPerMinute: limits.publicCallsPerMinute,
  handle: ({ query, services }) => listed('/v1/public/systems', query, undefined, services),
});

export const readPublicSystem = operation({
  ...reading,
  path: '/v1/public/systems/{id}',
  operationId: 'readPublicSystem',
  summary: 'One entry of the handbook, without a key',
  description: 'What the public Curves page reads.',
  access: 'public',
  callsPerMinute: limits.publicCallsPerMinute,
  handle: ({ params: { id }, services }) => read(id, undefined, services),
});
