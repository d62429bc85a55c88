import type { Problem } from '../problem';

/** A refusal of the service, or `problem.status` 0 where it could not be reached. */
export class ProblemError extends Error {
  constructor(
    readonly problem: Problem,
    /** Seconds to wait, from `Retry-After`. */
    readonly retryAfter?: number,
  ) {
    super(problem.detail ?? problem.title);
    this.name = 'ProblemError';
  }

  static async from(response: Response): Promise<ProblemError> {
    const retryAfter = Number(response.headers.get('Retry-After')) || undefined;
    const body: unknown = await response.json().catch(() => undefined);
    const problem = isProblem(body)
      ? body
      : {
          type: 'about:blank',
          title: `The service answered ${response.status}`,
          status: response.status,
          requestId: response.headers.get('X-Request-Id') ?? '',
        };
    return new ProblemError(problem, retryAfter);
  }
}

const isProblem = (body: unknown): body is Problem =>
  typeof body === 'object' && body !== null && 'type' in body && 'title' in body;

/** Turns a failed fetch into a ProblemError; an abort stays what it is. */
export function unreachable(error: unknown): never {
  if (error instanceof DOMException && error.name === 'AbortError') throw error;
  throw new ProblemError({
    type: 'about:blank',
    title: 'The service cannot be reached',
    status: 0,
    requestId: '',
  });
}
