import { randomUUID } from 'node:crypto';
import { IsNull, type DataSource } from 'typeorm';
import type { AccountAnswer } from '../../../shared/account';
import { scopesOfRole } from '../../../shared/scopes';
import { Person } from '../../database/entities/person';
import { Session } from '../../database/entities/session';
import { Refusal } from '../../refusal';
import type { Member, SessionCaller } from '../caller';
import type { AccessTokens } from './access-token';
import { passwordIs } from './passwords';
import { digestOf, makeRefreshToken } from './refresh-token';
import type { Attempt, SignInThrottle } from './sign-in-throttle';
import { accountIn, firstPlace, roleIn } from './standing';

/** Days that a session lives at most, however often it is refreshed. */
export const sessionDays = 14;
/** Milliseconds in which the token before the last is taken for a race, not a theft. */
const graceMs = 10_000;

export interface Tokens {
  readonly access: string;
  readonly refresh: string;
}

interface Parts {
  readonly database: DataSource;
  readonly tokens: AccessTokens;
  readonly throttle: SignInThrottle;
  readonly now?: () => Date;
}

const notSignedIn = () => new Refusal('sign-in-needed', 'Sign in, then try again.');

export class SessionService {
  private readonly now: () => Date;

  constructor(private readonly parts: Parts) {
    this.now = parts.now ?? (() => new Date());
  }

  /** Signs in. Unknown person, wrong password and nowhere to belong are one and the same answer. */
  async signIn({
    password,
    ...attempt
  }: Attempt & { password: string }): Promise<Tokens & { account: AccountAnswer }> {
    const { database, throttle } = this.parts;
    await throttle.check(attempt);
    const person = await database
      .getRepository(Person)
      .createQueryBuilder('person')
      .addSelect('person.passwordHash')
      .where('lower(person.email) = lower(:email)', { email: attempt.email })
      .getOne();
    const right = await passwordIs(password, person?.passwordHash ?? null);
    const place = person && right ? await firstPlace(database.manager, person.id) : undefined;
    if (!person || !right || place === undefined) {
      await throttle.failed(attempt);
      throw new Refusal('sign-in-refused', 'The e-mail address or the password is not right.');
    }
    return this.open(person.id, place);
  }

  /** Renews both tokens. The token before, presented late, ends the session: it was stolen. */
  async refresh(token: string): Promise<Tokens & { account: AccountAnswer }> {
    const digest = digestOf(token);
    const answer = await this.parts.database.transaction(async (manager) => {
      const session = await manager.getRepository(Session).findOne({
        where: [
          { refreshDigest: digest, endedAt: IsNull() },
          { previousDigest: digest, endedAt: IsNull() },
        ],
        lock: { mode: 'pessimistic_write' },
      });
      if (!session || session.expiresAt <= this.now()) return undefined;
      const isLate = this.now().getTime() - session.rotatedAt.getTime() > graceMs;
      if (!session.refreshDigest.equals(digest) && isLate) {
        await manager.update(Session, session.id, { endedAt: this.now() });
        return undefined;
      }
      const account = await accountIn(manager, session.personId, session.organizationId);
      if (!account) return undefined;
      const refresh = makeRefreshToken();
      await manager.update(Session, session.id, {
        refreshDigest: digestOf(refresh),
        previousDigest: session.refreshDigest,
        rotatedAt: this.now(),
      });
      return { account, refresh, access: this.access(session) };
    });
    if (!answer) throw notSignedIn();
    return answer;
  }

  /** Ends a session; its tokens are dead at their next use. */
  async end(sessionId: string): Promise<void> {
    await this.parts.database
      .getRepository(Session)
      .update({ id: sessionId, endedAt: IsNull() }, { endedAt: this.now() });
  }

  /** Who an access token speaks for now, or undefined where its session is over. */
  async callerOf(token: string): Promise<SessionCaller | undefined> {
    const read = this.parts.tokens.read(token);
    if (!read) return undefined;
    const { manager } = this.parts.database;
    const session = await manager.getRepository(Session).findOneBy({
      id: read.sessionId,
      personId: read.personId,
      endedAt: IsNull(),
    });
    if (!session || session.expiresAt <= this.now()) return undefined;
    const { personId, organizationId } = session;
    const role = await roleIn(manager, personId, organizationId);
    if (!role) return undefined;
    return {
      kind: 'session',
      sessionId: session.id,
      name: `person:${personId}`,
      personId,
      organizationId,
      role,
      scopes: new Set(scopesOfRole[role]),
    };
  }

  async account({ personId, organizationId }: Omit<Member, 'role'>): Promise<AccountAnswer> {
    const account = await accountIn(this.parts.database.manager, personId, organizationId);
    if (!account) throw notSignedIn();
    return account;
  }

  /** Works in another organization of the same person from now on. */
  async choose(
    { sessionId, personId }: SessionCaller,
    organizationId: string,
  ): Promise<AccountAnswer> {
    const account = await accountIn(this.parts.database.manager, personId, organizationId);
    if (!account) throw new Refusal('not-found', 'You do not belong to such an organization.');
    await this.parts.database.getRepository(Session).update(sessionId, { organizationId });
    return account;
  }

  private async open(personId: string, organizationId: string) {
    const account = await this.account({ personId, organizationId });
    const refresh = makeRefreshToken();
    const now = this.now();
    const session = {
      id: randomUUID(),
      personId,
      organizationId,
      refreshDigest: digestOf(refresh),
      previousDigest: null,
      rotatedAt: now,
      createdAt: now,
      expiresAt: new Date(now.getTime() + sessionDays * 86_400_000),
      endedAt: null,
    };
    await this.parts.database.getRepository(Session).insert(session);
    return { account, refresh, access: this.access(session) };
  }

  private access({ personId, id }: Pick<Session, 'personId' | 'id'>): string {
    return this.parts.tokens.of(personId, id);
  }
}
