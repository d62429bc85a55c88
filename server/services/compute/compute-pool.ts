import path from 'node:path';
import { Piscina } from 'piscina';
import { Refusal } from '../../refusal';
import { Queue } from '../queue';
import type { Work, Worked } from './worker';

// The worker stands beside this file, compiled or not as this file is.
const extension = path.extname(__filename);
const filename = path.join(__dirname, `worker${extension}`);
const loader = extension === '.ts' ? { execArgv: ['--require', 'tsx/cjs'] } : {};

/** Cost that may wait at once: some seconds of work, as the slowest kind of call counts it. */
const mostWaiting = 36_000_000;

/** What a call weighs, and whether its caller is still there. */
export interface Load {
  readonly cost: number;
  readonly signal: AbortSignal;
}

/** Runs the engine in worker threads, never on the event loop. */
export class ComputePool {
  private readonly pool: Piscina;
  private readonly queue: Queue;

  constructor(threads: number) {
    this.queue = new Queue({ places: threads, mostWaiting });
    this.pool = new Piscina({
      filename,
      ...loader,
      minThreads: 1,
      maxThreads: threads,
      idleTimeout: 60_000,
    });
  }

  /** The finished body of an answer. Refused as the question is, or with `unavailable`. */
  async run(work: Work, { cost, signal }: Load): Promise<Uint8Array> {
    const worked = (await this.queue.run(cost, signal, () => this.pool.run(work))) as Worked;
    if (!('refusal' in worked)) return worked;
    const { code, detail, errors } = worked.refusal;
    throw new Refusal(code, detail, errors);
  }

  async close(): Promise<void> {
    await this.pool.close();
  }
}
