import type { DataSource } from 'typeorm';
import type { ComputePool } from './compute/compute-pool';
import type { KeyService } from './keys/key-service';

/** What the routes may call. */
export interface Services {
  readonly compute: ComputePool;
  readonly keys: KeyService;
  readonly database: DataSource;
}
