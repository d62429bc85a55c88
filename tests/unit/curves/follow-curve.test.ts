import fc from 'fast-check';
import { followCurve } from '../../../components/curves/follow-curve';
import { neighbourRatio } from '../../../components/curves/neighbours';
import type { FractionPoint, FractionsAnswer } from '../../../shared/fractions';

/** The textbook sum in doubles, for systems whose terms stay within their range. */
function pointAt(pKa: readonly number[], charge: number, pH: number, text: string): FractionPoint {
  const exponents = [0, ...pKa].map((_, j) => j * pH - pKa.slice(0, j).reduce((a, b) => a + b, 0));
  const top = Math.max(...exponents);
  const terms = exponents.map((exponent) => 10 ** (exponent - top));
  const sum = terms.reduce((a, b) => a + b, 0);
  const fractions = terms.map((term) => term / sum);
  return {
    pH: text,
    fractions: fractions.map((alpha) => alpha.toPrecision(6)),
    neighbourRatios: pKa.map((value) => (10 ** (pH - value)).toPrecision(6)),
    meanCharge: fractions.reduce((z, alpha, j) => z + (charge - j) * alpha, 0).toFixed(6),
    predominant: fractions.indexOf(Math.max(...fractions)),
  };
}

const answerOf = (pKa: readonly number[], charge: number) =>
  ({
    species: [0, ...pKa].map((_, index) => ({
      index,
      charge: charge - index,
      protonsLost: index,
    })),
    points: Array.from({ length: 701 }, (_, i) =>
      pointAt(pKa, charge, i * 0.02, (i * 0.02).toFixed(2)),
    ),
  }) as unknown as FractionsAnswer;

describe('the reading that follows the curve', () => {
  test('phosphoric acid at pH 7.41, between two points of the grid', () => {
    const reading = followCurve(answerOf([2.148, 7.198, 12.35], 0), '7.41');
    expect(reading?.predominant).toBe(2);
    expect(Number(reading?.fractions[2])).toBeCloseTo(0.61965, 4);
    expect(Number(reading?.neighbourRatios[1])).toBeCloseTo(1.6293, 3);
    expect(Number(reading?.meanCharge)).toBeCloseTo(-1.61966, 4);
    expect(reading?.exact).toBe(false);
  });

  test('agrees with the sum itself to five digits at any pH', () => {
    const pKa = fc.array(fc.double({ min: 0, max: 14, noNaN: true }), {
      minLength: 1,
      maxLength: 6,
    });
    fc.assert(
      fc.property(pKa, fc.integer({ min: 0, max: 14000 }), (constants, thousandths) => {
        const pH = thousandths / 1000;
        const reading = followCurve(answerOf(constants, 2), pH.toFixed(3));
        const exact = pointAt(constants, 2, pH, '');
        exact.fractions.forEach((alpha, j) => {
          const followed = Number(reading?.fractions[j]);
          expect(Math.abs(followed / Number(alpha) - 1)).toBeLessThan(2e-5);
        });
        expect(Number(reading?.meanCharge)).toBeCloseTo(Number(exact.meanCharge), 4);
      }),
      { numRuns: 200 },
    );
  });

  test('beyond the last point it follows from the last point', () => {
    const reading = followCurve(answerOf([7], 1), '14.00');
    expect(Number(reading?.neighbourRatios[0])).toBeCloseTo(1e7, -2);
  });
});

describe('the ratio beside the cursor', () => {
  const reading = {
    pH: '7.40',
    fractions: ['2.2e-6', '0.386', '0.614', '6.9e-6'],
    neighbourRatios: ['178649', '1.592', '0.00001122'],
    meanCharge: '-1.61',
    predominant: 2,
    exact: true,
  };

  test('is the less protonated over the more protonated of the two commonest neighbours', () => {
    expect(neighbourRatio(reading)).toEqual({ over: 2, under: 1, ratio: '1.592' });
    expect(neighbourRatio({ ...reading, fractions: ['0', '0.386', '0.614', '0.4'] })).toEqual({
      over: 3,
      under: 2,
      ratio: '0.00001122',
    });
  });

  test('at either end there is one neighbour', () => {
    expect(neighbourRatio({ ...reading, predominant: 0 })).toMatchObject({ over: 1, under: 0 });
    expect(neighbourRatio({ ...reading, predominant: 3 })).toMatchObject({ over: 3, under: 2 });
  });
});
