import { createDataSource } from './database/data-source';
import { migrate } from './database/migrate';

/** `node dist/server/migrate.js`: the schema, by the role that owns it. */
async function main(): Promise<void> {
  const url = process.env.MIGRATION_DATABASE_URL || process.env.DATABASE_URL;
  if (!url) throw new Error('MIGRATION_DATABASE_URL or DATABASE_URL is missing');
  const database = await createDataSource(url).initialize();
  try {
    const names = await migrate(database, process.env.APP_ROLE || undefined);
    process.stdout.write(`${names.length} migrations run\n`);
  } finally {
    await database.destroy();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`Migration failed: ${error instanceof Error ? error.message : 'unknown'}\n`);
  process.exitCode = 1;
});
