import type { DataSource } from 'typeorm';
import type { Mail } from './letter';

/** Tries of one mail, over some twenty hours. */
const mostAttempts = 12;
/** Days that a mail which nobody took stays to be looked at. */
const keptDays = 30;

export interface Claimed extends Mail {
  readonly id: string;
  readonly attempts: number;
}

interface Row {
  readonly id: string;
  readonly recipient: string;
  readonly subject: string;
  readonly body: string;
  readonly attempts: number;
}

/** The rows of the outbox, as whoever sends them uses them. */
export class OutboxTable {
  constructor(
    private readonly database: DataSource,
    private readonly now: () => Date,
  ) {}

  /**
   * Takes up to `most` that are due. Each becomes due again after 2, 4, 8 … minutes, four hours at
   * most: by then it was sent and is gone, or it failed, or whoever took it has died. Processes
   * that ask at once get different ones.
   */
  async claim(most: number): Promise<Claimed[]> {
    const [rows] = await this.database.query<[Row[], number]>(
      `UPDATE mail_outbox SET
         attempts = attempts + 1,
         next_attempt_at = $1::timestamptz + least(power(2, attempts + 1), 240) * interval '1 minute'
       WHERE id IN (
         SELECT id FROM mail_outbox WHERE next_attempt_at <= $1
         ORDER BY next_attempt_at LIMIT $2 FOR UPDATE SKIP LOCKED)
       RETURNING id, recipient, subject, body, attempts`,
      [this.now(), most],
    );
    return rows.map(({ recipient, body, ...row }) => ({ ...row, to: recipient, text: body }));
  }

  /** A mail that was taken leaves nothing behind. */
  async sent({ id }: Claimed): Promise<void> {
    await this.database.query('DELETE FROM mail_outbox WHERE id = $1', [id]);
  }

  /** Notes why a mail was not taken. Answers whether it is given up: kept, and never due again. */
  async failed({ id, attempts }: Claimed, reason: string, isFinal: boolean): Promise<boolean> {
    const givenUp = isFinal || attempts >= mostAttempts;
    await this.database.query(
      `UPDATE mail_outbox SET last_error = $2,
         next_attempt_at = CASE WHEN $3 THEN NULL ELSE next_attempt_at END
       WHERE id = $1`,
      [id, reason.slice(0, 500), givenUp],
    );
    if (givenUp) await this.clear();
    return givenUp;
  }

  private async clear(): Promise<void> {
    await this.database.query(
      `DELETE FROM mail_outbox
       WHERE next_attempt_at IS NULL AND created_at < $1::timestamptz - $2 * interval '1 day'`,
      [this.now(), keptDays],
    );
  }
}
