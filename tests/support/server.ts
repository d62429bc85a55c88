import { randomBytes } from 'node:crypto';
import { Writable } from 'node:stream';
import type { DataSource } from 'typeorm';
import type { Config } from '../../server/config';
import { createDataSource } from '../../server/database/data-source';
import { migrate } from '../../server/database/migrate';
import { createLogger } from '../../server/http/logging';
import { createServices, type Services } from '../../server/services';
import { demoKeyFor, seedDemo } from '../../server/services/demo/seed-demo';
import { startServer, type RunningServer } from '../../server/start-server';
import { createTestDatabase } from './database';

export interface TestServer {
  readonly url: string;
  /** A good key with the scopes `compute` and `systems:read`. */
  readonly key: string;
  /** The database, as its owner. */
  readonly database: DataSource;
  /** The same services that the server has, over the same database. */
  readonly services: Services;
  /** Every log line so far. */
  readonly logs: readonly string[];
  /** Another process's stand-in: a second server on the same database. */
  readonly startAnother: () => Promise<{ url: string; close: () => Promise<void> }>;
  readonly close: () => Promise<void>;
}

interface Wanted {
  readonly withApp?: boolean;
  /** Where the environment is another than usual. */
  readonly config?: Partial<Config>;
}

/** A migrated and seeded database of its own, and a real server on a free port. */
export async function startTestServer({
  withApp = false,
  config: changes = {},
}: Wanted = {}): Promise<TestServer> {
  const { url, appUrl, appRole, drop } = await createTestDatabase();
  const config: Config = {
    environment: 'test',
    host: '127.0.0.1',
    port: 0,
    publicUrl: undefined,
    trustedProxies: [],
    mail: undefined,
    databaseUrl: appUrl,
    keyPeppers: new Map([[1, randomBytes(32)]]),
    sessionSecret: randomBytes(32),
    webRoot: withApp ? process.env.WEB_ROOT : undefined,
    logLevel: 'info',
    computeThreads: 1,
    ...changes,
  };
  const logs: string[] = [];
  const sink = new Writable({
    write: (chunk: Buffer, _encoding, done) => {
      logs.push(chunk.toString());
      done();
    },
  });
  const database = await createDataSource(url).initialize();
  await migrate(database, appRole);
  await seedDemo(database);
  const services = createServices({ database, config, publicUrl: 'http://localhost' });
  const key = await demoKeyFor(services, undefined);
  const start = () => startServer(config, createLogger('info', sink));
  const server = await start();
  const others: RunningServer[] = [];
  return {
    url: server.publicUrl,
    key,
    database,
    services,
    logs,
    startAnother: async () => {
      const other = await start();
      others.push(other);
      return { url: other.publicUrl, close: other.close };
    },
    close: async () => {
      await Promise.all([server, ...others].map((running) => running.close()));
      await services.close();
      await database.destroy();
      await drop();
    },
  };
}
