/** How far a key moves the pH cursor, or to which end. */
export type CursorMove =
  { readonly by: '0.01' | '0.1' | '0.5'; readonly sign: 1 | -1 } | { readonly to: 'start' | 'end' };

/** What a key press asks of the cursor; undefined for a key that is not its own. */
export function cursorMove(key: string, shift: boolean): CursorMove | undefined {
  const arrow = shift ? '0.1' : '0.01';
  switch (key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return { by: arrow, sign: 1 };
    case 'ArrowLeft':
    case 'ArrowDown':
      return { by: arrow, sign: -1 };
    case 'PageUp':
      return { by: '0.5', sign: 1 };
    case 'PageDown':
      return { by: '0.5', sign: -1 };
    case 'Home':
      return { to: 'start' };
    case 'End':
      return { to: 'end' };
    default:
      return undefined;
  }
}
