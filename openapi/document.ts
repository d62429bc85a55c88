import {
  OpenAPIRegistry,
  OpenApiGeneratorV31,
  type ResponseConfig,
} from '@asteasolutions/zod-to-openapi';
import { problem, problemTypes, type ProblemName } from '../shared/problem';
import type { Operation } from '../server/http/operation';

/** Refusals that any operation of a kind may give. */
function refusalsOf({ body, access, callsPerMinute, refuses = [] }: Operation): ProblemName[] {
  return [
    ...(body ? (['malformed-json', 'invalid-request', 'body-too-large'] as const) : []),
    ...(body ? (['unsupported-media-type'] as const) : []),
    ...(access === 'public'
      ? []
      : (['credential-missing', 'credential-invalid', 'scope-insufficient'] as const)),
    ...(callsPerMinute ? (['too-many-requests', 'unavailable'] as const) : []),
    'not-acceptable',
    ...refuses,
  ];
}

const problemResponse = (names: readonly ProblemName[]): ResponseConfig => ({
  description: [...new Set(names.map((name) => problemTypes[name][1]))].join('; '),
  content: { 'application/problem+json': { schema: problem } },
});

function responsesOf(operation: Operation) {
  const names = refusalsOf(operation);
  const statuses = [...new Set(names.map((name) => problemTypes[name][0]))].sort();
  const examples = Object.fromEntries(
    Object.entries(operation.examples).map(([name, { summary, answer }]) => [
      name,
      { summary, value: answer },
    ]),
  );
  const content = Object.fromEntries(
    operation.produces.map((type) => [
      type,
      type === 'application/json'
        ? { schema: operation.answer, examples }
        : { schema: { type: 'string' as const } },
    ]),
  );
  return {
    200: { description: 'The answer', content },
    ...Object.fromEntries(
      statuses.map((status) => [
        status,
        problemResponse(names.filter((name) => problemTypes[name][0] === status)),
      ]),
    ),
  };
}

function requestOf({ body, examples }: Operation) {
  if (!body) return {};
  const bodies = Object.entries(examples).map(([name, { summary, body: value }]) => [
    name,
    { summary, value },
  ]);
  return {
    request: {
      body: {
        required: true,
        content: { 'application/json': { schema: body, examples: Object.fromEntries(bodies) } },
      },
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
  for (const operation of operations) {
    const { method, path, operationId, summary, description, tag, access } = operation;
    registry.registerPath({
      method,
      path,
      operationId,
      summary,
      description,
      tags: [tag],
      security: access === 'public' ? [] : [{ key: [access.scope] }],
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
      { name: 'Service', description: 'The service itself.' },
    ],
  });
}
