import { randomBytes } from 'node:crypto';
import { Writable } from 'node:stream';
import type { DataSource } from 'typeorm';
import type { Config } from '../../server/config';
import { createDataSource } from '../../server/database/data-source';
import { demoKeyFor, seedDemo } from '../../server/database/seed';
import { migrate } from '../../server/database/migrate';
import { createLogger } from '../../server/http/logging';
import { KeyService } from '../../server/services/keys/key-service';
import { startServer, type RunningServer } from '../../server/start-server';
import { createTestDatabase } from './database';

export interface TestServer {
  readonly url: string;
  /** A good key with the scope `compute`. */
  readonly key: string;
  readonly keys: KeyService;
  /** The database, as its owner. */
  readonly database: DataSource;
  /** Every log line so far. */
  readonly logs: readonly string[];
  /** Another process's stand-in: a second server on the same database. */
  readonly startAnother: () => Promise<{ url: string; close: () => Promise<void> }>;
  readonly close: () => Promise<void>;
}

export const testPublicUrl = 'http://stepwell.test';

/** A migrated and seeded database of its own, and a real server on a free port. */
export async function startTestServer({ withApp = false } = {}): Promise<TestServer> {
  const { url, appUrl, appRole, drop } = await createTestDatabase();
  const config: Config = {
    environment: 'test',
    host: '127.0.0.1',
    port: 0,
    publicUrl: testPublicUrl,
    databaseUrl: appUrl,
    keyPeppers: new Map([[1, randomBytes(32)]]),
    webRoot: withApp ? process.env.WEB_ROOT : undefined,
    logLevel: 'info',
    computeThreads: 1,
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
  const keys = new KeyService(database, config.keyPeppers);
  const key = await demoKeyFor(keys, undefined);
  const start = () => startServer(config, createLogger('info', sink));
  const urlOf = ({ port }: RunningServer) => `http://127.0.0.1:${port}`;
  const server = await start();
  const others: RunningServer[] = [];
  return {
    url: urlOf(server),
    key,
    keys,
    database,
    logs,
    startAnother: async () => {
      const other = await start();
      others.push(other);
      return { url: urlOf(other), close: other.close };
    },
    close: async () => {
      await Promise.all([server, ...others].map((running) => running.close()));
      await database.destroy();
      await drop();
    },
  };
}
