import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import type { Mail } from './letter';

/** Where mail is left to be sent. A service without SMTP_URL has none. */
export interface Outbox {
  /**
   * Leaves mail within the transaction of the act it tells of: both happen or neither, and a crash
   * after that loses neither.
   */
  readonly leave: (manager: EntityManager, mails: readonly Mail[]) => Promise<void>;
  /** Sends what was left, once its transaction is through. Forgotten, it is sent a little later. */
  readonly wake: () => void;
}

/** Puts mail into the table, due at once. */
export async function insertMail(
  manager: EntityManager,
  mails: readonly Mail[],
  now: Date,
): Promise<void> {
  for (const { to, subject, text } of mails) {
    await manager.query(
      `INSERT INTO mail_outbox (id, recipient, subject, body, created_at, next_attempt_at)
       VALUES ($1, $2, $3, $4, $5, $5)`,
      [randomUUID(), to, subject, text, now],
    );
  }
}
