import { randomUUID } from 'node:crypto';
import { IsNull, Not, type DataSource } from 'typeorm';
import type { AccountAnswer } from '../../../shared/account';
import { scopesOfRole } from '../../../shared/scopes';
import { Person } from '../../database/entities/person';
import { Session } from '../../database/entities/session';
import { Refusal } from '../../refusal';
import type { Actor, CallSource, Member, SessionCaller } from '../caller';
import type { AccessTokens } from './access-token';
import { passwordIs } from './passwords';
import { digestOf, type RefreshTokens } from './refresh-token';
import type { Attempt, SignInThrottle } from './sign-in-throttle';
import {
  recordChoice,
  recordLeaving,
  recordOpening,
  recordRefusal,
  recordReuse,
  recordSignOut,
} from './session-acts';
import { accountIn, firstPlace, roleIn } from './standing';

/** Days that a session lives at most, however often it is refreshed. */
export const sessionDays = 14;
/** Milliseconds in which the token before the last is taken for a race, not a theft. */
const graceMs = 10_000;

export interface Tokens {
  readonly access: string;
  readonly refresh: string;
}

type SignedIn = Tokens & { readonly account: AccountAnswer };
type Place = Omit<Member, 'role'>;
type Source = Partial<CallSource>;
type SignIn = Attempt & Source & { readonly password: string };
type Renewed = Partial<Tokens> & Omit<SignedIn, 'refresh'>;

interface Parts {
  readonly database: DataSource;
  readonly tokens: AccessTokens;
  readonly refreshTokens: RefreshTokens;
  readonly throttle: SignInThrottle;
  readonly now?: () => Date;
}

/** The nil UUID (RFC 9562 §5.9), which no person has. */
const nobody = '00000000-0000-0000-0000-000000000000';

/** Nobody is signed in, or no longer. */
export const notSignedIn = () => new Refusal('sign-in-needed', 'Sign in, then try again.');

export class SessionService {
  private readonly now: () => Date;

  constructor(private readonly parts: Parts) {
    this.now = parts.now ?? (() => new Date());
  }

  /**
   * Signs in. Unknown person, wrong password and nowhere to belong are one and the same answer. The
   * signal tells that the caller has gone, and no password is hashed for nobody.
   */
  async signIn({ password, ...attempt }: SignIn, signal?: AbortSignal): Promise<SignedIn> {
    const { database, throttle } = this.parts;
    await throttle.check(attempt);
    const person = await database
      .getRepository(Person)
      .createQueryBuilder('person')
      .addSelect('person.passwordHash')
      .where('lower(person.email) = lower(:email)', { email: attempt.email })
      .getOne();
    const right = await passwordIs(password, person?.passwordHash ?? null, signal);
    // Looked up for whoever it is, so that nobody can tell by the time who is known.
    const place = await firstPlace(database.manager, person?.id ?? nobody);
    if (!person || !right || place === undefined) {
      if (await throttle.failed(attempt)) {
        const refused = { personId: person?.id, organizationId: place, isRight: right };
        await recordRefusal(database.manager, attempt, refused);
      }
      throw new Refusal('sign-in-refused', 'The e-mail address or the password is not right.');
    }
    return this.open({ personId: person.id, organizationId: place }, attempt);
  }

  /**
   * Renews both tokens. The token before, within ten seconds, is a race of two tabs and gets a new
   * access token alone. Any other token that names the session is a stolen one: the session ends.
   */
  async refresh(token: string, source: Source = {}): Promise<Renewed> {
    const id = this.parts.refreshTokens.sessionOf(token);
    if (id === undefined) throw notSignedIn();
    const answer = await this.parts.database.transaction(async (manager) => {
      const session = await manager.getRepository(Session).findOne({
        where: { id, endedAt: IsNull() },
        lock: { mode: 'pessimistic_write' },
      });
      if (!session || session.expiresAt <= this.now()) return undefined;
      const use = this.useOf(session, digestOf(token));
      const account = await accountIn(manager, session.personId, session.organizationId);
      if (use === 'stolen' || !account) {
        await manager.update(Session, id, { endedAt: this.now() });
        const record = use === 'stolen' ? recordReuse : recordLeaving;
        await record(manager, session, source);
        return undefined;
      }
      const access = this.access(session);
      if (use === 'race') return { account, access };
      const refresh = this.parts.refreshTokens.of(id);
      await manager.update(Session, id, {
        refreshDigest: digestOf(refresh),
        previousDigest: session.refreshDigest,
        rotatedAt: this.now(),
      });
      return { account, access, refresh };
    });
    if (!answer) throw notSignedIn();
    return answer;
  }

  private useOf(session: Session, digest: Buffer): 'renewal' | 'race' | 'stolen' {
    if (session.refreshDigest.equals(digest)) return 'renewal';
    const isRecent = this.now().getTime() - session.rotatedAt.getTime() <= graceMs;
    return isRecent && session.previousDigest?.equals(digest) ? 'race' : 'stolen';
  }

  /** Ends a session; its tokens are dead at their next use. */
  async end(caller: Actor & Pick<SessionCaller, 'sessionId'>): Promise<void> {
    const { sessionId: id } = caller;
    await this.parts.database.transaction(async (manager) => {
      const change = { endedAt: this.now() };
      const { affected } = await manager.update(Session, { id, endedAt: IsNull() }, change);
      if (affected !== 0) await recordSignOut(manager, caller);
    });
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

  async account({ personId, organizationId }: Place): Promise<AccountAnswer> {
    const account = await accountIn(this.parts.database.manager, personId, organizationId);
    if (!account) throw notSignedIn();
    return account;
  }

  /** Works in another organization of the same person from now on. */
  async choose(caller: Actor & SessionCaller, organizationId: string): Promise<AccountAnswer> {
    const { manager } = this.parts.database;
    const account = await accountIn(manager, caller.personId, organizationId);
    if (!account) throw new Refusal('not-found', 'You do not belong to such an organization.');
    await manager.transaction(async (within) => {
      const elsewhere = { id: caller.sessionId, organizationId: Not(organizationId) };
      const { affected } = await within.update(Session, elsewhere, { organizationId });
      if (affected !== 0) await recordChoice(within, caller, account.organization);
    });
    return account;
  }

  private async open({ personId, organizationId }: Place, source: Source) {
    const account = await this.account({ personId, organizationId });
    const id = randomUUID();
    const refresh = this.parts.refreshTokens.of(id);
    const now = this.now();
    const session = {
      id,
      personId,
      organizationId,
      refreshDigest: digestOf(refresh),
      previousDigest: null,
      rotatedAt: now,
      createdAt: now,
      expiresAt: new Date(now.getTime() + sessionDays * 86_400_000),
      endedAt: null,
    };
    await this.parts.database.transaction(async (manager) => {
      await manager.insert(Session, session);
      await recordOpening(manager, session, source);
    });
    return { account, refresh, access: this.access(session) };
  }

  private access({ personId, id }: Pick<Session, 'personId' | 'id'>): string {
    return this.parts.tokens.of(personId, id);
  }
}
