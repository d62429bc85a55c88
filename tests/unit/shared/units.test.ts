import fc from 'fast-check';
import { quantity } from '../../../shared/quantity';
import { dimensions, unitsOf, type Dimension } from '../../../shared/units';

const wide = { from: '-1e100', to: '1e100', decimals: 80 };

/** What a quantity comes out as; '' where it is refused. */
const ownValue = (dimension: Dimension, input: string) =>
  quantity(dimension, wide).safeParse(input).data ?? '';

/**
 * Every spelling with the name mathjs knows its unit by, and its factor to the own unit as an
 * integer and places after the point, written down here apart from our table; last, what is added,
 * in hundredths.
 */
const rows: readonly (readonly [Dimension, string, string, bigint, number, bigint?])[] = [
  ['concentration', 'mol/L', 'mol/L', 1n, 0],
  ['concentration', 'mmol/L', 'mmol/L', 1n, 3],
  ['concentration', '\u00b5mol/L', 'umol/L', 1n, 6],
  ['concentration', '\u03bcmol/L', 'umol/L', 1n, 6],
  ['concentration', 'umol/L', 'umol/L', 1n, 6],
  ['concentration', 'nmol/L', 'nmol/L', 1n, 9],
  ['concentration', 'mol/m3', 'mol/m^3', 1n, 3],
  ['temperature', '°C', 'degC', 1n, 0],
  ['temperature', 'K', 'K', 1n, 0, -27315n],
  ['pressure', 'Pa', 'Pa', 1n, 0],
  ['pressure', 'kPa', 'kPa', 1000n, 0],
  ['pressure', 'bar', 'bar', 100_000n, 0],
  ['pressure', 'mbar', 'mbar', 100n, 0],
  ['pressure', 'atm', 'atm', 101_325n, 0],
  ['pressure', '\u00b5atm', 'uatmosphere', 101_325n, 6],
  ['pressure', '\u03bcatm', 'uatmosphere', 101_325n, 6],
  ['pressure', 'uatm', 'uatmosphere', 101_325n, 6],
  ['volume', 'L', 'L', 1n, 0],
  ['volume', 'mL', 'mL', 1n, 3],
  ['volume', '\u00b5L', 'uL', 1n, 6],
  ['volume', '\u03bcL', 'uL', 1n, 6],
  ['volume', 'uL', 'uL', 1n, 6],
  ['mass', 'g', 'g', 1n, 0],
  ['mass', 'kg', 'kg', 1000n, 0],
  ['mass', 'mg', 'mg', 1n, 3],
  ['mass', '\u00b5g', 'ug', 1n, 6],
  ['mass', '\u03bcg', 'ug', 1n, 6],
  ['mass', 'ug', 'ug', 1n, 6],
  ['molar energy', 'kJ/mol', 'kJ/mol', 1n, 0],
  ['molar energy', 'J/mol', 'J/mol', 1n, 3],
  ['molar energy', 'kcal/mol', 'kcalorie/mol', 4184n, 3],
  ['molar energy', 'cal/mol', 'calorie/mol', 4184n, 6],
  ['molar heat capacity', 'J/(mol K)', 'J/(mol K)', 1n, 0],
  ['molar heat capacity', 'kJ/(mol K)', 'kJ/(mol K)', 1000n, 0],
  ['molar heat capacity', 'cal/(mol K)', 'calorie/(mol K)', 4184n, 3],
  ['length', 'pm', 'pm', 1n, 0],
  ['length', 'nm', 'nm', 1000n, 0],
  ['length', '\u00c5', 'angstrom', 100n, 0],
  ['length', '\u212b', 'angstrom', 100n, 0],
];
const units = rows.map(([dimension, spelling, theirs, factor, tenths, added = 0n]) => ({
  dimension,
  spelling,
  theirs,
  factor,
  tenths,
  added,
}));

test('this list has every unit and spelling, and no other', () => {
  const ours = dimensions.flatMap((dimension) =>
    unitsOf(dimension).units.flatMap(({ spellings }) =>
      spellings.map((spelling) => `${dimension}: ${spelling}`),
    ),
  );
  const listed = units.map(({ dimension, spelling }) => `${dimension}: ${spelling}`);
  expect([...ours].sort()).toEqual([...listed].sort());
});

