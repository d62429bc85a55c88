import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Logger } from 'pino';
import { createApp } from './app';
import type { Config } from './config';
import { createDataSource } from './database/data-source';
import { createServices } from './services';

export interface RunningServer {
  readonly port: number;
  /** Origin of links, as configured or else this machine's. */
  readonly publicUrl: string;
  /** Answers what is under way, then lets go of workers and database. */
  readonly close: () => Promise<void>;
}

/** How long calls under way may take once the server stops. */
const patienceMs = 5_000;

/** Connects, listens, and answers how to stop. */
export async function startServer(config: Config, logger: Logger): Promise<RunningServer> {
  const database = await createDataSource(config.databaseUrl).initialize();
  const server = createServer({ requestTimeout: 30_000, headersTimeout: 15_000 });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject).listen(config.port, config.host, resolve);
  });
  const { port } = server.address() as AddressInfo;
  const publicUrl = config.publicUrl ?? `http://localhost:${port}`;
  const services = createServices(database, config, publicUrl);
  server.on('request', createApp({ config, publicUrl, port, services, logger }));
  const close = async () => {
    // A browser keeps spare connections on which nothing was ever asked; they would be waited for.
    const patience = setTimeout(() => server.closeAllConnections(), patienceMs);
    await new Promise((resolve) => {
      server.close(resolve);
      server.closeIdleConnections();
    });
    clearTimeout(patience);
    await services.close();
    await database.destroy();
  };
  return { port, publicUrl, close };
}
