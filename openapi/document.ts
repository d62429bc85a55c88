import {
  OpenAPIRegistry,
  OpenApiGeneratorV31,
  type ResponseConfig,
} from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { problem, problemTypes, type ProblemName } from '../shared/problem';
import type { Access, Operation } from '../server/http/operation';

function refusalsOfAccess(access: Access): readonly ProblemName[] {
  if (access === 'public') return [];
  if (access === 'own-pages') return ['origin-refused'];
  if ('roles' in access) return ['sign-in-needed', 'role-insufficient', 'origin-refused'];
  return ['credential-missing', 'credential-invalid', 'sign-in-needed', 'scope-insufficient'];
}

function securityOf(access: Access): Record<string, string[]>[] {
  if (access === 'public' || access === 'own-pages') return [];
  return 'roles' in access ? [{ session: [] }] : [{ key: [access.scope] }, { session: [] }];
}

/** Refusals that any operation of a kind may give. */
function refusalsOf(operation: Operation): ProblemName[] {
  const { body, query, access, callsPerMinute, anyHost, refuses = [] } = operation;
  return [
    ...(query ? (['invalid-request'] as const) : []),
    ...(body ? (['malformed-json', 'invalid-request', 'body-too-large'] as const) : []),
    ...(body ? (['unsupported-media-type'] as const) : []),
    ...refusalsOfAccess(access),
    ...(callsPerMinute ? (['too-many-requests', 'unavailable'] as const) : []),
    'not-acceptable',
    ...(anyHost ? [] : (['misdirected-request'] as const)),
    ...refuses,
  ];
}

const problemResponse = (names: readonly ProblemName[]): ResponseConfig => ({
  description: [...new Set(names.map((name) => problemTypes[name][1]))].join('; '),
  content: { 'application/problem+json': { schema: problem } },
});

const valuesOf = (operation: Operation, part: 'body' | 'answer') =>
  Object.fromEntries(
    Object.entries(operation.examples).map(([name, example]) => [
      name,
      { summary: example.summary, value: example[part] },
    ]),
  );

function contentOf(operation: Operation) {
  const { produces, answer } = operation;
  if (!answer) return {};
  const json = { schema: answer, examples: valuesOf(operation, 'answer') };
  const text = { schema: { type: 'string' as const } };
  const content = produces.map(
    (type) => [type, type === 'application/json' ? json : text] as const,
  );
  return { content: Object.fromEntries(content) };
}

const linkHeader = z.string().optional().meta({
  description: 'The next page, `rel="next"` (RFC 8288); left out on the last.',
  example: '</v1/systems?query=acid&limit=50&cursor=eyJ9>; rel="next"',
});
const etagHeader = z.string().meta({
  description: 'Strong validator of the answer, for If-None-Match.',
  example: '"kZ0a3cQ1mJq2m8v0y2b1n5h7d9f"',
});

/** Headers of success: the way to the next page, and what revalidation compares. */
function headersOf({ query, revalidates }: Operation) {
  const headers = {
    ...(query && 'cursor' in query.shape && { Link: linkHeader }),
    ...(revalidates && { ETag: etagHeader }),
  };
  return Object.keys(headers).length === 0 ? {} : { headers: z.object(headers) };
}

const unchanged = { description: 'What If-None-Match names is what would be answered' };

function responsesOf(operation: Operation) {
  const names = refusalsOf(operation);
  const statuses = [...new Set(names.map((name) => problemTypes[name][0]))].sort();
  return {
    [operation.status ?? 200]: {
      description: 'The answer',
      ...headersOf(operation),
      ...contentOf(operation),
    },
    ...(operation.revalidates && { 304: unchanged }),
    ...Object.fromEntries(
      statuses.map((status) => [
        status,
        problemResponse(names.filter((name) => problemTypes[name][0] === status)),
      ]),
    ),
  };
}

const ifNoneMatch = z.object({
  'If-None-Match': z.string().optional().meta({
    description: 'ETags of answers that the caller holds.',
    example: '"kZ0a3cQ1mJq2m8v0y2b1n5h7d9f"',
  }),
});

function requestOf(operation: Operation) {
  const { body, params, query, revalidates } = operation;
  const json = { schema: body, examples: valuesOf(operation, 'body') };
  return {
    request: {
      ...(params && { params }),
      ...(query && { query }),
      ...(revalidates && { headers: ifNoneMatch }),
      ...(body && { body: { required: true, content: { 'application/json': json } } }),
    },
  };
}

/** The OpenAPI 3.1 document of the operations. */
export function openApiDocument(operations: readonly Operation[]) {
  const registry = new OpenAPIRegistry();
  registry.registerComponent('securitySchemes', 'key', {
    type: 'http',
    scheme: 'bearer',
    description: 'An API key: `Authorization: Bearer stepwell_…`.',
  });
  registry.registerComponent('securitySchemes', 'session', {
    type: 'apiKey',
    in: 'cookie',
    name: 'stepwell_access',
    description:
      'A session of our own pages; `__Host-stepwell_access` under HTTPS. Where an Authorization ' +
      'header is sent, cookies are ignored.',
  });
  for (const operation of operations) {
    const { method, path, operationId, summary, description, tag, access } = operation;
    registry.registerPath({
      method,
      path,
      operationId,
      summary,
      description,
      tags: [tag],
      security: securityOf(access),
      ...requestOf(operation),
      responses: responsesOf(operation),
    });
  }
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: {
      title: 'Stepwell',
      version: '1',
      description:
        'Speciation of polyprotic acid–base systems. Decimals are strings, unknown fields are ' +
        'refused, and every digit of an answer is right.',
    },
    servers: [{ url: '/' }],
    tags: [
      { name: 'Compute', description: 'Answers about systems and mixtures.' },
      { name: 'Systems', description: 'The handbook and the organization’s own systems.' },
      { name: 'People', description: 'Who is signed in, and where.' },
      { name: 'Keys', description: 'API keys of the organization.' },
      { name: 'Audit', description: 'What was done in the organization, and by whom.' },
      { name: 'Service', description: 'The service itself.' },
    ],
  });
}
