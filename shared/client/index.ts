import type {
  DryRunAnswer,
  FractionsAnswer,
  FractionsRequestInput,
  ManyFractionsAnswer,
  PublicFractionsRequestInput,
} from '../fractions';
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
  const post = async <Answer>(path: string, body: unknown, { signal }: CallOptions = {}) => {
    const headers: Record<string, string> = {
      'Content-Type': 'application/json',
      Accept: 'application/json',
    };
    if (key !== undefined) headers.Authorization = `Bearer ${key}`;
    const response = await fetch(`${baseUrl}${path}`, {
      method: 'POST',
      headers,
      body: JSON.stringify(body),
      signal: signal ?? null,
    }).catch(unreachable);
    if (!response.ok) throw await ProblemError.from(response);
    return (await response.json()) as Answer;
  };

  return {
    /** POST /v1/fractions; needs a key with scope `compute`. */
    fractions: <Body extends FractionsRequestInput>(body: Body, options?: CallOptions) =>
      post<FractionsResult<Body>>('/v1/fractions', body, options),
    /** POST /v1/public/fractions; no key, one system, rate-limited. */
    publicFractions: (body: PublicFractionsRequestInput, options?: CallOptions) =>
      post<FractionsAnswer>('/v1/public/fractions', body, options),
  };
}

export type StepwellClient = ReturnType<typeof createClient>;
