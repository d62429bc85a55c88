import { clipCurve } from '../../../components/chart/clip-curve';
import {
  capacityAt,
  capacityOf,
  capacityTop,
  hydrogenAt,
  hydroxideAt,
} from '../../../components/curves/capacity';
import type { DrawnCurve } from '../../../components/curves/drawn-curve';
import type { Reading } from '../../../components/curves/follow-curve';
import { whyNoPoint } from '../../../components/curves/isoelectric';
import { lg, lgConcentration, shownLg } from '../../../components/curves/lg-c';
import { shownCapacity } from '../../../components/curves/rounded';
import type { BufferCapacityAnswer } from '../../../shared/buffer-capacity';

describe('the logarithmic diagram', () => {
  test('lg c is lg α + lg of the total', () => {
    expect(lgConcentration('0.5', 0.05)).toBeCloseTo(Math.log10(0.025), 12);
    expect(lgConcentration('1', 0.05)).toBeCloseTo(-1.30103, 5);
  });

  test('a fraction far below what a double holds still has its logarithm', () => {
    expect(lg('1e-400')).toBe(-400);
    expect(lg('2.15937e-320')).toBeCloseTo(-320 + Math.log10(2.15937), 10);
    expect(lg('0.00000215937')).toBeCloseTo(-5.66567, 5);
  });

  test('nothing has no logarithm, and says so', () => {
    expect(lg('0')).toBe(-Infinity);
    expect(shownLg(lg('0'))).toBe('none');
    expect(shownLg(-0.001)).toBe('0.00');
  });
});

/** Acetic acid (pKa 4.756) at 0.1 mol/L and 25 °C, I = 0: ln 10·(c(H⁺) + c(OH⁻) + c α₀ α₁). */
const pKa = 4.756;
const pKw = 13.995;
const total = 0.1;
const share = (pH: number) => 1 / (1 + 10 ** (pH - pKa));
const waterAt = (pH: number) => Math.LN10 * (10 ** -pH + 10 ** (pH - pKw));
const betaAt = (pH: number) => waterAt(pH) + Math.LN10 * total * share(pH) * (1 - share(pH));
const grid = Array.from({ length: 141 }, (_, i) => i / 10);
const capacity = capacityOf(
  {
    points: grid.map((pH) => ({
      pH: String(pH),
      total: betaAt(pH).toPrecision(6),
      water: waterAt(pH).toPrecision(6),
      components: [],
    })),
    maxima: [{ pH: String(pKa), total: betaAt(pKa).toPrecision(6) }],
  } as unknown as BufferCapacityAnswer,
  String(total),
);
const readingAt = (pH: number): Reading => ({
  pH: String(pH),
  fractions: [String(share(pH)), String(1 - share(pH))],
  neighbourRatios: [],
  meanCharge: '0',
  predominant: 0,
  exact: true,
});

describe('buffer capacity', () => {
  test('the part of water gives c(H⁺) and c(OH⁻) to the digits of the answer', () => {
    expect(hydrogenAt(capacity, 7) / 1e-7).toBeCloseTo(1, 5);
    expect(hydroxideAt(capacity, 7) / 10 ** (7 - pKw)).toBeCloseTo(1, 5);
  });

  test.each([0, 2.5, 4.756, 7.03, 9, 13.5])(
    'follows the cursor by its own relation, pH %s',
    (pH) => {
      // Six digits of the answer carry over.
      expect(capacityAt(capacity, readingAt(pH)) / (1000 * betaAt(pH))).toBeCloseTo(1, 5);
    },
  );

  test('a lone monoprotic buffer peaks at 0.576 c, and the axis ends just above', () => {
    expect(capacity.maxima[0]?.value).toBeCloseTo(57.6, 1);
    expect(capacityTop(capacity)).toBe(60);
  });

  test('without a maximum the axis ends where a lone buffer would', () => {
    expect(capacityTop({ ...capacity, maxima: [] })).toBe(60);
  });

  test('three digits are shown', () => {
    expect([57.563, 3.1591, 0.30712, 1204.4, 0.00004].map(shownCapacity)).toEqual([
      '57.6',
      '3.16',
      '0.307',
      '1200',
      '4.00e-5',
    ]);
  });
});

describe('a curve clipped at its axis', () => {
  const clip = (...ys: number[]) =>
    clipCurve(
      ys.map((y, x) => ({ x, y })),
      [0, 10],
    ).map(({ x, y, drawn }) => (drawn ? [x, y] : 'up'));

  test('ends on the bound and begins on it', () => {
    expect(clip(20, 0, 5)).toEqual(['up', [0.5, 10], [1, 0], [2, 5]]);
    expect(clip(5, 15)).toEqual([[0, 5], [0.5, 10], 'up']);
  });

  test('what has no logarithm is left out', () => {
    expect(clip(-Infinity, 5)).toEqual(['up', [1, 5]]);
  });
});

test('a charge that keeps one sign is why there is no isoelectric point', () => {
  const withCharges = (charges: number[]) => ({ curve: { charges } }) as unknown as DrawnCurve;
  expect(whyNoPoint(withCharges([0, -1, -2]))).toBe('charge ≤ 0');
  expect(whyNoPoint(withCharges([1, 0]))).toBe('charge ≥ 0');
  expect(whyNoPoint(withCharges([1, 0, -1]))).toBeUndefined();
});
