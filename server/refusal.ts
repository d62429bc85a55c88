import type { Fault, ProblemName } from '../shared/problem';

/**
 * A call that is refused for a reason the caller can act on. Services throw it; what it is in HTTP
 * is known to the edge alone.
 */
export class Refusal extends Error {
  constructor(
    readonly code: ProblemName,
    readonly detail?: string,
    readonly errors?: readonly Fault[],
    /** Seconds after which trying again may help. */
    readonly retryAfter?: number,
  ) {
    super(detail ?? code);
    this.name = 'Refusal';
  }
}
