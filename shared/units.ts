import Decimal from 'decimal.js';

/** A unit, `value × factor + offset` of it being the value in the dimension's own unit. */
interface Unit {
  /** How it may be written; the first is how it is told. */
  readonly spellings: readonly string[];
  readonly factor: string;
  readonly offset?: string;
}

interface DimensionOfUnits {
  /** Unit of a bare decimal; also the first of `units`. */
  readonly own: string;
  readonly units: readonly Unit[];
  /** Why a unit that one would look for is missing. */
  readonly note?: string;
}

const unit = (spelling: string, factor: string): Unit => ({ spellings: [spelling], factor });

/** One millionth of a unit: µ by its own sign (U+00B5), as the Greek letter (U+03BC), or as u. */
const micro = (of: string, factor: string): Unit => ({
  spellings: ['\u00b5', 'u', '\u03bc'].map((sign) => sign + of),
  factor,
});

/**
 * Units that a quantity may carry. Only those are here whose factor to the own unit is an exact
 * decimal by definition, so that no value is altered. Sources: SI brochure (9th ed.) for prefixes,
 * litre and 0 °C = 273.15 K; thermochemical calorie = 4.184 J; ångström = 100 pm.
 */
const table = {
  concentration: {
    own: 'mol/L',
    units: [
      unit('mol/L', '1'),
      unit('mmol/L', '1e-3'),
      micro('mol/L', '1e-6'),
      unit('nmol/L', '1e-9'),
      unit('mol/m3', '1e-3'),
    ],
    note: 'Where the basis is mol/kg, write the amount per kilogram of water without a unit.',
  },
  temperature: {
    own: '°C',
    units: [unit('°C', '1'), { spellings: ['K'], factor: '1', offset: '-273.15' }],
  },
  pressure: {
    own: 'Pa',
    // The pascal, because one has no finite decimal in atmospheres.
    units: [
      unit('Pa', '1'),
      unit('kPa', '1e3'),
      unit('bar', '1e5'),
      unit('mbar', '1e2'),
      unit('atm', '101325'),
      micro('atm', '0.101325'),
    ],
  },
  volume: {
    own: 'L',
    units: [unit('L', '1'), unit('mL', '1e-3'), micro('L', '1e-6')],
  },
  mass: {
    own: 'g',
    units: [unit('g', '1'), unit('kg', '1e3'), unit('mg', '1e-3'), micro('g', '1e-6')],
  },
  'molar energy': {
    own: 'kJ/mol',
    units: [
      unit('kJ/mol', '1'),
      unit('J/mol', '1e-3'),
      unit('kcal/mol', '4.184'),
      unit('cal/mol', '4.184e-3'),
    ],
  },
  'molar heat capacity': {
    own: 'J/(mol K)',
    units: [unit('J/(mol K)', '1'), unit('kJ/(mol K)', '1e3'), unit('cal/(mol K)', '4.184')],
  },
  length: {
    own: 'pm',
    units: [
      unit('pm', '1'),
      unit('nm', '1e3'),
      // The letter, and the sign that Unicode holds to be the same.
      { spellings: ['\u00c5', '\u212b'], factor: '100' },
    ],
  },
} as const satisfies Record<string, DimensionOfUnits>;

export type Dimension = keyof typeof table;

/** What may be measured in units. */
export const dimensions = Object.keys(table) as Dimension[];

export const unitsOf = (dimension: Dimension): DimensionOfUnits => table[dimension];

/**
 * Wide enough that no digit of a value in another unit is lost: 80 characters with an exponent
 * within ±400 span less than 1,000 digits, beside a factor or an offset of at most six.
 */
const Wide = Decimal.clone({ precision: 1_000 });

type ToOwn = (value: string) => Decimal;

const inOwn =
  ({ factor, offset = '0' }: Unit): ToOwn =>
  (value) =>
    new Wide(value).times(factor).plus(offset);

/** By spelling; for the own unit null, since nothing is to be done. Maps know no `__proto__`. */
const conversions = new Map(
  dimensions.map((dimension) => {
    const { own, units } = unitsOf(dimension);
    const entries = units.flatMap((one) =>
      one.spellings.map((spelling) => [spelling, spelling === own ? null : inOwn(one)] as const),
    );
    return [dimension, new Map<string, ToOwn | null>(entries)] as const;
  }),
);

/**
 * How a value in a unit becomes one in the dimension's own, exactly: null where it is the own unit,
 * undefined where the dimension has no such unit.
 */
export const conversionOf = (dimension: Dimension, spelling: string) =>
  conversions.get(dimension)?.get(spelling);
