import type {
  DryRunAnswer,
  FractionsAnswer,
  FractionsRequestInput,
  ManyFractionsAnswer,
  PublicFractionsRequestInput,
} from '../fractions';
import type { LimitsAnswer } from '../limits-answer';
import { ProblemError, unreachable } from './problem-error';

export { ProblemError } from './problem-error';

interface ClientOptions {
  /** Origin of the service, e.g. `http://localhost:8080`; empty in the app, which is served by it. */
  readonly baseUrl: string;
  readonly key?: string;
}

interface CallOptions {
  readonly signal?: AbortSignal | undefined;
}

type FractionsResult<Body> = Body extends { dryRun: true }
  ? DryRunAnswer
  : Body extends { systems: unknown }
    ? ManyFractionsAnswer
    : FractionsAnswer;

/**
 * The typed client that the app, the tests and pipelines use. Every refusal and every failure to
 * reach the service is thrown as a `ProblemError`.
 */
export function createClient({ baseUrl, key }: ClientOptions) {
  const call = async <Answer>(path: string, request: RequestInit, { signal }: CallOptions = {}) => {
    const headers = new Headers({ Accept: 'application/json' });
    if (request.body !== undefined) headers.set('Content-Type', 'application/json');
    if (key !== undefined) headers.set('Authorization', `Bearer ${key}`);
    const response = await fetch(`${baseUrl}${path}`, {
      ...request,
      headers,
      signal: signal ?? null,
    }).catch(unreachable);
    if (!response.ok) throw await ProblemError.from(response);
    return (await response.json()) as Answer;
  };
  const post = <Answer>(path: string, body: unknown, options?: CallOptions) =>
    call<Answer>(path, { method: 'POST', body: JSON.stringify(body) }, options);

  return {
    /** GET /v1/limits; needs no key. */
    limits: (options?: CallOptions) => call<LimitsAnswer>('/v1/limits', { method: 'GET' }, options),
    /** POST /v1/fractions; needs a key with scope `compute`. */
    fractions: <Body extends FractionsRequestInput>(body: Body, options?: CallOptions) =>
      post<FractionsResult<Body>>('/v1/fractions', body, options),
    /** POST /v1/public/fractions; no key, one system, rate-limited. */
    publicFractions: (body: PublicFractionsRequestInput, options?: CallOptions) =>
      post<FractionsAnswer>('/v1/public/fractions', body, options),
  };
}

export type StepwellClient = ReturnType<typeof createClient>;
