import { useEffect, useState } from 'react';

/** What a fragment asks for. `faulty` where a part of it could not be used. */
export interface ReadFragment<State> {
  readonly state: State;
  readonly faulty: boolean;
}

interface AddressOptions<State> {
  /** Where the screen lives: `/`. */
  readonly path: string;
  readonly parse: (fragment: string) => ReadFragment<State>;
  readonly format: (state: State) => string;
}

/** Browsers allow about a hundred changes of the address in half a minute: wait for a rest, ms. */
const rest = 200;

/** The address of one compute screen, whose fragment carries everything that makes it what it is. */
export function createAddress<State extends object>({
  path,
  parse,
  format,
}: AddressOptions<State>) {
  /** The last screen of this visit, for a return by a link that carries no state. */
  let lastFragment = '';

  /** The router moves after its screen is there: until then the address is that of another place. */
  const ownHash = () => (window.location.pathname === path ? window.location.hash : '');

  const read = () => parse(ownHash() || lastFragment);

  /**
   * The state of the screen, kept in the address's fragment: reload, back and a shared link give
   * the same screen, and the server never sees it.
   */
  function useAddress() {
    const [{ state, faulty }, setRead] = useState(read);
    const [first] = useState(state);

    useEffect(() => {
      // An address that was opened stays as it is until something is changed.
      const untouched = state === first && (ownHash() !== '' || lastFragment === '');
      if (untouched) return;
      const fragment = format(state);
      lastFragment = fragment;
      // The rest also lets the router, which moves after its screen is there, reach this address.
      const timer = setTimeout(() => {
        window.history.replaceState(window.history.state, '', `#${fragment}`);
      }, rest);
      return () => clearTimeout(timer);
    }, [state, first]);

    useEffect(() => {
      const follow = () => setRead(read());
      window.addEventListener('hashchange', follow);
      return () => window.removeEventListener('hashchange', follow);
    }, []);

    const change = (part: Partial<State>) =>
      setRead((before) => ({ state: { ...before.state, ...part }, faulty: false }));
    return { state, faulty, change };
  }

  return {
    useAddress,
    /** What the screen shows when it is opened next by a link within the app. */
    openNext: (fragment: string): void => {
      lastFragment = fragment;
    },
    /** The address that shows this state. */
    linkTo: (state: State) => `${window.location.origin}${path}#${format(state)}`,
  };
}
