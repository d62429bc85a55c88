import type { IsoelectricPointRequest } from '../../../shared/isoelectric-point';
import type { ResolvedSystem } from '../chemistry/resolved-system';

/** A request about a system that is there in full. */
export type ResolvedIsoelectric = Omit<IsoelectricPointRequest, 'system' | 'dryRun'> & {
  readonly system: ResolvedSystem;
  readonly dryRun?: boolean;
};