describe('against the unit system of mathjs', () => {
  /** Doubles in one unit as doubles in another. */
  async function converter() {
    // Its types are those of an ECMAScript module.
    const { all, create } = await import('mathjs');
    const math = create(all ?? {});
    // It knows neither the calorie nor prefixes of the atmosphere. Thermochemical calorie: 4.184 J
    // (IUPAC Green Book, 3rd ed.; recalled).
    math.createUnit('calorie', { definition: '4.184 J', prefixes: 'short' });
    math.createUnit('atmosphere', { definition: '1 atm', prefixes: 'short' });
    return (value: number, from: string, to: string) => math.unit(value, from).toNumber(to);
  }
  const theirOwn = new Map(
    units
      .filter(({ dimension, spelling }) => spelling === unitsOf(dimension).own)
      .map(({ dimension, theirs }) => [dimension, theirs]),
  );

  test.each(units)('$dimension: 310.25 $spelling', async ({ dimension, spelling, theirs }) => {
    const convert = await converter();
    const expected = convert(310.25, theirs, theirOwn.get(dimension) ?? '');
    const got = Number(ownValue(dimension, `310.25 ${spelling}`));
    // It computes in doubles, and kelvin by a difference that leaves a tenth of the value.
    expect(Math.abs(got / expected - 1)).toBeLessThan(1e-13);
  });
});

describe('exactly', () => {
  /** An integer, and how many of its digits are places after the point. */
  type Scaled = readonly [bigint, number];
  const read = (text: string): Scaled => {
    const [, sign = '', whole = '', places = ''] = /^(-?)(\d+)(?:\.(\d+))?$/.exec(text) ?? [];
    return [BigInt(sign + whole + places), places.length];
  };
  const written = ([integer, places]: Scaled) => {
    const digits = (integer < 0n ? -integer : integer).toString().padStart(places + 1, '0');
    const point = digits.length - places;
    const after = places === 0 ? '' : `.${digits.slice(point)}`;
    return `${integer < 0n ? '-' : ''}${digits.slice(0, point)}${after}`;
  };
  const power = (places: number) => 10n ** BigInt(places);
  const equal = ([one, places]: Scaled, [other, otherPlaces]: Scaled) =>
    one * power(otherPlaces) === other * power(places);

  const integers = fc.bigInt({ min: -(10n ** 30n), max: 10n ** 30n });
  const values = fc.tuple(integers, fc.nat({ max: 25 }));

  test.each(units)(
    '$dimension in $spelling is what integer arithmetic makes of it',
    ({ dimension, spelling, factor, tenths, added }) => {
      fc.assert(
        fc.property(values, ([integer, places]) => {
          const got = read(ownValue(dimension, `${written([integer, places])} ${spelling}`));
          const product = integer * factor * 100n + added * power(places + tenths);
          expect(equal(got, [product, places + tenths + 2])).toBe(true);
        }),
      );
    },
  );

  test.each(units)('$dimension in $spelling may have an exponent', ({ dimension, spelling }) => {
    const exponents = fc.integer({ min: -15, max: 15 });
    fc.assert(
      fc.property(integers, exponents, (integer, exponent) => {
        const value: Scaled = exponent < 0 ? [integer, -exponent] : [integer * power(exponent), 0];
        const short = `${integer}e${exponent}`;
        const own = spelling === unitsOf(dimension).own;
        const expected = own ? short : ownValue(dimension, `${written(value)} ${spelling}`);
        expect(ownValue(dimension, `${short} ${spelling}`)).toBe(expected);
      }),
    );
  });

  test.each([
    ['concentration', 'mmol/L', 1_000n, 0n],
    ['concentration', 'umol/L', 1_000_000n, 0n],
    ['concentration', 'nmol/L', 1_000_000_000n, 0n],
    ['temperature', 'K', 1n, 27315n],
  ] as const)('a %s given in %s comes back', (dimension, unit, per, added) => {
    fc.assert(
      fc.property(values, ([integer, places]) => {
        const there = [integer * per * 100n + added * power(places), places + 2] as const;
        const back = read(ownValue(dimension, `${written(there)} ${unit}`));
        expect(equal(back, [integer, places])).toBe(true);
      }),
    );
  });

  test('a trace beside 273.15 kelvin is kept', () => {
    const zeros = '0'.repeat(70);
    expect(ownValue('temperature', `273.15${zeros}1 K`)).toBe(`0.00${zeros}1`);
  });
});
