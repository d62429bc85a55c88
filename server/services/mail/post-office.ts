import type { DataSource, EntityManager } from 'typeorm';
import type { Mail } from './letter';
import { Undelivered, type Mailer } from './mailer';
import { insertMail, type Outbox } from './outbox';
import { OutboxTable, type Claimed } from './outbox-table';

/** How soon mail is found that another process left, or that is to be tried again. */
const lookMs = 15_000;
/** Mails sent at once. */
const atOnce = 4;
/** How long mail under way may take once the server stops; it is due again later anyhow. */
const patienceMs = 3_000;

interface Log {
  readonly warn: (fields: object, message: string) => void;
}

interface Parts {
  readonly database: DataSource;
  readonly mailer: Mailer;
  readonly log: Log;
  readonly now?: () => Date;
}

/**
 * Sends what is in the outbox, beside whatever else goes on: no call waits for an SMTP server. Each
 * mail is sent at least once (twice where a process dies between sending and noting it), or given
 * up after some twenty hours, or at once where the server says that it never will take it.
 */
export class PostOffice implements Outbox {
  private readonly now: () => Date;
  private readonly table: OutboxTable;
  private timer: ReturnType<typeof setInterval> | undefined;
  private round: Promise<void> | undefined;
  private isWoken = false;
  private isClosed = false;

  constructor(private readonly parts: Parts) {
    this.now = parts.now ?? (() => new Date());
    this.table = new OutboxTable(parts.database, this.now);
  }

  readonly leave = (manager: EntityManager, mails: readonly Mail[]): Promise<void> =>
    insertMail(manager, mails, this.now());

  readonly wake = (): void => {
    this.isWoken = true;
    this.round ??= this.rounds().finally(() => {
      this.round = undefined;
    });
  };

  /** Begins to look for mail by itself. */
  start(): void {
    this.timer = setInterval(this.wake, lookMs);
    this.wake();
  }

  /** Sends all that is due, once. */
  async drain(): Promise<void> {
    let claimed: Claimed[];
    do {
      claimed = this.isClosed ? [] : await this.table.claim(atOnce);
      const outcomes = await Promise.allSettled(claimed.map((mail) => this.send(mail)));
      const failure = outcomes.find((outcome) => outcome.status === 'rejected');
      if (failure) throw failure.reason;
    } while (claimed.length > 0);
  }

  /** Stops looking, and lets what is under way end, for a while. */
  async close(): Promise<void> {
    this.isClosed = true;
    clearInterval(this.timer);
    const patience = setTimeout(() => this.parts.mailer.close(), patienceMs);
    await this.round;
    clearTimeout(patience);
    this.parts.mailer.close();
  }

  private async rounds(): Promise<void> {
    while (this.isWoken && !this.isClosed) {
      this.isWoken = false;
      await this.drain().catch((error: unknown) => {
        this.parts.log.warn({ err: error }, 'the outbox cannot be read; mail waits');
      });
    }
  }

  /** Throws only where the database is away: then the mail is due again in its time. */
  private async send(mail: Claimed): Promise<void> {
    try {
      await this.parts.mailer.send(mail, mail.id);
    } catch (error) {
      if (!(error instanceof Undelivered)) throw error;
      await this.note(mail, error);
      return;
    }
    await this.table.sent(mail);
  }

  /** The log has no address and nothing of the mail; the row has what the server said. */
  private async note(mail: Claimed, { message, isFinal }: Undelivered): Promise<void> {
    const givenUp = await this.table.failed(mail, message, isFinal);
    const fields = { mail: mail.id, attempts: mail.attempts };
    this.parts.log.warn(fields, givenUp ? 'mail given up' : 'mail not taken; it is tried again');
  }
}
