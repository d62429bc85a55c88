import type { DataSource } from 'typeorm';
import type { Config } from '../config';
import { ComputePool } from './compute/compute-pool';
import { FractionsService } from './fractions/fractions-service';
import { KeyConsole } from './keys/key-console';
import { KeyDigests } from './keys/key-digest';
import { KeyGuard } from './keys/key-guard';
import { AccessTokens } from './sessions/access-token';
import { SessionService } from './sessions/session-service';
import { SignInThrottle } from './sessions/sign-in-throttle';
import { SystemService } from './systems/system-service';

/** What the routes may call. */
export interface Services {
  readonly compute: ComputePool;
  readonly fractions: FractionsService;
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
  const compute = new ComputePool(config.computeThreads);
  const systems = new SystemService(database);
  return {
    compute,
    fractions: new FractionsService(systems, compute),
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
