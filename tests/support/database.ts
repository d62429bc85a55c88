import { randomBytes } from 'node:crypto';
import { Client } from 'pg';
import { given } from './environment';

export interface TestDatabase {
  /** As its owner, who may make the schema. */
  readonly url: string;
  /** As the role of a running server, which has only what the migrations grant. */
  readonly appUrl: string;
  /** Name of that role. */
  readonly appRole: string;
  readonly drop: () => Promise<void>;
}

const appRole = 'stepwell_app';

async function administer(statement: string): Promise<void> {
  const client = new Client({ connectionString: given('TEST_DATABASE_URL') });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}

/** An empty database of its own, so that test files run side by side and share nothing. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const name = `stepwell_${randomBytes(8).toString('hex')}`;
  await administer(`CREATE DATABASE ${name}`);
  const url = new URL(given('TEST_DATABASE_URL'));
  url.pathname = `/${name}`;
  const appUrl = new URL(url);
  appUrl.username = appRole;
  return {
    url: url.href,
    appUrl: appUrl.href,
    appRole,
    drop: () => administer(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`),
  };
}
