import { Refusal } from '../../refusal';
import type { FoundSystems } from '../chemistry/resolved-system';
import { referencesAmong } from '../chemistry/resolved-system';
import type { Reader } from '../systems/search-systems';
import type { SystemService } from '../systems/system-service';
import type { ComputePool } from './compute-pool';
import { type QuestionName, questionOf, type RequestOf } from './questions';

/** Who asks, and under which terms. */
export interface Terms {
  /** Whose systems may be named by id. */
  readonly reader: Reader;
  /** Most that the call may cost. */
  readonly mostCost: number;
  readonly asCsv: boolean;
  /** Aborted when the caller has gone. */
  readonly signal: AbortSignal;
}

/** Answers questions: systems are looked up here, the maths is done by workers. */
export class ComputeService {
  constructor(
    private readonly systems: SystemService,
    private readonly pools: Readonly<Record<'keyed' | 'public', ComputePool>>,
  ) {}

  /**
   * The finished body. Refused with `invalid-request` for an unknown system or parts that do not
   * fit, `over-limit`, or `no-answer`.
   */
  async answer<Name extends QuestionName>(
    name: Name,
    request: RequestOf<Name>,
    terms: Terms,
  ): Promise<Uint8Array> {
    const asked = referencesAmong(questionOf(name).systemsOf(request));
    return this.ask(name, request, await this.systems.find(terms.reader, asked), terms);
  }

  /** Fractions of one stored system. Refused with `not-found` where there is none. */
  async answerAbout(
    id: string,
    question: Omit<RequestOf<'fractions'>, 'system' | 'systems' | 'dryRun'>,
    terms: Terms,
  ): Promise<Uint8Array> {
    const system = await this.systems.read(terms.reader, id);
    const request = { ...question, system: { id }, dryRun: false };
    return this.ask('fractions', request, new Map([[id, system]]), terms);
  }

  private ask<Name extends QuestionName>(
    name: Name,
    asked: RequestOf<Name>,
    found: FoundSystems,
    { reader, mostCost, asCsv, signal }: Terms,
  ): Promise<Uint8Array> {
    const question = questionOf(name);
    const request = question.resolved(asked, found);
    const isDry = 'dryRun' in asked && asked.dryRun;
    const cost = isDry ? 0 : question.cost(request);
    if (cost > mostCost) {
      const detail = `The cost of this call is ${cost}; one call may ask for ${mostCost}. GET /v1/limits has the formula.`;
      throw new Refusal('over-limit', detail, [{ pointer: '', code: 'cost-over-limit', detail }]);
    }
    const pool = reader === undefined ? this.pools.public : this.pools.keyed;
    return pool.run({ name, request, asCsv: asCsv && !isDry }, { cost, signal });
  }
}
