import { Router, type Request, type RequestHandler, type Response } from 'express';
import { Refusal } from '../refusal';
import type { Services } from '../services';
import type { Caller } from '../services/keys/key-service';
import { bearerOf } from './bearer';
import { jsonBody } from './body';
import { faultsOf } from './faults';
import type { Operation } from './operation';
import { rateLimiter } from './rate-limit';

declare module 'express-serve-static-core' {
  interface Locals {
    caller?: Caller;
  }
}

const guard =
  (access: Operation['access'], services: Services): RequestHandler =>
  async (request, response, next) => {
    if (access !== 'public') {
      response.locals.caller = await bearerOf(request, response, services.keys, access.scope);
    }
    next();
  };

const agree =
  (produces: readonly string[]): RequestHandler =>
  (request, response, next) => {
    response.vary('Accept');
    const accepted = request.accepts([...produces]);
    if (accepted === false) {
      throw new Refusal('not-acceptable', `This answers as ${produces.join(' or ')}.`);
    }
    response.locals.accepted = accepted;
    next();
  };

function readBody(operation: Operation, request: Request): unknown {
  const [unknown] = Object.keys(request.query);
  if (unknown !== undefined) {
    throw new Refusal('invalid-request', `This takes no query parameter ${unknown.slice(0, 80)}.`);
  }
  if (operation.body === undefined) return undefined;
  const parsed = operation.body.safeParse(request.body, { reportInput: true });
  if (parsed.success) return parsed.data;
  const errors = faultsOf(parsed.error);
  const detail =
    errors.length === 1
      ? 'One field is not as the contract has it.'
      : `${errors.length} fields are not as the contract has them.`;
  throw new Refusal('invalid-request', detail, errors);
}

const answer =
  (operation: Operation, services: Services) =>
  async (request: Request, response: Response): Promise<void> => {
    const reply = await operation.handle({
      body: readBody(operation, request),
      services,
      accepted: String(response.locals.accepted),
      caller: response.locals.caller,
    });
    response.status(reply.status ?? 200).setHeader('Content-Type', reply.type);
    if (!response.hasHeader('Cache-Control')) response.setHeader('Cache-Control', 'no-store');
    for (const [name, value] of Object.entries(reply.headers ?? {}))
      response.setHeader(name, value);
    response.end(reply.body);
  };

const otherMethods = (methods: readonly string[]): RequestHandler => {
  const allow = [...methods, ...(methods.includes('GET') ? ['HEAD'] : []), 'OPTIONS'].join(', ');
  return (request, response, next) => {
    response.setHeader('Allow', allow);
    if (request.method === 'OPTIONS') response.status(204).end();
    else next(new Refusal('method-not-allowed', `This address takes ${allow}.`));
  };
};

/** Mounts the operations: guard, limit, negotiation, body, answer; other methods are a 405. */
export function operationsRouter(operations: readonly Operation[], services: Services): Router {
  const router = Router({ caseSensitive: true, strict: true });
  for (const operation of operations) {
    const { method, path, access, callsPerMinute, produces, body, operationId } = operation;
    const limit = callsPerMinute && {
      name: operationId,
      callsPerMinute,
      database: services.database,
    };
    router[method](
      path,
      guard(access, services),
      ...(limit ? [rateLimiter(limit)] : []),
      agree(produces),
      ...(body ? [jsonBody] : []),
      answer(operation, services),
    );
  }
  for (const path of new Set(operations.map((operation) => operation.path))) {
    const here = operations.filter((operation) => operation.path === path);
    router.all(path, otherMethods(here.map(({ method }) => method.toUpperCase())));
  }
  return router;
}
