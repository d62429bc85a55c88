import { createHash } from 'node:crypto';
import type { DataSource } from 'typeorm';
import { Refusal } from '../../refusal';
import { RateWindows } from '../rate-windows';

const windowMs = 15 * 60_000;
const failuresOfPair = 10;
const failuresOfPerson = 100;

/** Where a sign-in comes from and for whom. */
export interface Attempt {
  readonly email: string;
  readonly address: string;
}

/**
 * Slows down guessing, for people known and unknown alike: in a quarter of an hour ten failures for
 * a person from one network address, a hundred from all. The first bound keeps a stranger elsewhere
 * from locking a person out; the second bounds guessing from many places. Kept as digests.
 */
export class SignInThrottle {
  private readonly failures: RateWindows;

  constructor(database: DataSource) {
    this.failures = new RateWindows(database, 'sign-in', windowMs);
  }

  async check(attempt: Attempt): Promise<void> {
    for (const [row, most] of this.rows(attempt)) {
      if ((await this.failures.hitsOf(row)) >= most) {
        const detail = 'Too many failed attempts. Wait a quarter of an hour.';
        throw new Refusal('too-many-requests', detail, undefined, windowMs / 1_000);
      }
    }
  }

  /** Counts a failure; answers whether it is within both bounds, however many came at once. */
  async failed(attempt: Attempt): Promise<boolean> {
    let within = true;
    for (const [row, most] of this.rows(attempt)) {
      within = (await this.failures.increment(row)).totalHits <= most && within;
    }
    return within;
  }

  private rows({ email, address }: Attempt): [row: string, most: number][] {
    const person = email.toLowerCase();
    return [
      [digest(`${person}\n${address}`), failuresOfPair],
      [digest(person), failuresOfPerson],
    ];
  }
}

const digest = (text: string) => createHash('sha256').update(text).digest('base64url');
