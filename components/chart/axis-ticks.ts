/** A tick of the pH axis. A numeral stands only where there is room for it. */
export interface Tick {
  readonly value: number;
  readonly long: boolean;
  readonly numeral: boolean;
}

/** Least distance of two ticks and of two numerals, px. */
const tickRoom = 4;
const numeralRoom = 36;

const step = (steps: readonly number[], pxPerUnit: number, room: number) =>
  steps.find((size) => size * pxPerUnit >= room) ?? steps[steps.length - 1] ?? 1;

/**
 * Ticks over a whole-numbered domain drawn `width` px wide: one each 0.5, a longer one each 1, a
 * numeral each 1; each of them thinned where they would touch.
 */
export function axisTicks([from, to]: readonly [number, number], width: number): Tick[] {
  const pxPerUnit = width / (to - from);
  const every = step([0.5, 1, 2, 5, 10], pxPerUnit, tickRoom);
  const numeralEvery = step([1, 2, 5, 10, 20], pxPerUnit, numeralRoom);
  const ticks: Tick[] = [];
  for (let k = Math.ceil(from / every); k * every <= to; k++) {
    const value = k * every;
    ticks.push({ value, long: value % 1 === 0, numeral: value % numeralEvery === 0 });
  }
  return ticks;
}
