import { contextOf, Exact } from '../../../server/chem/decimals/contexts';
import { pKRelation } from '../../../server/chem/constants/pk-at-temperature';
import { henryExponent } from '../../../server/chem/water/carbon-dioxide';
import { debyeHuckel, debyeHuckelRelations } from '../../../server/chem/water/debye-huckel';
import { density, densityRelation } from '../../../server/chem/water/density';
import { ionProductExponent, ionProductRelation } from '../../../server/chem/water/ion-product';
import { kelvinOf } from '../../../server/chem/water/kelvin';
import { permittivity, permittivityRelation } from '../../../server/chem/water/permittivity';
import { type Relation, toDigits, toPlaces } from '../../../server/chem/decimals/right-digits';

const decimal = (value: string) => new Exact(value);
const temperatures = ['0', '0.01', '3.98', '25', '25.00000000000000000001', '37', '61.7', '100'];

/** A relation whose evaluations are all off by as much as its loss allows. */
const off = (exact: string, by: number, is?: Relation['is']): Relation => ({
  in: (context) => new context(decimal(exact).plus(`${by}e${1 - context.precision}`)),
  loss: 1,
  ...(is && { is }),
});

describe('right digits', () => {
  test('a value next to a tie is rounded as the exact one, however near it lies', () => {
    for (const by of [-1, 1]) {
      expect(toDigits(off('1.00050000000000000000000000000001', by), 4).toString()).toBe('1.001');
      expect(toDigits(off('1.00049999999999999999999999999999', by), 4).toString()).toBe('1');
      expect(toPlaces(off('-0.00050000000000000000000000000001', by), 3)).toBe('-0.001');
    }
  });

  test('an exact tie goes to the even neighbour', () => {
    const equals = (exact: string) => (tie: { equals: (other: string) => boolean }) =>
      tie.equals(exact);
    for (const by of [-1, 1]) {
      expect(toDigits(off('1.0005', by, equals('1.0005')), 4).toString()).toBe('1');
      expect(toDigits(off('1.0015', by, equals('1.0015')), 4).toString()).toBe('1.002');
    }
  });

  test('places are counted from the point: what is smaller than half of the last becomes zero', () => {
    expect(toPlaces(off('0', 1), 3)).toBe('0.000');
    expect(toPlaces(off('-0.00000001', 1), 3)).toBe('0.000');
  });

  test('where the formula has no value, that is said', () => {
    expect(() => permittivity(10, decimal('100'))).toThrow(RangeError);
  });
});

describe('loss, as counted beside each relation', () => {
  const thermodynamics = { pK: decimal('8.072'), deltaH: decimal('47.45') };
  const relations: [string, (celsius: string) => Relation][] = [
    ['density', (t) => densityRelation(kelvinOf(t))],
    ['permittivity', (t) => permittivityRelation(kelvinOf(t))],
    ['A', (t) => debyeHuckelRelations(kelvinOf(t)).A],
    ['B', (t) => debyeHuckelRelations(kelvinOf(t)).B],
    ['pKw', (t) => ionProductRelation(kelvinOf(t))],
    ['pK', (t) => pKRelation({ ...thermodynamics, deltaCp: decimal('-59') }, kelvinOf(t))],
    ['steep pK', (t) => pKRelation({ ...thermodynamics, deltaCp: decimal('-5e3') }, kelvinOf(t))],
  ];

  test.each(relations)('%s with few digits is within its loss of the same with many', (_, at) => {
    for (const celsius of temperatures) {
      const relation = at(celsius);
      const many = relation.in(contextOf(96));
      for (const precision of [8, 16, 24, 40]) {
        const error = relation.in(contextOf(precision)).minus(many).abs();
        expect(error.lessThanOrEqualTo(`1e${relation.loss - precision}`)).toBe(true);
      }
    }
  });
});

describe('digits asked for', () => {
  test.each([
    ['density', density],
    ['permittivity', permittivity],
    ['A', (digits: number, T: ReturnType<typeof decimal>) => debyeHuckel(digits, T).A],
    ['B', (digits: number, T: ReturnType<typeof decimal>) => debyeHuckel(digits, T).B],
    ['pKw', ionProductExponent],
    ['pK_H', henryExponent],
  ])('%s: fewer digits are the rounding of more', (_, relation) => {
    for (const celsius of temperatures) {
      const most = relation(70, kelvinOf(celsius));
      for (const digits of [1, 2, 5, 6, 7, 13, 16, 34, 60]) {
        const rounded = most.toSignificantDigits(digits, Exact.rounding);
        expect(relation(digits, kelvinOf(celsius)).toString()).toBe(rounded.toString());
      }
    }
  });

  test('density at 0 °C is Kell’s first coefficient, and no digit more', () => {
    expect(density(50, kelvinOf('0')).toString()).toBe('999.83952');
  });
});
