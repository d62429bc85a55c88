import { availableParallelism } from 'node:os';
import type { DataSource } from 'typeorm';
import type { Config } from '../config';
import { AuditTrail } from './audit/audit-trail';
import { ComputePool } from './compute/compute-pool';
import { ComputeService } from './compute/compute-service';
import { KeyConsole } from './keys/key-console';
import { KeyDigests } from './keys/key-digest';
import { KeyGuard } from './keys/key-guard';
import { KeyNotices } from './keys/key-notices';
import type { Outbox } from './mail/outbox';
import { AccessTokens } from './sessions/access-token';
import { RefreshTokens } from './sessions/refresh-token';
import { SessionService } from './sessions/session-service';
import { SignInThrottle } from './sessions/sign-in-throttle';
import { SystemService } from './systems/system-service';

/** What the routes may call. */
export interface Services {
  /** Lets go of the worker threads. */
  readonly close: () => Promise<void>;
  readonly audit: AuditTrail;
  readonly compute: ComputeService;
  readonly keys: KeyGuard;
  readonly keyConsole: KeyConsole;
  readonly sessions: SessionService;
  readonly systems: SystemService;
  readonly database: DataSource;
}

type Settings = Pick<Config, 'computeThreads' | 'keyPeppers' | 'sessionSecret'>;

interface Parts {
  readonly database: DataSource;
  readonly config: Settings;
  /** Origin of links, and issuer of access tokens. */
  readonly publicUrl: string;
  readonly outbox?: Outbox | undefined;
}

/** The services over a connected database. */
export function createServices({ database, config, publicUrl, outbox }: Parts): Services {
  const digests = new KeyDigests(config.keyPeppers);
  const threads = config.computeThreads ?? availableParallelism();
  // Apart, so that no crowd on the public page keeps a key waiting.
  const pools = { keyed: new ComputePool(threads), public: new ComputePool(1) };
  const systems = new SystemService(database);
  return {
    close: async () => {
      await Promise.all([pools.keyed.close(), pools.public.close()]);
    },
    audit: new AuditTrail(database),
    compute: new ComputeService(systems, pools),
    keys: new KeyGuard(database, digests),
    keyConsole: new KeyConsole(database, digests, outbox && new KeyNotices(outbox, publicUrl)),
    sessions: new SessionService({
      database,
      tokens: new AccessTokens(config.sessionSecret, publicUrl),
      refreshTokens: new RefreshTokens(config.sessionSecret),
      throttle: new SignInThrottle(database),
    }),
    systems,
    database,
  };
}
