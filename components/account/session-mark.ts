import type { AccountAnswer } from '../../shared/account';

const name = 'stepwell.session';

/**
 * A note, in the browser, of who works here and in which organization. The session itself lies in
 * cookies that no script can read; the note says whether asking for it is worth a call, so that a
 * visitor who never signed in makes none, and it tells the other tabs when something changed.
 */
export function noteSession(who: AccountAnswer | undefined): void {
  withStorage((storage) => {
    if (who) storage.setItem(name, `${who.account.id} ${who.organization.id}`);
    else storage.removeItem(name);
  });
}

/** Whether somebody signed in with this browser and did not sign out. */
export const isSessionNoted = () =>
  withStorage((storage) => storage.getItem(name) !== null) ?? false;

/** Calls back when another tab signs in, signs out or changes the organization. */
export function onSessionNoted(changed: () => void): () => void {
  const listen = (event: StorageEvent) => {
    if (event.key === name || event.key === null) changed();
  };
  window.addEventListener('storage', listen);
  return () => window.removeEventListener('storage', listen);
}

/** A browser that allows no storage allows no cookies either: then nobody is signed in. */
function withStorage<Result>(work: (storage: Storage) => Result): Result | undefined {
  try {
    return work(window.localStorage);
  } catch {
    return undefined;
  }
}
