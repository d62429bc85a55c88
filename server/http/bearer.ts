import type { Request, Response } from 'express';
import type { Scope } from '../../shared/scopes';
import { Refusal } from '../refusal';
import type { Caller } from '../services/caller';
import type { Authentication, KeyGuard } from '../services/keys/key-guard';

const realm = 'Bearer realm="stepwell"';
const credentials = /^Bearer +([A-Za-z0-9._~+/-]+=*) *$/i;

const refused: Readonly<
  Record<Extract<Authentication, { ok: false }>['reason'], readonly [code: Refusal['code'], string]>
> = {
  malformed: ['credential-malformed', 'A key reads stepwell_… with 80 characters after it.'],
  checksum: ['credential-malformed', 'The checksum at the key’s end does not fit: is it whole?'],
  unknown: ['credential-invalid', 'No such key.'],
  expired: ['credential-invalid', 'The key has expired.'],
  revoked: ['credential-invalid', 'The key was revoked.'],
  'issuer-left': ['credential-invalid', 'Whoever issued the key no longer belongs here.'],
};

function challenge(response: Response, parameters: string, refusal: Refusal): Refusal {
  response.setHeader('WWW-Authenticate', realm + parameters);
  return refusal;
}

/**
 * The key guard, answering as RFC 6750 §3: no credential, a bare challenge; a request that is not
 * well formed, `invalid_request`; a bad key, `invalid_token`; too little scope,
 * `insufficient_scope`.
 */
export async function bearerOf(
  request: Request,
  response: Response,
  keys: KeyGuard,
  scope: Scope,
): Promise<Caller> {
  const header = request.headers.authorization;
  if (header === undefined || !/^Bearer\b/i.test(header)) {
    const detail = 'Send a key as Authorization: Bearer stepwell_….';
    throw challenge(response, '', new Refusal('credential-missing', detail));
  }
  const token = credentials.exec(header)?.[1];
  if (token === undefined) {
    throw challenge(
      response,
      ', error="invalid_request"',
      new Refusal('invalid-request', 'Authorization must read: Bearer, one space, the key.'),
    );
  }
  const found = await keys.authenticate(token);
  if (!found.ok) {
    throw challenge(response, ', error="invalid_token"', new Refusal(...refused[found.reason]));
  }
  response.log.setBindings({ caller: found.caller.name });
  if (!found.caller.scopes.has(scope)) {
    throw challenge(
      response,
      `, error="insufficient_scope", scope="${scope}"`,
      new Refusal('scope-insufficient', `This needs a key with the scope ${scope}.`),
    );
  }
  return found.caller;
}
