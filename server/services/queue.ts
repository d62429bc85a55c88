import { Refusal } from '../refusal';

interface Waiting {
  readonly cost: number;
  readonly start: () => void;
  /** How many that came later went first. */
  overtaken: number;
}

interface Bounds {
  /** Calls that work at once. */
  readonly places: number;
  /** Cost that may wait at once. */
  readonly mostWaiting: number;
}

/** A call that so many overtook is the next. */
const overtakenAtMost = 8;

/**
 * Lets so many calls work at once. Of those that wait the cheapest goes first, so that a small call
 * does not stand behind a few large ones; nobody is overtaken more than eight times. A call whose caller has gone
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
      const next = this.next();
      if (next) next.start();
      else this.working -= 1;
    }
  }

  private next(): Waiting | undefined {
    const [first, ...others] = this.waiting;
    if (!first) return undefined;
    const chosen =
      this.waiting.find(({ overtaken }) => overtaken >= overtakenAtMost) ??
      others.reduce((cheapest, one) => (one.cost < cheapest.cost ? one : cheapest), first);
    const place = this.waiting.indexOf(chosen);
    this.waiting.splice(place, 1);
    for (const one of this.waiting.slice(0, place)) one.overtaken += 1;
    return chosen;
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
      const one: Waiting = {
        cost,
        overtaken: 0,
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
