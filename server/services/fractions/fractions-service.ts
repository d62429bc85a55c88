import type { FractionsQuery, FractionsRequest } from '../../../shared/fractions';
import { Refusal } from '../../refusal';
import type { ComputePool } from '../compute/compute-pool';
import type { Reader } from '../systems/search-systems';
import type { SystemService } from '../systems/system-service';
import { fractionsCost } from './cost';
import { referencesIn, resolved, type ResolvedRequest } from './resolve';

interface Terms {
  /** Whose systems may be named by id. */
  readonly reader: Reader;
  /** Most that the call may cost. */
  readonly mostCost: number;
  readonly asCsv: boolean;
  /** Aborted when the caller has gone. */
  readonly signal: AbortSignal;
}

/** Answers about species fractions: systems are looked up here, the maths is done by workers. */
export class FractionsService {
  constructor(
    private readonly systems: SystemService,
    private readonly compute: Readonly<Record<'keyed' | 'public', ComputePool>>,
  ) {}

  /** The finished body. Refused with `invalid-request` for an unknown system, or `over-limit`. */
  async answer(request: FractionsRequest, terms: Terms): Promise<Uint8Array> {
    const found = await this.systems.find(terms.reader, referencesIn(request));
    return this.withinCost(resolved(request, found), terms);
  }

  /** The same of one stored system. Refused with `not-found` where there is none. */
  async answerAbout(id: string, question: FractionsQuery, terms: Terms): Promise<Uint8Array> {
    const system = await this.systems.read(terms.reader, id);
    const request = { ...question, system: { id }, dryRun: false };
    return this.withinCost(resolved(request, new Map([[id, system]])), terms);
  }

  private withinCost(request: ResolvedRequest, terms: Terms): Promise<Uint8Array> {
    const { reader, mostCost, asCsv, signal } = terms;
    const cost = fractionsCost(request);
    if (cost > mostCost && !request.dryRun) {
      const detail = `The cost, points × species × (digits + 20), is ${cost}; one call may ask for ${mostCost}.`;
      throw new Refusal('over-limit', detail, [{ pointer: '', code: 'cost-over-limit', detail }]);
    }
    const pool = reader === undefined ? this.compute.public : this.compute.keyed;
    const task = asCsv && !request.dryRun ? 'fractionsCsv' : 'fractions';
    return pool.run(task, request, { cost: request.dryRun ? 0 : cost, signal });
  }
}
