import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Mail that is to be sent: left in the transaction of what it tells of, gone once it is sent. */
export class MailOutbox1764547600000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE mail_outbox (
        id uuid PRIMARY KEY,
        recipient text NOT NULL,
        subject text NOT NULL,
        body text NOT NULL,
        created_at timestamptz NOT NULL,
        attempts integer NOT NULL DEFAULT 0,
        -- Null once it is given up.
        next_attempt_at timestamptz,
        last_error text
      );
      CREATE INDEX mail_outbox_due ON mail_outbox (next_attempt_at);
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE mail_outbox');
  }
}
