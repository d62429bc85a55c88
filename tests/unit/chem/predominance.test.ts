import { predominanceRanges } from '../../../server/chem';
import { Exact } from '../../../server/chem/decimals/contexts';
import { boundariesOf, predominantAt } from '../../../server/chem/forms/predominance';

const system = (...pKa: string[]) => ({ fullyProtonatedCharge: 0, pKa });
const ranges = (...pKa: string[]) =>
  predominanceRanges(system(...pKa), 4).map(({ species, from, to }) => [species, from, to]);

describe('predominance', () => {
  test('constants in order are the ends of the ranges', () => {
    expect(ranges('2.148', '7.198', '12.35')).toEqual([
      [0, null, '2.148'],
      [1, '2.148', '7.198'],
      [2, '7.198', '12.35'],
      [3, '12.35', null],
    ]);
  });

  test('around a skipped species the boundary is the mean of the constants it skips', () => {
    expect(ranges('9', '4')).toEqual([
      [0, null, '6.500'],
      [2, '6.500', null],
    ]);
    expect(ranges('9', '5', '3', '12')).toEqual([
      [0, null, '5.667'],
      [3, '5.667', '12.00'],
      [4, '12.00', null],
    ]);
  });

  test('a skipped species may be found out only by a later constant', () => {
    expect(ranges('4', '5', '0')).toEqual([
      [0, null, '3.000'],
      [3, '3.000', null],
    ]);
  });

  test('equal neighbours meet in one point: the form between has no range', () => {
    expect(ranges('7', '7', '7')).toEqual([
      [0, null, '7.000'],
      [3, '7.000', null],
    ]);
  });

  test('negative constants and zero are ends like others, zero without a sign', () => {
    expect(ranges('-3', '-0', '1.9870')).toEqual([
      [0, null, '-3.000'],
      [1, '-3.000', '0.000'],
      [2, '0.000', '1.987'],
      [3, '1.987', null],
    ]);
  });

  test('ends round half-even where they are ties, and correctly 10⁻⁶⁰ beside one', () => {
    const end = (pKa: string[]) => predominanceRanges(system(...pKa), 2)[0]?.to;
    const tiny = `${'0'.repeat(58)}1`;
    expect(end(['2.25', '2.05'])).toBe('2.2');
    expect(end(['2.35', '2.35'])).toBe('2.4');
    expect(end(['2.25', '2.25'])).toBe('2.2');
    expect(end([`2.25${tiny.slice(1)}`, '2.25'])).toBe('2.3');
    expect(end([`2.30${tiny}`, '2.30', '2.15'])).toBe('2.3');
  });

  test('on a boundary the lower species predominates, a hair above the upper', () => {
    const inverted = boundariesOf(system('9', '4'));
    expect(predominantAt(inverted, new Exact('6.5'))).toBe(0);
    expect(predominantAt(inverted, new Exact(`6.5${'0'.repeat(58)}1`))).toBe(2);
    const ordinary = boundariesOf(system('2', '7', '12'));
    const species = ['-20', '2', '2.1', '7', '11.9', '12', '40'].map((pH) =>
      predominantAt(ordinary, new Exact(pH)),
    );
    expect(species).toEqual([0, 0, 1, 1, 2, 2, 3]);
  });
});
