import { ProblemError, unreachable } from './problem-error';

export interface ClientOptions {
  /** Origin of the service, e.g. `http://localhost:8080`; empty in the app, which is served by it. */
  readonly baseUrl: string;
  /** A key; without one the browser's session speaks. */
  readonly key?: string;
}

export interface CallOptions {
  readonly signal?: AbortSignal | undefined;
}

interface Call extends CallOptions {
  readonly method: 'GET' | 'POST' | 'PUT' | 'DELETE';
  readonly path: string;
  readonly body?: unknown;
}

const refreshPath = '/v1/sessions/current/refresh';

/** Sends calls as JSON, and renews a session that has run out before giving up. */
export function createSend({ baseUrl, key }: ClientOptions) {
  const once = ({ method, path, body, signal }: Call): Promise<Response> => {
    const headers: Record<string, string> = { Accept: 'application/json' };
    if (key !== undefined) headers.Authorization = `Bearer ${key}`;
    if (body !== undefined) headers['Content-Type'] = 'application/json';
    return fetch(`${baseUrl}${path}`, {
      method,
      headers,
      signal: signal ?? null,
      ...(body !== undefined && { body: JSON.stringify(body) }),
    }).catch(unreachable);
  };

  // Calls that run out at the same moment share one renewal.
  let renewal: Promise<boolean> | undefined;
  const renewed = () =>
    (renewal ??= once({ method: 'POST', path: refreshPath })
      .then(({ ok }) => ok)
      .finally(() => {
        renewal = undefined;
      }));

  const isRunOut = ({ status }: Response, { path }: Call) =>
    status === 401 && key === undefined && path !== '/v1/sessions';

  return async (call: Call): Promise<Response> => {
    const first = await once(call);
    const response = isRunOut(first, call) && (await renewed()) ? await once(call) : first;
    if (!response.ok) throw await ProblemError.from(response);
    return response;
  };
}

export type Send = ReturnType<typeof createSend>;
