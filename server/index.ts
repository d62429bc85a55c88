import { ConfigError, readConfig } from './config';
import { createLogger } from './http/logging';
import { startServer } from './start-server';

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const logger = createLogger(config.logLevel);
  const server = await startServer(config, logger);
  logger.info({ host: config.host, port: server.port }, 'listening');
  let stopping = false;
  const stop = (signal: NodeJS.Signals) => {
    if (stopping) return;
    stopping = true;
    logger.info({ signal }, 'stopping');
    void server.close().then(() => logger.info('stopped'));
  };
  process.on('SIGINT', stop).on('SIGTERM', stop);
}

main().catch((error: unknown) => {
  const known = error instanceof ConfigError;
  const message = error instanceof Error ? (known ? error.message : error.stack) : String(error);
  process.stderr.write(`${message}\n`);
  process.exitCode = 1;
  // A database that cannot be reached leaves timers behind; there is nothing left to finish.
  process.exit();
});
