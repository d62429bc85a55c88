import type { KeyboardEvent } from 'react';

const stops =
  'a[href], button:not([disabled]), input:not([disabled]), select, textarea, [tabindex="0"]';

/** Tab past the last stop leads to the first one, Shift+Tab past the first to the last. */
export function keepFocusWithin(event: KeyboardEvent<HTMLElement>) {
  if (event.key !== 'Tab') return;
  const all = Array.from(event.currentTarget.querySelectorAll<HTMLElement>(stops)).filter(
    (stop) => stop.tabIndex >= 0,
  );
  const edge = event.shiftKey ? all[0] : all.at(-1);
  if (document.activeElement !== edge) return;
  event.preventDefault();
  (event.shiftKey ? all.at(-1) : all[0])?.focus();
}
