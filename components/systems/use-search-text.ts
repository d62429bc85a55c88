import { useEffect, useState } from 'react';

/** Browsers allow about a hundred changes of the address in half a minute: wait for a rest, ms. */
const rest = 300;
const name = 'find=';

/** What the address's fragment asks to be found; nothing where it is broken or another's. */
function read(): string {
  const fragment = window.location.hash.slice(1);
  if (!fragment.startsWith(name)) return '';
  try {
    return decodeURIComponent(fragment.slice(name.length));
  } catch {
    return '';
  }
}

/**
 * The text that is searched for, kept in the fragment of this list's own address: reload, back and
 * a shared link find the same, and no server logs it.
 */
export function useSearchText(here: boolean): [string, (text: string) => void] {
  const [text, setText] = useState(read);
  useEffect(() => {
    if (!here) return;
    const timer = setTimeout(() => {
      if (text === read()) return;
      const { pathname } = window.location;
      const fragment = text === '' ? '' : `#${name}${encodeURIComponent(text.toWellFormed())}`;
      window.history.replaceState(window.history.state, '', `${pathname}${fragment}`);
    }, rest);
    return () => clearTimeout(timer);
  }, [here, text]);
  return [text, setText];
}
