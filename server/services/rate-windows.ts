import type { ClientRateLimitInfo, Options, Store } from 'express-rate-limit';
import type { DataSource } from 'typeorm';

/** Counts of calls a window, one row a caller, shared by every process on the database. */
export class RateWindows implements Store {
  constructor(
    private readonly database: DataSource,
    readonly prefix: string,
    private windowMs = 60_000,
  ) {}

  init({ windowMs }: Options): void {
    this.windowMs = windowMs;
  }

  /** Counts one call and, now and then, clears windows long past. */
  async increment(caller: string): Promise<ClientRateLimitInfo> {
    const [row] = await this.database.query<[{ hits: number; resets_at: Date }]>(
      `INSERT INTO rate_windows AS w (caller, hits, resets_at)
       VALUES ($1, 1, now() + $2 * interval '1 millisecond')
       ON CONFLICT (caller) DO UPDATE SET
         hits = CASE WHEN w.resets_at <= now() THEN 1 ELSE w.hits + 1 END,
         resets_at = CASE WHEN w.resets_at <= now() THEN excluded.resets_at ELSE w.resets_at END
       RETURNING hits, resets_at`,
      [this.row(caller), this.windowMs],
    );
    if (row.hits === 1) await this.clear();
    return { totalHits: row.hits, resetTime: row.resets_at };
  }

  /** Calls counted in the window under way. */
  async hitsOf(caller: string): Promise<number> {
    const [row] = await this.database.query<[{ hits: number }?]>(
      'SELECT hits FROM rate_windows WHERE caller = $1 AND resets_at > now()',
      [this.row(caller)],
    );
    return row?.hits ?? 0;
  }

  async decrement(caller: string): Promise<void> {
    await this.database.query(
      `UPDATE rate_windows SET hits = greatest(hits - 1, 0) WHERE caller = $1`,
      [this.row(caller)],
    );
  }

  async resetKey(caller: string): Promise<void> {
    await this.database.query('DELETE FROM rate_windows WHERE caller = $1', [this.row(caller)]);
  }

  private row(caller: string): string {
    return `${this.prefix}:${caller}`;
  }

  private async clear(): Promise<void> {
    await this.database.query(
      `DELETE FROM rate_windows WHERE caller IN (
         SELECT caller FROM rate_windows WHERE resets_at < now() - interval '1 hour'
         LIMIT 100 FOR UPDATE SKIP LOCKED)`,
    );
  }
}
