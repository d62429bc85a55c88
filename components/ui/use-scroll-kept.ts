import { useEffect } from 'react';

/** Where each entry of the browser's history stood, by the id that the router gives it. */
const kept = new Map<string, number>();

function entryId(): string {
  const state: unknown = window.history.state;
  const id = typeof state === 'object' && state !== null && 'id' in state ? state.id : undefined;
  return typeof id === 'string' ? id : '';
}

/** The entry that the document was opened at, where the browser restores by itself. */
const openedAt = entryId();

/**
 * What a browser does by itself between documents: a new page begins at its top, and the way back
 * leads to where a page stood. It must be as long at once as it was, from what was fetched before.
 */
export function useScrollKept() {
  useEffect(() => {
    const keep = () => kept.set(entryId(), window.scrollY);
    // By the next frame the router has moved to this page's entry, and the browser has restored
    // what it knows: where the page stood when the router had already drawn the one after it.
    const frame = requestAnimationFrame(() => {
      const id = entryId();
      if (kept.has(id) || id !== openedAt) window.scrollTo(0, kept.get(id) ?? 0);
      window.addEventListener('scroll', keep, { passive: true });
    });
    return () => {
      cancelAnimationFrame(frame);
      window.removeEventListener('scroll', keep);
    };
  }, []);
}
