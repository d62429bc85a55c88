import { ipKeyGenerator, rateLimit, type RateLimitRequestHandler } from 'express-rate-limit';
import type { DataSource } from 'typeorm';
import { Refusal } from '../refusal';
import { RateWindows } from '../services/rate-windows';

interface Limit {
  readonly name: string;
  readonly callsPerMinute: number;
  readonly database: DataSource;
}

const windowMs = 60_000;

/**
 * Counts the calls of each caller (a key, or else an address) over all processes and refuses those
 * beyond the limit. Headers follow the RateLimit header fields draft.
 */
export const rateLimiter = ({ name, callsPerMinute, database }: Limit): RateLimitRequestHandler =>
  rateLimit({
    windowMs,
    limit: callsPerMinute,
    identifier: name,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    store: new RateWindows(database, name),
    keyGenerator: (_request, response) =>
      response.locals.caller?.name ?? ipKeyGenerator(response.locals.address ?? ''),
    handler: (_request, _response, next) => {
      next(new Refusal('too-many-requests', `At most ${callsPerMinute} calls a minute.`));
    },
  });
