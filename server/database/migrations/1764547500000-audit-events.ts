import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * Who did what, when and from where. No foreign keys: an event outlives what it tells of. Whatever
 * the privileges, a trigger refuses to change or remove what was written; the moment is the
 * database's own, so that processes with clocks apart write in one order.
 */
export class AuditEvents1764547500000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE audit_events (
        id uuid PRIMARY KEY,
        organization_id uuid,
        person_id uuid,
        key_id uuid,
        session_id uuid,
        address text,
        request_id text,
        act text NOT NULL CHECK (act ~ '^[a-z-]+\\.[a-z-]+$'),
        subject_kind text NOT NULL CHECK (subject_kind <> ''),
        subject_id text,
        details jsonb NOT NULL CHECK (jsonb_typeof(details) = 'object'),
        -- To the millisecond, as the cursors of pages are.
        at timestamptz(3) NOT NULL DEFAULT clock_timestamp()
      );
      CREATE INDEX audit_events_newest ON audit_events (organization_id, at DESC, id DESC);
      CREATE INDEX audit_events_person ON audit_events (organization_id, person_id, at DESC, id DESC);
      CREATE INDEX audit_events_subject ON audit_events (organization_id, subject_id, at DESC, id DESC);
      CREATE FUNCTION refuse_change_of_audit_events() RETURNS trigger LANGUAGE plpgsql AS $$
        BEGIN
          RAISE EXCEPTION 'audit_events is only added to' USING ERRCODE = 'insufficient_privilege';
        END
      $$;
      CREATE TRIGGER audit_events_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON audit_events
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change_of_audit_events();
      ALTER TABLE audit_events ENABLE ALWAYS TRIGGER audit_events_append_only;
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      DROP TABLE audit_events;
      DROP FUNCTION refuse_change_of_audit_events;
    `);
  }
}
