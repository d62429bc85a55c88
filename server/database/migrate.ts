import type { DataSource } from 'typeorm';
import { seedHandbook } from './seed-handbook';

const identifier = /^[a-z_][a-z0-9_]{0,62}$/;

/**
 * Brings the schema up to date and, where the running role is another than the owner, lets it read
 * and write rows, nothing more, and only add to those of the audit; then the handbook, which every
 * environment has. An advisory lock makes two migrations at once wait for each other.
 */
export async function migrate(database: DataSource, runningRole?: string): Promise<string[]> {
  if (runningRole !== undefined && !identifier.test(runningRole)) {
    throw new Error(`APP_ROLE: not a role name: ${runningRole}`);
  }
  const lock = database.createQueryRunner();
  await lock.query('SELECT pg_advisory_lock(7041776)');
  try {
    const done = await database.runMigrations();
    if (runningRole !== undefined) await grantRows(database, runningRole);
    await seedHandbook(database);
    return done.map(({ name }) => name);
  } finally {
    await lock.query('SELECT pg_advisory_unlock(7041776)');
    await lock.release();
  }
}

async function grantRows(database: DataSource, role: string): Promise<void> {
  await database.query(`
    GRANT USAGE ON SCHEMA public TO ${role};
    GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA public TO ${role};
    REVOKE INSERT, UPDATE, DELETE ON schema_migrations FROM ${role};
    REVOKE UPDATE, DELETE ON audit_events FROM ${role};
  `);
}
