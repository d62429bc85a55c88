/** Where an editable combobox stands: whether its list is open, and the option the keys are at. */
export interface ComboboxState {
  readonly open: boolean;
  /** Index of an option, or `inText`. */
  readonly at: number;
}

/** What a key does: the new state, and whether the option at it is taken. */
export interface ComboboxMove {
  readonly state: ComboboxState;
  readonly take: boolean;
}

/** Where the keys are before they go into the list. */
export const inText = -1;

/**
 * Keys of an editable combobox with a list, after the WAI-ARIA practices; undefined where the key
 * is the text's own or the page's. `count` is the number of options, at least 1.
 */
export function comboboxMove(
  { key, altKey }: { readonly key: string; readonly altKey: boolean },
  { open, at }: ComboboxState,
  count: number,
): ComboboxMove | undefined {
  const to = (next: number, take = false) => ({ state: { open: !take, at: next }, take });
  const close = { state: { open: false, at: inText }, take: false };
  switch (key) {
    case 'ArrowDown':
      if (altKey) return to(inText);
      return to(open && at < count - 1 ? at + 1 : 0);
    case 'ArrowUp':
      if (altKey) return open ? close : undefined;
      return to(open && at > 0 ? at - 1 : count - 1);
    case 'Enter':
      return open && at !== inText ? to(at, true) : undefined;
    case 'Escape':
      return open ? close : undefined;
    default:
      return undefined;
  }
}
