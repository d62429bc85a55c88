import type { MigrationInterface, QueryRunner } from 'typeorm';

/** How people sign in, what they are signed in to, and when a key was last used. */
export class Sessions1764547400000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE people ADD COLUMN password_hash text;
      CREATE TABLE sessions (
        id uuid PRIMARY KEY,
        person_id uuid NOT NULL REFERENCES people,
        organization_id uuid NOT NULL REFERENCES organizations,
        refresh_digest bytea NOT NULL,
        previous_digest bytea,
        rotated_at timestamptz NOT NULL,
        created_at timestamptz NOT NULL,
        expires_at timestamptz NOT NULL,
        ended_at timestamptz
      );
      CREATE INDEX sessions_person ON sessions (person_id);
      ALTER TABLE api_keys ADD COLUMN last_used_at timestamptz;
      CREATE INDEX api_keys_newest ON api_keys (organization_id, created_at DESC, id DESC);
      DROP INDEX api_keys_organization;
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE INDEX api_keys_organization ON api_keys (organization_id);
      DROP INDEX api_keys_newest;
      ALTER TABLE api_keys DROP COLUMN last_used_at;
      DROP TABLE sessions;
      ALTER TABLE people DROP COLUMN password_hash;
    `);
  }
}
