import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type Express } from 'express';
import type { Logger } from 'pino';
import { openApiDocument } from '../openapi/document';
import type { Config } from './config';
import { noteAddress } from './http/client-address';
import { ownHosts, requireOwnHost } from './http/host';
import { requestLog } from './http/logging';
import { ownOrigins } from './http/origin';
import { problemHandler } from './http/problem-response';
import { operationsRouter } from './http/router';
import { securityHeaders, styleHashes } from './http/security-headers';
import { readIndex, webApp } from './http/web-app';
import { SessionCookies } from './http/session-cookies';
import { Refusal } from './refusal';
import { operations } from './routes';
import { apiDescription } from './routes/api-description';
import { problemPages } from './routes/problem-pages';
import type { Services } from './services';

interface Parts {
  readonly config: Config;
  readonly publicUrl: string;
  /** The port listened on. */
  readonly port: number;
  readonly services: Services;
  readonly logger: Logger;
}

/** The Express app from its parts. */
export function createApp({ config, publicUrl, port, services, logger }: Parts): Express {
  const { webRoot } = config;
  const isProduction = config.environment === 'production';
  const https = publicUrl.startsWith('https:');
  const index = webRoot === undefined ? '' : readIndex(webRoot);
  const pages = {
    cookies: new SessionCookies(https),
    origins: ownOrigins(publicUrl, isProduction),
  };
  const hosts = ownHosts({ publicUrl, port, isProduction });
  const anyHost = new Set(operations.filter((one) => one.anyHost).map(({ path }) => path));
  const app = express();
  app.disable('x-powered-by').disable('etag').set('query parser', 'simple');
  app.use(noteAddress(config.trustedProxies));
  app.use(requestLog(logger));
  app.use(securityHeaders({ styles: styleHashes(index), https }));
  app.use(requireOwnHost(hosts, anyHost));
  app.use(compression());
  app.use(cookieParser());
  app.use(operationsRouter(operations, services, pages));
  app.use(apiDescription({ document: openApiDocument(operations), https }));
  app.use(problemPages());
  if (webRoot !== undefined) app.use(webApp(webRoot, index));
  app.use(() => {
    throw new Refusal('not-found', 'Look at /openapi.json for the addresses there are.');
  });
  app.use(problemHandler(publicUrl));
  return app;
}
