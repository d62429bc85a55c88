import { Router, type Request, type RequestHandler, type Response } from 'express';
import { z, type ZodType } from 'zod';
import type { Fault } from '../../shared/problem';
import { Refusal } from '../refusal';
import type { Services } from '../services';
import type { Caller, CallSource } from '../services/caller';
import { jsonBody } from './body';
import { callerOf, type OwnPages } from './caller';
import { revalidated } from './etag';
import { faultsOf, queryFaultsOf } from './faults';
import type { Operation, Reply } from './operation';
import { rateLimiter } from './rate-limit';

declare module 'express-serve-static-core' {
  interface Locals {
    caller?: Caller | undefined;
  }
}

const guard =
  ({ access }: Operation, services: Services, pages: OwnPages): RequestHandler =>
  async (request, response, next) => {
    response.locals.caller = await callerOf(request, response, access, services, pages);
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

function parsed(schema: ZodType, value: unknown, faults: (error: z.ZodError) => Fault[]): unknown {
  const result = schema.safeParse(value, { reportInput: true });
  if (result.success) return result.data;
  const errors = faults(result.error);
  const detail =
    errors.length === 1
      ? 'One field is not as the contract has it.'
      : `${errors.length} fields or more are not as the contract has them.`;
  throw new Refusal('invalid-request', detail, errors);
}

const noQuery = z.strictObject({});

function read({ params, query, body }: Operation, request: Request) {
  const path = params?.safeParse(request.params);
  if (path?.success === false) throw new Refusal('not-found', 'There is no such thing here.');
  return {
    params: path?.data,
    query: parsed(query ?? noQuery, request.query, queryFaultsOf),
    body: body && parsed(body, request.body, faultsOf),
  };
}

function send(response: Response, reply: Reply, status: number, pages: OwnPages): void {
  response.status(reply.status ?? status);
  if (reply.type !== undefined) response.setHeader('Content-Type', reply.type);
  response.setHeader('Cache-Control', 'no-store');
  for (const [name, value] of Object.entries(reply.headers ?? {})) response.setHeader(name, value);
  if (reply.session === 'ended') pages.cookies.clear(response);
  else if (reply.session) pages.cookies.set(response, reply.session);
  response.end(reply.body);
}

function goneSignal(response: Response): AbortSignal {
  const gone = new AbortController();
  response.once('close', () => gone.abort());
  return gone.signal;
}

const sourceOf = (response: Response): CallSource => ({
  address: response.locals.address ?? '',
  requestId: String(response.getHeader('X-Request-Id')),
});

const answer =
  (operation: Operation, services: Services, pages: OwnPages) =>
  async (request: Request, response: Response): Promise<void> => {
    const { caller } = response.locals;
    const source = sourceOf(response);
    const call = {
      ...read(operation, request),
      services,
      accepted: String(response.locals.accepted),
      caller: caller && { ...caller, ...source },
      source,
      signal: goneSignal(response),
      refreshToken: pages.cookies.read(request).refresh,
    };
    // Its own declaration gave the handler its types; the guard and `read` have made them true.
    const reply = await operation.handle(call as never);
    const asked = {
      ifNoneMatch: request.headers['if-none-match'],
      shared: operation.access === 'public',
    };
    const sent = operation.revalidates ? revalidated(reply, asked) : reply;
    send(response, sent, operation.status ?? 200, pages);
  };

const otherMethods = (methods: readonly string[]): RequestHandler => {
  const allow = [...methods, ...(methods.includes('GET') ? ['HEAD'] : []), 'OPTIONS'].join(', ');
  return (request, response, next) => {
    response.setHeader('Allow', allow);
    if (request.method === 'OPTIONS') response.status(204).end();
    else next(new Refusal('method-not-allowed', `This address takes ${allow}.`));
  };
};

const expressPath = (path: string) => path.replace(/\{(\w+)\}/g, ':$1');

/** Mounts the operations: guard, limit, negotiation, reading, answer; other methods are a 405. */
export function operationsRouter(
  operations: readonly Operation[],
  services: Services,
  pages: OwnPages,
): Router {
  const router = Router({ caseSensitive: true, strict: true });
  for (const operation of operations) {
    const { method, path, callsPerMinute, produces, body, operationId } = operation;
    const limit = callsPerMinute && {
      name: operationId,
      callsPerMinute,
      database: services.database,
    };
    router[method](
      expressPath(path),
      guard(operation, services, pages),
      ...(limit ? [rateLimiter(limit)] : []),
      agree(produces),
      ...(body ? [jsonBody] : []),
      answer(operation, services, pages),
    );
  }
  for (const path of new Set(operations.map((operation) => operation.path))) {
    const here = operations.filter((operation) => operation.path === path);
    router.all(expressPath(path), otherMethods(here.map(({ method }) => method.toUpperCase())));
  }
  return router;
}
