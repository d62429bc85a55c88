import { useEffect, useState } from 'react';
import type { CurvesState } from './curves-state';
import { formatFragment, parseFragment } from './fragment';

/** Browsers allow about a hundred changes of the address in half a minute: wait for a rest, ms. */
const rest = 200;

/** The last screen of this visit, for a return to Curves by a link that carries no state. */
let lastFragment = '';

/** The router moves after its screen is there: until then the address is that of another place. */
const ownHash = () => (window.location.pathname === '/' ? window.location.hash : '');

const read = () => parseFragment(ownHash() || lastFragment);

/** What Curves shows when it is opened next by a link within the app. */
export const openNext = (fragment: string): void => {
  lastFragment = fragment;
};

/**
 * The state of the screen, kept in the address's fragment: reload, back and a shared link give the
 * same screen, and the server never sees it.
 */
export function useAddress() {
  const [{ state, faulty }, setRead] = useState(read);
  const [first] = useState(state);

  useEffect(() => {
    // An address that was opened stays as it is until something is changed.
    const untouched = state === first && (ownHash() !== '' || lastFragment === '');
    if (untouched) return;
    const fragment = formatFragment(state);
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

  const change = (part: Partial<CurvesState>) =>
    setRead((before) => ({ state: { ...before.state, ...part }, faulty: false }));
  return { state, faulty, change };
}

/** The address that shows this state. */
export const linkTo = (state: CurvesState) =>
  `${window.location.origin}${window.location.pathname}#${formatFragment(state)}`;
