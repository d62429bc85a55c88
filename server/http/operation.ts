import type { ZodObject, ZodType, z } from 'zod';
import type { ProblemName } from '../../shared/problem';
import type { Role, Scope } from '../../shared/scopes';
import type { Services } from '../services';
import type { Caller, CallSource, SessionCaller } from '../services/caller';
import type { Tokens } from '../services/sessions/session-service';

/**
 * Who may call: anybody; anybody on our own pages; whoever has a scope, by key or by session; or
 * only a person, signed in and in one of these roles.
 */
export type Access =
  'public' | 'own-pages' | { readonly scope: Scope } | { readonly roles: readonly Role[] };

export interface Reply {
  readonly status?: number;
  readonly type?: string;
  readonly body?: Uint8Array | string;
  readonly headers?: Readonly<Record<string, string>>;
  /** Tokens for the caller's cookies: a session opened, renewed or ended. */
  readonly session?: (Pick<Tokens, 'access'> & Partial<Tokens>) | 'ended';
}

interface Call<A extends Access, Body, Params, Query> {
  readonly body: Body;
  readonly params: Params;
  readonly query: Query;
  readonly services: Services;
  /** The media type agreed upon, one of `produces`. */
  readonly accepted: string;
  /** Whoever calls and from where, where the access asks who it is. */
  readonly caller: A extends { roles: unknown }
    ? SessionCaller & CallSource
    : A extends 'public' | 'own-pages'
      ? undefined
      : Caller & CallSource;
  /** Aborted when the caller has gone. */
  readonly signal: AbortSignal;
  /** Where the call comes from, whoever calls. */
  readonly source: CallSource;
  /** The refresh token of the caller's cookie. */
  readonly refreshToken: string | undefined;
}

interface Example {
  readonly summary: string;
  readonly body?: unknown;
  readonly params?: Readonly<Record<string, string>>;
  readonly query?: Readonly<Record<string, string>>;
  readonly answer?: unknown;
}

type Nothing = ZodType<undefined>;

/**
 * One path and method, whole: what it is for, who may call it, what it takes and gives, and how it
 * is answered. The router and the OpenAPI document are both made from it.
 */
interface Declared<
  A extends Access,
  Body extends ZodType,
  Params extends ZodType,
  Query extends ZodType,
> {
  readonly method: 'get' | 'post' | 'put' | 'delete';
  /** As OpenAPI writes it, with parameters in braces. */
  readonly path: string;
  readonly operationId: string;
  readonly summary: string;
  readonly description: string;
  readonly tag: 'Compute' | 'Systems' | 'People' | 'Keys' | 'Audit' | 'Service';
  readonly access: A;
  /** Calls a minute for each caller: an address where nobody is known, else a key or a person. */
  readonly callsPerMinute?: number;
  /**
   * Answers under any Host. Only for what reads nothing of a request and gives nothing away: load
   * balancers ask each instance by its address, and many cannot be told a name to ask under.
   */
  readonly anyHost?: true;
  readonly body?: Body;
  /** Parts of the path in braces; one that does not fit is a 404. */
  readonly params?: Params;
  /** Query parameters; others are a 400. */
  readonly query?: Query;
  /** Status of success; 200 where none is named. */
  readonly status?: 200 | 201 | 204;
  readonly answer?: ZodType;
  /** Answers carry a strong ETag, and a caller who has the same already gets a 304. */
  readonly revalidates?: true;
  /** Media types in order of preference; JSON first. */
  readonly produces: readonly string[];
  /** Refusals of its own, beside those of every operation. */
  readonly refuses?: readonly ProblemName[];
  readonly examples: Readonly<Record<string, Example>>;
  readonly handle: (
    call: Call<A, z.output<Body>, z.output<Params>, z.output<Query>>,
  ) => Promise<Reply> | Reply;
}

/** An operation, whatever its types. */
export interface Operation extends Omit<Declared<Access, ZodType, ZodObject, ZodObject>, 'handle'> {
  readonly handle: (call: never) => Promise<Reply> | Reply;
}

/** Declares an operation; body, parameters and caller reach the handler with their types. */
export const operation = <
  A extends Access,
  Body extends ZodType = Nothing,
  Params extends ZodObject = ZodObject,
  Query extends ZodObject = ZodObject,
>(
  declared: Declared<A, Body, Params, Query>,
): Operation => declared;
