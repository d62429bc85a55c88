import Decimal from 'decimal.js';
import { fractionPoints } from '../../server/chem';
import worked from './data/worked-examples.json';

/**
 * Textbook examples with printed answers; each title names its source and says where the values
 * were recalled. Tolerance: half a unit in the last digit of every printed number, no more.
 */
const Wide = Decimal.clone({ defaults: true, precision: 40, rounding: Decimal.ROUND_HALF_EVEN });
const recalled = (provenance: string) => (provenance.startsWith('memory') ? ', recalled' : '');
const pOf = (constant: string) => new Wide(constant).log(10).negated().toFixed(20);
const constantsOf = (row: { pKa?: string[]; Ka?: string[] }) => row.pKa ?? row.Ka?.map(pOf) ?? [];

/** What a printed number may stand for. */
const printed = (text: string) => {
  const value = new Wide(text);
  const [mantissa = '', exponent = '0'] = text.split('e');
  const places = (mantissa.split('.')[1]?.length ?? 0) - Number(exponent);
  const half = new Wide(`5e${-places - 1}`);
  return { low: value.minus(half), high: value.plus(half) };
};

const at = (pKa: string[], pH: Decimal) => {
  const [point] = fractionPoints(
    { fullyProtonatedCharge: 0, pKa },
    { kind: 'list', values: [pH.toFixed(20)] },
    20,
  );
  if (point === undefined) throw new Error('No point was answered.');
  return point;
};

const expectWithin = (value: string | undefined, low: Decimal, high: Decimal) => {
  expect(new Wide(value ?? NaN).greaterThanOrEqualTo(low)).toBe(true);
  expect(new Wide(value ?? NaN).lessThanOrEqualTo(high)).toBe(true);
};

describe('buffers: the ratio taken is the ratio at the printed pH', () => {
  test.each(
    worked.ratios.map((row) => [row.problem, `${row.source}${recalled(row.provenance)}`, row]),
  )('%s (%s)', (_problem, _source, row) => {
    if (typeof row === 'string') throw new Error('A row is missing.');
    const { low, high } = printed(row.pH);
    const taken = new Wide(row.base).dividedBy(row.acid);
    const ratioAt = (pH: Decimal) => at(constantsOf(row), pH).neighbourRatios[0];
    expectWithin(taken.toString(), new Wide(ratioAt(low) ?? NaN), new Wide(ratioAt(high) ?? NaN));
  });
});

describe('compositions at the printed [H₃O⁺]', () => {
  const rows = worked.compositions.map((row) => ({
    ...row,
    point: at(constantsOf(row), new Wide(row.hydrogen).log(10).negated()),
  }));
  const rowOf = (start: string) => {
    const row = rows.find(({ problem }) => problem.startsWith(start));
    if (row === undefined) throw new Error(`There is no example "${start}".`);
    return row;
  };
  const ratioOf = (numerator: string, denominator: string) => {
    const [over, under] = [printed(numerator), printed(denominator)];
    return { low: over.low.dividedBy(under.high), high: over.high.dividedBy(under.low) };
  };

  test('0.010 M phthalic acid: fractions are the printed amounts over the total (OpenStax)', () => {
    const { amounts, total, point } = rowOf('0.010 M phthalic acid');
    expect(amounts).toHaveLength(3);
    amounts.forEach((amount, i) => {
      const { low, high } = printed(amount ?? '');
      expectWithin(point.fractions[i], low.dividedBy(total), high.dividedBy(total));
    });
  });

  test('0.033 M carbonic acid: ratios are those of the printed amounts (OpenStax)', () => {
    // The printed carbonate is K₂ itself, by the book's [H₃O⁺] = [HCO₃⁻]: see `note` in the data.
    const { amounts, total, point } = rowOf('0.033 M H2CO3');
    const [, bicarbonate, carbonate] = amounts;
    const first = ratioOf(bicarbonate ?? '', total);
    expectWithin(point.neighbourRatios[0], first.low, first.high);
    const second = ratioOf(carbonate ?? '', bicarbonate ?? '');
    expectWithin(point.neighbourRatios[1], second.low, second.high);
  });

  test('0.050 M nicotine: the ratio of the cations is that of the printed amounts (OpenStax)', () => {
    const { amounts, point } = rowOf('nicotine');
    const [twice, once] = amounts;
    const { low, high } = ratioOf(once ?? '', twice ?? '');
    expectWithin(point.neighbourRatios[0], low, high);
  });
});
