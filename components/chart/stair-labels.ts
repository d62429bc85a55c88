import type { Stair } from './stair';

/** A label of the stair: its left edge and baseline, px; `halo` where the cursor's line crosses it. */
export interface StairLabel {
  readonly key: number;
  readonly x: number;
  readonly y: number;
  readonly halo: boolean;
}

const inset = 6;
const endInset = 3;
const cursorGap = 5;
/** Keeps rounding from counting a label that was just moved away as hit. */
const epsilon = 0.01;
/** With lower steps than this, a name that leaves its tread could meet another, px. */
const namedDrop = 16;
const nameBaseline = 15;

const hits = (cursor: number, x: number, width: number) =>
  cursor > x - cursorGap + epsilon && cursor < x + width + cursorGap;

interface NameOptions {
  readonly widthOf: (index: number) => number;
  readonly current: number;
  readonly cursor: number;
}

/**
 * Names in the stone under their treads: from the start of the tread if they fit, else back from
 * its end (stone always reaches left, so names cannot meet while the steps are high enough; where
 * they are not, only the first, the last and the current form may). A name that the cursor crosses
 * moves right of it if it still fits, else it is drawn over the line.
 */
export function stairNames(stair: Stair, { widthOf, current, cursor }: NameOptions): StairLabel[] {
  const { treads, drop, left } = stair;
  return treads.flatMap(({ index, left: start, right: end, y }, i) => {
    const width = widthOf(index);
    const fits = start + inset + width <= end - endInset;
    const apart = drop >= namedDrop || i === 0 || i === treads.length - 1 || index === current;
    const x = fits ? start + inset : end - endInset - width;
    if ((!fits && !apart) || x < left + endInset) return [];
    const label = { key: index, x, y: y + nameBaseline, halo: false };
    if (!hits(cursor, x, width)) return [label];
    const moved = cursor + cursorGap;
    return [moved + width <= end - endInset ? { ...label, x: moved } : { ...label, halo: true }];
  });
}

interface MarkOptions {
  readonly marks: readonly { readonly key: number; readonly x: number; readonly width: number }[];
  readonly cursor: number;
  /** Right edge of the caption at the start of the row, px. */
  readonly after: number;
}

const markGap = 3;
/** A value farther from its tick than this would be taken for another’s, px. */
const markReach = 20;

/**
 * The constants along the base, each right of its tick. One that the cursor crosses stands right of
 * the cursor, else left of the tick, else over the line; one that would touch the last is left out.
 */
export function stairMarks(stair: Stair, { marks, cursor, after }: MarkOptions): StairLabel[] {
  const y = stair.base - 5;
  const labels: StairLabel[] = [];
  let taken = after;
  marks.forEach(({ key, x: tick, width }, i) => {
    const limit = Math.min(stair.right, (marks[i + 1]?.x ?? Infinity) - 1);
    const fits = (x: number) => x >= taken + markGap && x + width <= limit;
    const free = (x: number) => fits(x) && !hits(cursor, x, width);
    const clearOfLast = (x: number) => x > (marks[i - 1]?.x ?? -Infinity) + 1;
    const plain = tick + markGap;
    const toLeft = tick - markGap - width;
    const beside = cursor + cursorGap;
    const besideIsNear = hits(cursor, plain, width) && beside - tick <= markReach;
    const x = [plain, ...(besideIsNear ? [beside] : []), toLeft].find(
      (at) => free(at) && clearOfLast(at),
    );
    const chosen = x ?? (fits(plain) ? plain : undefined);
    if (chosen === undefined) return;
    labels.push({ key, x: chosen, y, halo: x === undefined });
    taken = chosen + width;
  });
  return labels;
}
