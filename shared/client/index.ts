import type { AccountAnswer, SignInRequest } from '../account';
import type {
  BufferCapacityAnswer,
  BufferCapacityRequestInput,
  PublicBufferCapacityRequestInput,
} from '../buffer-capacity';
import type { DryRunAnswer } from '../dry-run';
import type {
  FractionsAnswer,
  FractionsRequestInput,
  ManyFractionsAnswer,
  PublicFractionsRequestInput,
} from '../fractions';
import type {
  IsoelectricPointAnswer,
  IsoelectricPointRequestInput,
  PublicIsoelectricPointRequestInput,
} from '../isoelectric-point';
import type { IssuedKey, KeyAnswer, KeyList, KeyRequestInput } from '../keys';
import type { LimitsAnswer } from '../limits-answer';
import type { MixtureAnswer, MixtureRequestInput, PublicMixtureRequestInput } from '../mixtures';
import type { PHForFractionAnswer, PHForFractionRequestInput } from '../ph-for-fraction';
import { readPage, type Page } from './page';
import { createSend, type CallOptions, type ClientOptions } from './send';
import { systemsAt } from './systems';

export { ProblemError } from './problem-error';
export type { Page } from './page';

type FractionsResult<Body> = Body extends { dryRun: true }
  ? DryRunAnswer
  : Body extends { systems: unknown }
    ? ManyFractionsAnswer
    : FractionsAnswer;

type OrDryRun<Body, Answer> = Body extends { dryRun: true } ? DryRunAnswer : Answer;

/**
 * The typed client that the app, the tests and pipelines use. Every refusal and every failure to
 * reach the service is thrown as a `ProblemError`.
 */
export function createClient(options: ClientOptions) {
  const send = createSend(options);
  const get = async <Answer>(path: string, { signal }: CallOptions = {}) =>
    (await (await send({ method: 'GET', path, signal })).json()) as Answer;
  const post = async <Answer>(path: string, body?: unknown, { signal }: CallOptions = {}) =>
    (await (await send({ method: 'POST', path, body, signal })).json()) as Answer;

  return {
    /** POST /v1/fractions; needs the scope `compute`. */
    fractions: <Body extends FractionsRequestInput>(body: Body, call?: CallOptions) =>
      post<FractionsResult<Body>>('/v1/fractions', body, call),
    /** POST /v1/public/fractions; no key, one system, rate-limited. */
    publicFractions: (body: PublicFractionsRequestInput, call?: CallOptions) =>
      post<FractionsAnswer>('/v1/public/fractions', body, call),
    /** POST /v1/ph-for-fraction; needs the scope `compute`. */
    pHForFraction: <Body extends PHForFractionRequestInput>(body: Body, call?: CallOptions) =>
      post<OrDryRun<Body, PHForFractionAnswer>>('/v1/ph-for-fraction', body, call),
    /** POST /v1/buffer-capacity; needs the scope `compute`. */
    bufferCapacity: <Body extends BufferCapacityRequestInput>(body: Body, call?: CallOptions) =>
      post<OrDryRun<Body, BufferCapacityAnswer>>('/v1/buffer-capacity', body, call),
    publicBufferCapacity: (body: PublicBufferCapacityRequestInput, call?: CallOptions) =>
      post<BufferCapacityAnswer>('/v1/public/buffer-capacity', body, call),
    /** POST /v1/isoelectric-point; needs the scope `compute`. */
    isoelectricPoint: <Body extends IsoelectricPointRequestInput>(body: Body, call?: CallOptions) =>
      post<OrDryRun<Body, IsoelectricPointAnswer>>('/v1/isoelectric-point', body, call),
    publicIsoelectricPoint: (body: PublicIsoelectricPointRequestInput, call?: CallOptions) =>
      post<IsoelectricPointAnswer>('/v1/public/isoelectric-point', body, call),
    /** POST /v1/mixtures; needs the scope `compute`. */
    mixture: <Body extends MixtureRequestInput>(body: Body, call?: CallOptions) =>
      post<OrDryRun<Body, MixtureAnswer>>('/v1/mixtures', body, call),
    publicMixture: (body: PublicMixtureRequestInput, call?: CallOptions) =>
      post<MixtureAnswer>('/v1/public/mixtures', body, call),
    /** /v1/systems: the handbook's and the organization's own; needs `systems:read`. */
    systems: systemsAt(send, '/v1/systems'),
    /** /v1/public/systems: the handbook, without a key. */
    publicSystems: systemsAt(send, '/v1/public/systems'),
    limits: (call?: CallOptions) => get<LimitsAnswer>('/v1/limits', call),

    signIn: (body: SignInRequest) => post<AccountAnswer>('/v1/sessions', body),
    signOut: async () => {
      await send({ method: 'DELETE', path: '/v1/sessions/current' });
    },
    account: (call?: CallOptions) => get<AccountAnswer>('/v1/account', call),
    chooseOrganization: async (organizationId: string) => {
      const path = '/v1/sessions/current/organization';
      const answer = await send({ method: 'PUT', path, body: { organizationId } });
      return (await answer.json()) as AccountAnswer;
    },

    /** A page of keys, newest first; `next` is the cursor of the page after. */
    keys: async (cursor?: string, { signal }: CallOptions = {}): Promise<Page<KeyAnswer>> => {
      const query = cursor === undefined ? '' : `?cursor=${encodeURIComponent(cursor)}`;
      return readPage<KeyList>(await send({ method: 'GET', path: `/v1/keys${query}`, signal }));
    },
    issueKey: (body: KeyRequestInput) => post<IssuedKey>('/v1/keys', body),
    revokeKey: (id: string) => post<KeyAnswer>(`/v1/keys/${encodeURIComponent(id)}/revocation`),
  };
}

export type StepwellClient = ReturnType<typeof createClient>;
