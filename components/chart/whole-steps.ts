/** Least distance of two numerals of a vertical axis, px. */
const room = 16;

/**
 * Whole numbers from `first` down to `last`, both always among them, thinned so that their numerals
 * do not touch on an axis `height` px high.
 */
export function wholeSteps([first, last]: readonly [number, number], height: number): number[] {
  const pxPerUnit = height / Math.max(1, first - last);
  const every = [1, 2, 5, 10, 20, 50].find((size) => size * pxPerUnit >= room) ?? first - last;
  const between: number[] = [];
  for (let value = Math.floor(first / every) * every; value > last; value -= every) {
    const clear = Math.min(first - value, value - last) * pxPerUnit >= room;
    if (clear) between.push(value);
  }
  return [first, ...between, last];
}
