import path from 'node:path';
import { Piscina } from 'piscina';
import { Refusal } from '../../refusal';
import type { TaskName, TaskRequest } from './tasks';

// The worker stands beside this file, compiled or not as this file is.
const extension = path.extname(__filename);
const filename = path.join(__dirname, `worker${extension}`);
const loader = extension === '.ts' ? { execArgv: ['--require', 'tsx/cjs'] } : {};
const waitingAtMost = 256;

/** Runs the engine in worker threads, never on the event loop. */
export class ComputePool {
  private readonly pool: Piscina;

  constructor(threads?: number) {
    this.pool = new Piscina({
      filename,
      ...loader,
      ...(threads === undefined ? {} : { minThreads: threads, maxThreads: threads }),
      maxQueue: waitingAtMost,
      idleTimeout: 60_000,
    });
  }

  /** The finished body of an answer. Refused with `unavailable` when too many calls wait. */
  async run<Name extends TaskName>(name: Name, request: TaskRequest<Name>): Promise<Uint8Array> {
    if (this.pool.queueSize >= waitingAtMost) {
      throw new Refusal('unavailable', 'Too many calls are waiting. Try again in a second.');
    }
    return (await this.pool.run({ name, request })) as Uint8Array;
  }

  async close(): Promise<void> {
    await this.pool.close();
  }
}
