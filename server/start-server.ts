import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Logger } from 'pino';
import type { DataSource } from 'typeorm';
import { createApp } from './app';
import type { Config } from './config';
import { createDataSource } from './database/data-source';
import { createServices } from './services';
import { SmtpMailer, type MailSettings } from './services/mail/mailer';
import { PostOffice } from './services/mail/post-office';

export interface RunningServer {
  readonly port: number;
  /** Origin of links, as configured or else this machine's. */
  readonly publicUrl: string;
  /** Answers what is under way, then lets go of workers and database. */
  readonly close: () => Promise<void>;
}

/** How long calls under way may take once the server stops. */
const patienceMs = 5_000;

const postOffice = (database: DataSource, settings: MailSettings, log: Logger) =>
  new PostOffice({ database, log, mailer: new SmtpMailer(settings) });

/** Connects, listens, and answers how to stop. */
export async function startServer(config: Config, logger: Logger): Promise<RunningServer> {
  const database = await createDataSource(config.databaseUrl).initialize();
  const server = createServer({ requestTimeout: 30_000, headersTimeout: 15_000 });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject).listen(config.port, config.host, resolve);
  });
  const { port } = server.address() as AddressInfo;
  const publicUrl = config.publicUrl ?? `http://localhost:${port}`;
  const post = config.mail && postOffice(database, config.mail, logger);
  const services = createServices({ database, config, publicUrl, outbox: post });
  server.on('request', createApp({ config, publicUrl, port, services, logger }));
  if (post) post.start();
  else logger.warn('SMTP_URL is not set: admins are not told by e-mail of keys issued and revoked');
  const close = async () => {
    // A browser keeps spare connections on which nothing was ever asked; they would be waited for.
    const patience = setTimeout(() => server.closeAllConnections(), patienceMs);
    await new Promise((resolve) => {
      server.close(resolve);
      server.closeIdleConnections();
    });
    clearTimeout(patience);
    await post?.close();
    await services.close();
    await database.destroy();
  };
  return { port, publicUrl, close };
}
