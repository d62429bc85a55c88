import { Refusal } from '../refusal';

interface Waiting {
  readonly cost: number;
  readonly start: () => void;
}

interface Bounds {
  /** Calls that work at once. */
  readonly places: number;
  /** Cost that may wait at once. */
  readonly mostWaiting: number;
}

/**
 * Lets so many calls work at once, the others in the order they came. A call whose caller has gone
 * leaves the queue; one that would make it too long is refused with `unavailable`.
 */
export class Queue {
  private readonly waiting: Waiting[] = [];
  private working = 0;

  constructor(private readonly bounds: Bounds) {}

  async run<T>(cost: number, signal: AbortSignal, work: () => Promise<T>): Promise<T> {
    await this.turn(cost, signal);
    try {
      return await work();
    } finally {
      const next = this.waiting.shift();
      if (next) next.start();
      else this.working -= 1;
    }
  }

  private async turn(cost: number, signal: AbortSignal): Promise<void> {
    // Whoever waits is handed the place of one that is done.
    if (this.working >= this.bounds.places) await this.wait(cost, signal);
    else this.working += 1;
  }

  private wait(cost: number, signal: AbortSignal): Promise<void> {
    const before = this.waiting.reduce((sum, one) => sum + one.cost, 0);
    if (before + cost > this.bounds.mostWaiting) {
      throw new Refusal('unavailable', 'Too many calls are waiting. Try again in a few seconds.');
    }
    return new Promise((resolve, reject) => {
      const leave = () => {
        this.waiting.splice(this.waiting.indexOf(one), 1);
        reject(new Refusal('unavailable', 'The caller has gone.'));
      };
      const one = {
        cost,
        start: () => {
          signal.removeEventListener('abort', leave);
          resolve();
        },
      };
      this.waiting.push(one);
      signal.addEventListener('abort', leave, { once: true });
    });
  }
}
