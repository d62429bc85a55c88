import type { AccountAnswer } from '../../shared/account';

/** Who is at the screen, as far as the service has said. */
export type Session =
  | { readonly state: 'nobody' }
  | { readonly state: 'signed-in'; readonly who: AccountAnswer }
  /** Signed out elsewhere, or run out: what this person had on screen stays. */
  | { readonly state: 'ended'; readonly who: AccountAnswer };

/** The session after the service said that nobody is signed in. */
export const withoutSession = (before: Session | undefined): Session =>
  before === undefined || before.state === 'nobody'
    ? { state: 'nobody' }
    : { state: 'ended', who: before.who };

/** Whoever is signed in, or was until a moment ago. */
export const whoOf = (session: Session | undefined): AccountAnswer | undefined =>
  session === undefined || session.state === 'nobody' ? undefined : session.who;

/** Whether two sessions may show the same things: same person, same organization, same role. */
export const sameStanding = (one: AccountAnswer, other: AccountAnswer) =>
  one.account.id === other.account.id &&
  one.organization.id === other.organization.id &&
  one.role === other.role;
