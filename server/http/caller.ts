import type { Request, Response } from 'express';
import { roles, scopesOfRole, type Role } from '../../shared/scopes';
import { Refusal } from '../refusal';
import type { Services } from '../services';
import type { Caller } from '../services/caller';
import { notSignedIn } from '../services/sessions/session-service';
import { bearerOf } from './bearer';
import type { Access } from './operation';
import { requireOwnOrigin } from './origin';
import type { SessionCookies } from './session-cookies';

/** What tells our own pages and their cookies from others'. */
export interface OwnPages {
  readonly cookies: SessionCookies;
  readonly origins: ReadonlySet<string>;
}

const notYourRole = (allowed: readonly Role[]) =>
  new Refusal('role-insufficient', `This is for whoever is ${allowed.join(' or ')} here.`);

async function sessionOf(request: Request, services: Services, pages: OwnPages) {
  const { access } = pages.cookies.read(request);
  if (access === undefined) return undefined;
  requireOwnOrigin(request, pages.origins);
  const caller = await services.sessions.callerOf(access);
  if (!caller) throw notSignedIn();
  return caller;
}

/**
 * Who calls, as the operation asks for it. Where an Authorization header is sent, cookies are
 * ignored.
 */
export async function callerOf(
  request: Request,
  response: Response,
  access: Access,
  services: Services,
  pages: OwnPages,
): Promise<Caller | undefined> {
  if (access === 'public') return undefined;
  if (access === 'own-pages') {
    requireOwnOrigin(request, pages.origins);
    return undefined;
  }
  const hasCredential = request.headers.authorization !== undefined;
  if ('roles' in access) {
    if (hasCredential) {
      throw new Refusal('sign-in-needed', 'Keys cannot do this: it takes a person, signed in.');
    }
    const person = await sessionOf(request, services, pages);
    if (!person) throw notSignedIn();
    if (!access.roles.includes(person.role)) throw notYourRole(access.roles);
    return person;
  }
  const person = hasCredential ? undefined : await sessionOf(request, services, pages);
  if (!person) return bearerOf(request, response, services.keys, access.scope);
  if (!person.scopes.has(access.scope)) {
    throw notYourRole(roles.filter((role) => scopesOfRole[role].includes(access.scope)));
  }
  return person;
}
