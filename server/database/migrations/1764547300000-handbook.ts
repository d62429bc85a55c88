import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * Stored systems: the handbook's, which belong to no organization, and organizations' own. A change
 * makes a new revision beside the old ones, so that a pinned revision can be computed with for good.
 */
export class Handbook1764547300000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE systems (
        id text COLLATE "C" PRIMARY KEY
          CHECK (id ~ '^[a-z0-9]+(-[a-z0-9]+)*$' AND length(id) <= 80),
        -- NULL: the handbook.
        organization_id uuid REFERENCES organizations,
        -- The present one.
        revision integer NOT NULL CHECK (revision > 0),
        -- The present name as lists are sorted by it.
        sort_name text COLLATE "C" NOT NULL CHECK (sort_name <> '')
      );
      CREATE INDEX systems_organization ON systems (organization_id);
      CREATE TABLE system_revisions (
        system_id text COLLATE "C" REFERENCES systems,
        revision integer CHECK (revision > 0),
        name text NOT NULL CHECK (name <> ''),
        aliases text[] NOT NULL,
        formula text,
        cas text CHECK (cas ~ '^[1-9][0-9]{1,6}-[0-9]{2}-[0-9]$'),
        note text,
        fully_protonated_charge integer NOT NULL,
        -- Formula of each form, fully protonated first; NULL where unknown.
        species text[] NOT NULL CHECK (cardinality(species) BETWEEN 2 AND 65),
        -- SHA-256 of all that the revision says: what a seed compares.
        digest bytea NOT NULL CHECK (octet_length(digest) = 32),
        created_at timestamptz NOT NULL DEFAULT now(),
        PRIMARY KEY (system_id, revision)
      );
      ALTER TABLE systems ADD FOREIGN KEY (id, revision)
        REFERENCES system_revisions (system_id, revision) DEFERRABLE INITIALLY DEFERRED;
      CREATE TABLE system_constants (
        system_id text COLLATE "C",
        revision integer,
        -- Determinations in order: the first is the preferred one.
        determination integer CHECK (determination > 0),
        step integer CHECK (step BETWEEN 1 AND 64),
        listed_as text,
        value numeric NOT NULL CHECK (value BETWEEN -50 AND 70),
        kind text NOT NULL CHECK (kind IN ('thermodynamic', 'mixed', 'concentration')),
        temperature numeric NOT NULL,
        ionic_strength numeric CHECK (ionic_strength >= 0),
        uncertainty numeric CHECK (uncertainty >= 0),
        delta_h numeric,
        delta_cp numeric,
        approximate boolean NOT NULL,
        estimate boolean NOT NULL,
        source text NOT NULL CHECK (source <> ''),
        provenance text NOT NULL CHECK (provenance IN ('read', 'recalled', 'stated')),
        provenance_note text,
        PRIMARY KEY (system_id, revision, determination, step),
        FOREIGN KEY (system_id, revision) REFERENCES system_revisions,
        CHECK (kind <> 'thermodynamic' OR ionic_strength IS NOT DISTINCT FROM 0)
      );
      -- What the present revision is found by.
      CREATE TABLE system_terms (
        system_id text COLLATE "C" REFERENCES systems,
        kind text CHECK (kind IN ('name', 'formula', 'cas')),
        term text COLLATE "C" CHECK (term <> ''),
        PRIMARY KEY (system_id, kind, term)
      );
      CREATE INDEX system_terms_term ON system_terms (term, kind);
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE systems DROP CONSTRAINT systems_id_revision_fkey;
      DROP TABLE system_terms, system_constants, system_revisions, systems;
    `);
  }
}
