import type { ErrorRequestHandler, Request, Response } from 'express';
import { problemTypes, type Problem, type ProblemName } from '../../shared/problem';
import { Refusal } from '../refusal';

/** Errors of the body's reader, by their own names. */
const knownErrors: Readonly<Record<string, ProblemName>> = {
  'entity.too.large': 'body-too-large',
  'request.size.invalid': 'malformed-json',
};

/** Errors of the database that mean it is away, not that the call is wrong. */
const databaseAway = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'ETIMEDOUT',
  '57P01',
  '57P02',
  '57P03',
  '53300',
  '08006',
  '08001',
]);

const text = (value: unknown, name: string): string | undefined => {
  const found: unknown =
    typeof value === 'object' && value !== null ? Reflect.get(value, name) : undefined;
  return typeof found === 'string' ? found : undefined;
};

function refusalOf(error: unknown): Refusal {
  if (error instanceof Refusal) return error;
  const known = knownErrors[text(error, 'type') ?? ''];
  if (known) return new Refusal(known);
  if (error instanceof URIError) return new Refusal('not-found');
  const code = text(error, 'code');
  if ((code && databaseAway.has(code)) || text(error, 'message')?.includes('Connection terminated'))
    return new Refusal('unavailable', 'The database does not answer. Try again in a few seconds.');
  return new Refusal('internal');
}

/** Writes a refusal as RFC 9457 problem+json. */
function sendProblem(publicUrl: string, response: Response, refusal: Refusal): void {
  const [status, title] = problemTypes[refusal.code];
  const problem: Problem = {
    type: `${publicUrl}/problems/${refusal.code}`,
    title,
    status,
    ...(refusal.detail === undefined ? {} : { detail: refusal.detail }),
    requestId: String(response.getHeader('X-Request-Id')),
    ...(refusal.errors === undefined ? {} : { errors: [...refusal.errors] }),
  };
  const wait = refusal.retryAfter ?? (status === 503 ? 5 : undefined);
  if (wait !== undefined) response.setHeader('Retry-After', String(wait));
  response
    .status(status)
    .setHeader('Cache-Control', 'no-store')
    .type('application/problem+json')
    .send(JSON.stringify(problem));
}

/** The one place where an error becomes an answer. Nothing of an unexpected error leaves. */
export const problemHandler =
  (publicUrl: string): ErrorRequestHandler =>
  (error: unknown, request: Request, response: Response, next) => {
    const refusal = refusalOf(error);
    if (refusal.code === 'internal') request.log.error({ err: error }, 'unexpected error');
    if (response.headersSent) next(error);
    else sendProblem(publicUrl, response, refusal);
  };
