import { availableParallelism } from 'node:os';
import type { DataSource } from 'typeorm';
import type { Config } from '../config';
import { ComputePool } from './compute/compute-pool';
import { ComputeService } from './compute/compute-service';
import { KeyConsole } from './keys/key-console';
import { KeyDigests } from './keys/key-digest';
import { KeyGuard } from './keys/key-guard';
import { AccessTokens } from './sessions/access-token';
import { SessionService } from './sessions/session-service';
import { SignInThrottle } from './sessions/sign-in-throttle';
import { SystemService } from './systems/system-service';

/** What the routes may call. */
export interface Services {
  /** Lets go of the worker threads. */
  readonly close: () => Promise<void>;
  readonly compute: ComputeService;
  readonly keys: KeyGuard;
  readonly keyConsole: KeyConsole;
  readonly sessions: SessionService;
  readonly systems: SystemService;
  readonly database: DataSource;
}

type Settings = Pick<Config, 'computeThreads' | 'keyPeppers' | 'sessionSecret'>;

/** The services over a connected database. */
export function createServices(database: DataSource, config: Settings, issuer: string): Services {
  const digests = new KeyDigests(config.keyPeppers);
  const threads = config.computeThreads ?? availableParallelism();
  // Apart, so that no crowd on the public page keeps a key waiting.
  const pools = { keyed: new ComputePool(threads), public: new ComputePool(1) };
  const systems = new SystemService(database);
  return {
    close: async () => {
      await Promise.all([pools.keyed.close(), pools.public.close()]);
    },
    compute: new ComputeService(systems, pools),
    keys: new KeyGuard(database, digests),
    keyConsole: new KeyConsole(database, digests),
    sessions: new SessionService({
      database,
      tokens: new AccessTokens(config.sessionSecret, issuer),
      throttle: new SignInThrottle(database),
    }),
    systems,
    database,
  };
}
