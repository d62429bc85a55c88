import fc from 'fast-check';
import { contains, overlaps } from '../../../components/chart/geometry';
import type { NamedCurve } from '../../../components/chart/place-names';
import { placeNames } from '../../../components/chart/place-names';

const rect = { x: 0, y: 26, width: 600, height: 240 };
const bounds = { x: 0, y: 0, width: 600, height: 266 };
const zero = rect.y + rect.height;
const panel = { bounds, zero };

/** Fractions of a polyprotic system as curves in px, from the textbook sum. */
function curvesOf(pKa: readonly number[], width = 48): NamedCurve[] {
  const at = (pH: number) => {
    const exponents = [0, ...pKa].map(
      (_, j) => j * pH - pKa.slice(0, j).reduce((a, b) => a + b, 0),
    );
    const top = Math.max(...exponents);
    const terms = exponents.map((exponent) => 10 ** (exponent - top));
    const sum = terms.reduce((a, b) => a + b, 0);
    return terms.map((term) => term / sum);
  };
  const rows = Array.from({ length: 301 }, (_, i) => at((i * 14) / 300));
  return [0, ...pKa].map((_, key) => ({
    key,
    width,
    height: 18,
    points: rows.map((row, i) => ({ x: i * 2, y: zero - (row[key] ?? 0) * rect.height })),
  }));
}

const phosphoric = curvesOf([2.148, 7.198, 12.35]);

describe('names at the curves', () => {
  test('every form of phosphoric acid is named, beside its own peak', () => {
    const names = placeNames(phosphoric, panel);
    expect(names.map(({ key }) => key).sort()).toEqual([0, 1, 2, 3]);
    expect(names.every(({ leader }) => leader === undefined)).toBe(true);
    const peak = (key: number) => Math.min(...(phosphoric[key]?.points.map(({ y }) => y) ?? []));
    for (const { key, anchor } of names) expect(anchor.y - peak(key)).toBeLessThan(20);
  });

  test('edges come first, then inwards', () => {
    expect(placeNames(phosphoric, panel).map(({ key }) => key)).toEqual([0, 3, 1, 2]);
  });

  test('a name keeps out of the cursor’s way where that costs little', () => {
    const cursor = 204;
    const name = placeNames(phosphoric, { ...panel, cursor }).find(({ key }) => key === 1);
    expect(name).toBeDefined();
    const crossed = name && cursor > name.box.x && cursor < name.box.x + name.box.width;
    expect(crossed).toBe(false);
  });

  test('what is already written is not written over', () => {
    const taken = [{ x: 0, y: 0, width: 120, height: 60 }];
    for (const { box } of placeNames(phosphoric, { ...panel, taken })) {
      expect(taken.some((other) => overlaps(other, box))).toBe(false);
    }
    for (const { anchor } of placeNames(phosphoric, { ...panel, taken })) {
      expect(taken.some((other) => overlaps(other, { ...anchor, width: 0, height: 0 }))).toBe(
        false,
      );
    }
  });

  test('a crowd is named only at its edges', () => {
    const crowd = curvesOf(Array.from({ length: 30 }, (_, i) => 4 + i * 0.2));
    const names = placeNames(crowd, panel);
    expect(names.length).toBeLessThan(12);
    expect(names.map(({ key }) => key)).toEqual(expect.arrayContaining([0, 30]));
  });

  test('a panel too low for any name has none', () => {
    expect(placeNames(phosphoric, { ...panel, bounds: { ...bounds, y: 250, height: 16 } })).toEqual(
      [],
    );
  });

  test('no curve, no name', () => {
    expect(placeNames([], panel)).toEqual([]);
    expect(placeNames([{ key: 0, width: 40, height: 18, points: [] }], panel)).toEqual([]);
  });

  test('names stay inside and never overlap, whatever the constants', () => {
    const constants = fc.array(fc.double({ min: -2, max: 16, noNaN: true }), {
      minLength: 1,
      maxLength: 8,
    });
    fc.assert(
      fc.property(constants, fc.integer({ min: 0, max: 600 }), (pKa, cursor) => {
        const names = placeNames(curvesOf(pKa), { ...panel, cursor });
        names.forEach(({ box, anchor }, i) => {
          expect(contains(bounds, box)).toBe(true);
          expect(anchor.x).toBeGreaterThan(0);
          expect(anchor.x).toBeLessThan(600);
          for (const other of names.slice(i + 1)) expect(overlaps(box, other.box)).toBe(false);
        });
      }),
      { numRuns: 60 },
    );
  });
});
