import { useEffect, useRef } from 'react';

/** What the Navigation API tells of a step; TypeScript's own types do not know it yet. */
interface NavigateEvent extends Event {
  readonly navigationType: 'push' | 'reload' | 'replace' | 'traverse';
}

const navigation = () => (window as { navigation?: EventTarget }).navigation;

/**
 * While `active`: the browser asks before this page is closed or reloaded, and a step back calls
 * `ask` and stays, in browsers that let a page hold it.
 */
export function useBeforeLeaving(active: boolean, ask: () => void): void {
  const latest = useRef(ask);
  useEffect(() => {
    latest.current = ask;
  });
  useEffect(() => {
    if (!active) return;
    const unload = (event: Event) => event.preventDefault();
    const step = (event: Event) => {
      if ((event as NavigateEvent).navigationType !== 'traverse' || !event.cancelable) return;
      event.preventDefault();
      latest.current();
    };
    window.addEventListener('beforeunload', unload);
    navigation()?.addEventListener('navigate', step);
    return () => {
      window.removeEventListener('beforeunload', unload);
      navigation()?.removeEventListener('navigate', step);
    };
  }, [active]);
}
