import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Who calls: organizations, people, memberships, API keys; and the windows of rate limits. */
export class OrganizationsAndKeys1764547200000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE organizations (
        id uuid PRIMARY KEY,
        name text NOT NULL CHECK (name <> ''),
        created_at timestamptz NOT NULL DEFAULT now()
      );
      CREATE TABLE people (
        id uuid PRIMARY KEY,
        email text NOT NULL CHECK (email <> ''),
        name text NOT NULL CHECK (name <> ''),
        created_at timestamptz NOT NULL DEFAULT now()
      );
      CREATE UNIQUE INDEX people_email ON people (lower(email));
      CREATE TABLE memberships (
        person_id uuid NOT NULL REFERENCES people,
        organization_id uuid NOT NULL REFERENCES organizations,
        role text NOT NULL CHECK (role IN ('admin', 'developer', 'scientist')),
        PRIMARY KEY (person_id, organization_id)
      );
      CREATE INDEX memberships_organization ON memberships (organization_id);
      CREATE TABLE api_keys (
        id uuid PRIMARY KEY,
        public_id text NOT NULL UNIQUE CHECK (public_id ~ '^[a-z2-7]{12}$'),
        organization_id uuid NOT NULL REFERENCES organizations,
        issuer_id uuid NOT NULL REFERENCES people,
        name text NOT NULL CHECK (name <> ''),
        scopes text[] NOT NULL CHECK (cardinality(scopes) > 0),
        pepper_version integer NOT NULL,
        digest bytea NOT NULL CHECK (octet_length(digest) = 32),
        created_at timestamptz NOT NULL DEFAULT now(),
        expires_at timestamptz NOT NULL,
        revoked_at timestamptz
      );
      CREATE INDEX api_keys_organization ON api_keys (organization_id);
      -- Counts that may be lost in a crash: unlogged, for speed.
      CREATE UNLOGGED TABLE rate_windows (
        caller text PRIMARY KEY,
        hits integer NOT NULL,
        resets_at timestamptz NOT NULL
      );
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      DROP TABLE rate_windows, api_keys, memberships, people, organizations;
    `);
  }
}
