import type { ZodType, z } from 'zod';
import type { ProblemName } from '../../shared/problem';
import type { Scope } from '../../shared/scopes';
import type { Services } from '../services';
import type { Caller } from '../services/keys/key-service';

/** Who may call: anybody, or the bearer of a key with a scope. */
export type Access = 'public' | { readonly scope: Scope };

export interface Reply {
  readonly status?: number;
  readonly type: string;
  readonly body: Uint8Array | string;
  readonly headers?: Readonly<Record<string, string>>;
}

interface Call<Body> {
  readonly body: Body;
  readonly services: Services;
  /** The media type agreed upon, one of `produces`. */
  readonly accepted: string;
  /** Present exactly where the operation asks for a scope. */
  readonly caller: Caller | undefined;
}

interface Example {
  readonly summary: string;
  readonly body?: unknown;
  readonly answer: unknown;
}

/**
 * One path and method, whole: what it is for, who may call it, what it takes and gives, and how it
 * is answered. The router and the OpenAPI document are both made from it.
 */
export interface Operation<Schema extends ZodType = ZodType> {
  readonly method: 'get' | 'post';
  readonly path: string;
  readonly operationId: string;
  readonly summary: string;
  readonly description: string;
  readonly tag: string;
  readonly access: Access;
  /** Calls a minute for each caller: an address where public, a key otherwise. */
  readonly callsPerMinute?: number;
  readonly body?: Schema;
  readonly answer: ZodType;
  /** Media types in order of preference; JSON first. */
  readonly produces: readonly string[];
  /** Refusals of its own, beside those of every operation. */
  readonly refuses?: readonly ProblemName[];
  readonly examples: Readonly<Record<string, Example>>;
  readonly handle: (call: Call<z.output<Schema>>) => Promise<Reply> | Reply;
}

/** Declares an operation with its body's type kept for the handler. */
export const operation = <Schema extends ZodType>(declared: Operation<Schema>): Operation =>
  declared as unknown as Operation;
