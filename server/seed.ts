import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { readConfig } from './config';
import { createDataSource } from './database/data-source';
import { demoKeyFor, seedDemo } from './services/demo/seed-demo';
import { KeyConsole } from './services/keys/key-console';
import { KeyDigests } from './services/keys/key-digest';
import { KeyGuard } from './services/keys/key-guard';

/**
 * `node dist/server/seed.js`: the demo organizations, and a key for the first call in
 * DEMO_KEY_FILE, readable by its owner alone. Never in production.
 */
async function main(): Promise<void> {
  const config = readConfig(process.env);
  if (config.environment === 'production') throw new Error('Production has no demo data.');
  const file = process.env.DEMO_KEY_FILE;
  const database = await createDataSource(config.databaseUrl).initialize();
  try {
    await seedDemo(database);
    if (!file) return;
    const held = existsSync(file) ? readFileSync(file, 'utf8').trim() : undefined;
    const digests = new KeyDigests(config.keyPeppers);
    const parts = {
      keys: new KeyGuard(database, digests),
      keyConsole: new KeyConsole(database, digests),
    };
    const key = await demoKeyFor(parts, held);
    if (key !== held) writeFileSync(file, `${key}\n`, { mode: 0o600 });
  } finally {
    await database.destroy();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`Seeding failed: ${error instanceof Error ? error.message : 'unknown'}\n`);
  process.exitCode = 1;
});
