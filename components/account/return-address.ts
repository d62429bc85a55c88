const name = 'stepwell.return-to';

/**
 * Where to go back to after signing in. It stays in this tab and out of the address of the sign-in
 * page: a server would log it there, and the fragments of our addresses are nobody else's.
 */
export function rememberAddress(): void {
  const { pathname, search, hash } = window.location;
  window.sessionStorage.setItem(name, `${pathname}${search}${hash}`);
}

/** The remembered address, once; the first place where there is none. */
export function takeReturnAddress(): string {
  const address = window.sessionStorage.getItem(name) ?? '/';
  window.sessionStorage.removeItem(name);
  return address;
}
