/** Where a list lies in the window, in px. */
export interface Placement {
  readonly left: number;
  readonly width: number;
  readonly maxHeight: number;
  readonly top: number | 'auto';
  readonly bottom: number | 'auto';
}

const gap = 4;
const margin = 8;
const comfortable = 240;

/**
 * Under the anchor, or over it where there is more room; as wide as it, or as `leastWidth`; never
 * out of the window.
 */
export function placeBeside(
  anchor: {
    readonly left: number;
    readonly top: number;
    readonly bottom: number;
    readonly width: number;
  },
  { innerHeight, innerWidth }: { readonly innerHeight: number; readonly innerWidth: number },
  leastWidth = 0,
): Placement {
  const below = innerHeight - anchor.bottom - gap - margin;
  const above = anchor.top - gap - margin;
  const width = Math.min(Math.max(anchor.width, leastWidth), innerWidth - 2 * margin);
  const left = Math.min(anchor.left, innerWidth - margin - width);
  return below >= Math.min(comfortable, above)
    ? { left, width, maxHeight: below, top: anchor.bottom + gap, bottom: 'auto' }
    : { left, width, maxHeight: above, top: 'auto', bottom: innerHeight - anchor.top + gap };
}
