/** Where a choice stands: whether its list is open, and which option the keys are at. */
export interface ChoiceState {
  readonly open: boolean;
  readonly at: number;
}

/** What a key does to a choice. */
export interface ChoiceMove {
  readonly state: ChoiceState;
  /** Take the option at `state.at`. */
  readonly take: boolean;
  /** Keep the key from the browser. */
  readonly consumed: boolean;
}

const page = 10;

/** Where each moving key goes from `at`, before it is kept within the list. */
const targets: Readonly<Record<string, (at: number, last: number) => number>> = {
  ArrowDown: (at) => at + 1,
  ArrowUp: (at) => at - 1,
  Home: () => 0,
  End: (_, last) => last,
  PageDown: (at) => at + page,
  PageUp: (at) => at - page,
};

/**
 * Keys of a select-only combobox after the WAI-ARIA practices; undefined where the key means
 * nothing to it. `count` is the number of options, at least 1.
 */
export function choiceMove(
  { key, altKey }: { readonly key: string; readonly altKey: boolean },
  { open, at }: ChoiceState,
  count: number,
): ChoiceMove | undefined {
  const last = count - 1;
  const target = targets[key];
  if (!open) {
    const opens = key === 'Enter' || key === ' ' || target !== undefined;
    if (!opens) return undefined;
    const to = key === 'Home' ? 0 : key === 'End' ? last : at;
    return { state: { open: true, at: to }, take: false, consumed: true };
  }
  if (key === 'Escape') return { state: { open: false, at }, take: false, consumed: true };
  if (key === 'Enter' || key === ' ' || (altKey && key === 'ArrowUp')) {
    return { state: { open: false, at }, take: true, consumed: true };
  }
  if (key === 'Tab') return { state: { open: false, at }, take: true, consumed: false };
  if (!target) return undefined;
  const to = Math.min(Math.max(target(at, last), 0), last);
  return { state: { open: true, at: to }, take: false, consumed: true };
}

/**
 * Option that typed letters lead to: the first whose label starts with them, searched from `at`
 * on for a longer word and past `at` for a single letter; −1 where none does.
 */
export function typedOption(typed: string, labels: readonly string[], at: number): number {
  const wanted = typed.toLocaleLowerCase();
  const from = typed.length === 1 ? at + 1 : at;
  const order = labels.map((_, index) => (from + index) % labels.length);
  return order.find((index) => labels[index]?.toLocaleLowerCase().startsWith(wanted)) ?? -1;
}
