import type { SystemInput } from '../../../shared/system';
import type { FoundSystems } from '../chemistry/resolved-system';

/** Something that can be asked of the engine: from a request to the text of its answer. */
export interface Question<Request, Resolved> {
  /** The systems that a request is about, in full or by their ids. */
  readonly systemsOf: (request: Request) => readonly SystemInput[];
  /** The request with every system in full. Refused where one is unknown or does not fit. */
  readonly resolved: (request: Request, found: FoundSystems) => Resolved;
  /** Work of the call, as GET /v1/limits has the formula. */
  readonly cost: (request: Resolved) => number;
  /** The answer. Refused with `no-answer` where the chemistry has none. */
  readonly answer: (request: Resolved) => object;
  /** The same as RFC 4180 text, where it is a curve. */
  readonly csv?: (request: Resolved) => string;
}
