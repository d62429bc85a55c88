import { stairMarks, stairNames } from '../../../components/chart/stair-labels';
import type { StairRange } from '../../../components/chart/stair';
import { foot, stairOf, stonePath, waterOf } from '../../../components/chart/stair';

const pxPerUnit = 358 / 14;
const x = Object.assign((pH: number) => 16 + pH * pxPerUnit, {
  invert: (px: number) => (px - 16) / pxPerUnit,
});
const panel = { x, left: 16, right: 374, top: 0, base: 118 } as const;

const rangesOf = (pKa: readonly number[], charge: number): StairRange[] =>
  [0, ...pKa].map((_, index) => ({
    index,
    charge: charge - index,
    from: index === 0 ? null : (pKa[index - 1] ?? null),
    to: pKa[index] ?? null,
  }));

const phosphoric = rangesOf([2.148, 7.198, 12.35], 0);
const stair = stairOf(phosphoric, { ...panel, charges: [0, -3] });

describe('the stair', () => {
  test('a tread lies over its range, at the height of its charge', () => {
    expect(stair.treads.map(({ left, right }) => [left, right])).toEqual([
      [16, x(2.148)],
      [x(2.148), x(7.198)],
      [x(7.198), x(12.35)],
      [x(12.35), 374],
    ]);
    expect(stair.treads.map(({ y }) => y)).toEqual([20, 40, 60, 80]);
    expect(stair.level(-1.5)).toBe(50);
  });

  test('the last tread leaves room for its name and the constants', () => {
    expect(panel.base - (stair.treads.at(-1)?.y ?? 0)).toBe(foot + 20);
  });

  test('a form that never predominates has no tread, and the step beside it is double', () => {
    const skipped = stairOf(
      [
        { index: 0, charge: 0, from: null, to: 6.5 },
        { index: 2, charge: -2, from: 6.5, to: null },
      ],
      { ...panel, charges: [0, -2] },
    );
    const [first, second] = skipped.treads;
    expect(skipped.treads).toHaveLength(2);
    expect((second?.y ?? 0) - (first?.y ?? 0)).toBe(2 * skipped.drop);
  });

  test('a range outside the plot has no tread', () => {
    const { treads } = stairOf(rangesOf([-3, 7], 0), { ...panel, charges: [0, -2] });
    expect(treads.map(({ index }) => index)).toEqual([1, 2]);
    expect(treads[0]?.left).toBe(16);
  });

  test('the stone is closed at the base', () => {
    expect(stonePath(stair)).toMatch(/^M16 118L16 20H.*H374L374 118Z$/);
  });
});

describe('the water', () => {
  test('stands at the mean charge, from the first tread it covers', () => {
    expect(waterOf(stair, -1.5)).toEqual({ left: x(7.198), y: 50 });
    expect(waterOf(stair, -0.2)).toEqual({ left: x(2.148), y: 24 });
  });

  test('never stands nearer than 2.5 px to a tread it covers', () => {
    expect(waterOf(stair, -3)).toEqual({ left: x(12.35), y: 77.5 });
    expect(waterOf(stair, -2.99)).toEqual({ left: x(12.35), y: 77.5 });
    expect(waterOf(stair, 0)).toEqual({ left: 16, y: 17.5 });
  });
});

describe('names in the stone', () => {
  const options = { widthOf: () => 40, current: 2, cursor: -100 };

  test('stand at the start of their tread, or back from its end where it is short', () => {
    const names = stairNames(stair, options);
    expect(names.map(({ key, x: at }) => [key, at])).toEqual([
      [0, 22],
      [1, x(2.148) + 6],
      [2, x(7.198) + 6],
      [3, 374 - 3 - 40],
    ]);
    expect(names.map(({ y }) => y)).toEqual([35, 55, 75, 95]);
  });

  test('a name that the cursor crosses moves right of it, or is drawn over the line', () => {
    const cursor = x(7.4);
    const moved = stairNames(stair, { ...options, cursor }).find(({ key }) => key === 2);
    expect(moved).toMatchObject({ x: cursor + 5, halo: false });
    const crossed = stairNames(stair, { ...options, cursor: 350 }).find(({ key }) => key === 3);
    expect(crossed).toMatchObject({ x: 331, halo: true });
  });

  test('on low steps a name that leaves its tread is written only for first, last and current', () => {
    const low = stairOf(rangesOf([2, 3, 4, 5, 6, 7], 0), { ...panel, charges: [0, -6] });
    expect(low.drop).toBeLessThan(16);
    const wide = { ...options, widthOf: () => 28, current: 3 };
    expect(stairNames(low, wide).map(({ key }) => key)).toEqual([0, 3, 6]);
  });
});

describe('constants along the base', () => {
  const mark = (key: number, at: number, width = 36) => ({ key, x: at, width });

  test('stand right of their ticks', () => {
    const labels = stairMarks(stair, { marks: [mark(0, 70), mark(1, 200)], cursor: 0, after: 16 });
    expect(labels.map(({ x: at }) => at)).toEqual([73, 203]);
  });

  test('one that the cursor crosses moves right of it, else left of its tick, else is haloed', () => {
    const at = (cursor: number, marks = [mark(0, 100)]) =>
      stairMarks(stair, { marks, cursor, after: 16 })[0];
    expect(at(110)).toMatchObject({ x: 115, halo: false });
    expect(at(110, [mark(0, 100), mark(1, 145)])).toMatchObject({ x: 61, halo: false });
    expect(at(30, [mark(0, 20), mark(1, 60)])).toMatchObject({ x: 23, halo: true });
  });

  test('none is moved so far that it would be read at another tick', () => {
    const marks = [mark(0, 100), mark(1, 180)];
    const [label] = stairMarks(stair, { marks, cursor: 135, after: 16 });
    expect(label).toMatchObject({ x: 100 - 3 - 36, halo: false });
  });

  test('the last one stands left of its tick where the plot ends', () => {
    const [label] = stairMarks(stair, { marks: [mark(0, 350)], cursor: 0, after: 16 });
    expect(label?.x).toBe(350 - 3 - 36);
  });

  test('none is written over another or over a tick', () => {
    const marks = Array.from({ length: 40 }, (_, i) => mark(i, 60 + i * 6));
    const labels = stairMarks(stair, { marks, cursor: 0, after: 16 });
    expect(labels.map(({ key }) => key)).toEqual([0, 39]);
  });
});
