import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Logger } from 'pino';
import { createApp } from './app';
import type { Config } from './config';
import { createDataSource } from './database/data-source';
import { ComputePool } from './services/compute/compute-pool';
import { KeyService } from './services/keys/key-service';

export interface RunningServer {
  readonly port: number;
  /** Answers what is under way, then lets go of workers and database. */
  readonly close: () => Promise<void>;
}

/** Connects, listens, and answers how to stop. */
export async function startServer(config: Config, logger: Logger): Promise<RunningServer> {
  const database = await createDataSource(config.databaseUrl).initialize();
  const compute = new ComputePool(config.computeThreads);
  const keys = new KeyService(database, config.keyPeppers);
  const app = createApp({ config, services: { compute, keys, database }, logger });
  const server = createServer({ requestTimeout: 30_000, headersTimeout: 15_000 }, app);
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject).listen(config.port, config.host, resolve);
  });
  const close = async () => {
    await new Promise((resolve) => {
      server.close(resolve);
      server.closeIdleConnections();
    });
    await compute.close();
    await database.destroy();
  };
  return { port: (server.address() as AddressInfo).port, close };
}
