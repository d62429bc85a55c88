import Decimal from 'decimal.js';
import { fractionPoints } from '../../server/chem';
import reference from './data/high-precision.json';

/**
 * Source: `source` of data/high-precision.json, computed with 90 digits from the defining relations
 * by a program that shares nothing with ours. All 40 digits are compared, as numbers.
 */
const Wide = Decimal.clone({ defaults: true, precision: 100, rounding: Decimal.ROUND_HALF_EVEN });
const answer = (row: { answer: string | string[] }) => [row.answer].flat();
const rowsOf = (kind: string) => reference.rows.filter((row) => row.kind === kind);
const decimals = (value: string) => new Wide(value).decimalPlaces();
const at = (charge: number, pKa: string[], pH: string, digits: number) => {
  const [point] = fractionPoints(
    { fullyProtonatedCharge: charge, pKa },
    { kind: 'list', values: [pH] },
    digits,
  );
  if (point === undefined) throw new Error('No point was answered.');
  return point;
};

describe('forty digits computed elsewhere', () => {
  test('the rows are those of fractions and charges', () => {
    expect(rowsOf('species_fractions')).toHaveLength(8);
    expect(rowsOf('mean_charge')).toHaveLength(3);
    expect(rowsOf('sites_charge')).toHaveLength(1);
  });

  test.each(rowsOf('species_fractions').map((row) => [row.id, row] as const))(
    'fractions agree: %s',
    (_, row) => {
      const { pKa = [], pH } = row.inputs;
      const { fractions } = at(0, pKa, String(pH), 40);
      const numbers = (list: string[]) => list.map((each) => new Wide(each).toString());
      expect(numbers(fractions)).toEqual(numbers(answer(row)));
    },
  );

  test.each(rowsOf('mean_charge').map((row) => [row.id, row] as const))(
    'mean charge agrees: %s',
    (_, row) => {
      const { pKa = [], pH, z0 = 0 } = row.inputs;
      const [expected = ''] = answer(row);
      const places = Math.max(39, decimals(expected));
      expect(places).toBeLessThanOrEqual(60);
      const { meanCharge } = at(z0, pKa, String(pH), places);
      expect(new Wide(meanCharge).minus(expected).toString()).toBe('0');
    },
  );

  test.each(rowsOf('sites_charge').map((row) => [row.id, row] as const))(
    'independent sites carry the sum of their own mean charges: %s',
    (_, row) => {
      const { acid_sites: acids = [], base_sites: bases = [], pH } = row.inputs;
      const sites = [
        ...acids.map((site) => [0, ...site] as const),
        ...bases.map((site) => [1, ...site] as const),
      ];
      const charges = [pH].flat().map((each) => {
        const sum = sites.reduce(
          (total, [charge, pKa, count]) =>
            total.plus(
              new Wide(at(charge, [String(pKa)], each, 50).meanCharge).times(String(count)),
            ),
          new Wide(0),
        );
        return sum.toSignificantDigits(40).toString();
      });
      expect(charges).toEqual(answer(row).map((each) => new Wide(each).toString()));
    },
  );
});
