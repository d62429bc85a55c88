import { randomUUID } from 'node:crypto';
import type { Request, Response } from 'express';
import { pino, type DestinationStream, type Logger } from 'pino';
import { pinoHttp, type HttpLogger } from 'pino-http';
import type { Config } from '../config';
import { keyPattern } from '../services/keys/key-format';

const anyKey = new RegExp(keyPattern, 'g');

/** Structured log lines on standard output; whatever looks like a key is struck from each line. */
export const createLogger = (level: Config['logLevel'], destination?: DestinationStream): Logger =>
  pino(
    {
      level,
      base: null,
      timestamp: pino.stdTimeFunctions.isoTime,
      formatters: { level: (label) => ({ level: label }) },
      hooks: { streamWrite: (line) => line.replace(anyKey, 'stepwell_[struck]') },
    },
    destination ?? pino.destination(1),
  );

const traceparent = /^00-([0-9a-f]{32})-[0-9a-f]{16}-[0-9a-f]{2}$/;

const levelOf = (_request: Request, response: Response, error?: Error) =>
  error || response.statusCode >= 500 ? 'error' : response.statusCode >= 400 ? 'warn' : 'info';

/**
 * One line a call: method, path without query, status, time, address. Headers and bodies are never logged.
 * Gives each call its id, answered as X-Request-Id.
 */
export const requestLog = (logger: Logger): HttpLogger<Request, Response> =>
  pinoHttp<Request, Response>({
    logger,
    quietReqLogger: true,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    customAttributeKeys: { reqId: 'requestId', responseTime: 'ms' },
    customLogLevel: levelOf,
    customProps: (request, { locals }) => {
      const trace = traceparent.exec(String(request.headers.traceparent))?.[1];
      return { address: locals.address, ...(trace && { trace }) };
    },
    autoLogging: { ignore: ({ url }) => url === '/livez' || url === '/readyz' },
    serializers: {
      req: ({ method, url }: { method: string; url: string }) => ({
        method,
        path: url.split('?')[0],
      }),
      res: ({ statusCode }: { statusCode: number }) => ({ status: statusCode }),
      err: ({ type, message, stack }: { type: string; message: string; stack: string }) => ({
        type,
        message,
        stack,
      }),
    },
  });
