import fc from 'fast-check';
import {
  type Acid,
  type ActivityChoice,
  type Balance,
  type ConstantKind,
  waterAt,
} from '../../server/chem';
import type { InertIon } from '../../server/chem/mixture/balance';
import { decimalOf, decimalWithin } from './generators';
import { Wide } from './oracle';

const water = waterAt('25');

/** Water at 25 °C as the engine prints it. */
export const pKw = water.pKw;

/** A model with the constants of water at 25 °C. */
export const activityOf = (
  model: ActivityChoice['model'],
  ionicStrength: ActivityChoice['ionicStrength'] = 'self-consistent',
): ActivityChoice => ({ model, A: water.A, B: water.B, linear: '0.3', ionicStrength });

export const ideal = activityOf('ideal');

/** An acid to be weighed in as one of its species. */
export interface Weighed {
  readonly charge: number;
  readonly pKa: readonly string[];
  readonly reference: number;
  readonly amount: string;
  readonly kind?: ConstantKind;
  readonly held?: boolean;
  readonly names?: readonly string[];
}

export const acidOf = ({ charge, pKa, kind = 'thermodynamic', names, ...rest }: Weighed): Acid => ({
  held: false,
  ...rest,
  pKa,
  kinds: pKa.map(() => kind),
  species: Array.from({ length: pKa.length + 1 }, (_, lost) => ({
    name: names?.[lost],
    charge: charge - lost,
  })),
});

export const inertOf = (charge: number, concentration: string, name?: string): InertIon => ({
  ion: { name, charge },
  concentration,
});

/** The monovalent counter-ions that come with a species weighed in: none with a neutral one. */
export function counterIonsOf(acid: Weighed, { cation = 'Na^+', anion = 'Cl^-' } = {}): InertIon[] {
  const charge = acid.charge - acid.reference;
  if (charge === 0 || acid.held === true) return [];
  const concentration = new Wide(acid.amount).times(Math.abs(charge)).toFixed();
  return [charge < 0 ? inertOf(1, concentration, cation) : inertOf(-1, concentration, anion)];
}

/** Acids with their counter-ions, and further ions, as a charge balance. */
export const mixtureOf = (
  acids: readonly Weighed[],
  further: readonly InertIon[] = [],
  activity: ActivityChoice = ideal,
): Balance => ({
  acids: acids.map(acidOf),
  inert: [...acids.flatMap((acid) => counterIonsOf(acid)), ...further],
  pKw,
  activity,
});

/** A concentration of 1–3 digits from 10^low up to 10^high, spread evenly over the powers of ten. */
export const concentrations = (low = -12, high = 0) =>
  fc
    .tuple(fc.integer({ min: low, max: high - 1 }), fc.integer({ min: 100, max: 999 }))
    .map(([power, mantissa]) => new Wide(mantissa).times(`1e${power - 2}`).toFixed());

const kinds = fc.constantFrom<ConstantKind>(
  'thermodynamic',
  'thermodynamic',
  'concentration',
  'mixed',
);

/** Acids of 1–4 protons, in order or not, weighed in as any of their species. */
export const weighedAcids = (amounts = concentrations(-5, 0), [low, high] = [-2, 16]) =>
  fc
    .record({
      pKa: fc.array(decimalWithin(low, high), { minLength: 1, maxLength: 4 }),
      highest: fc.integer({ min: -1, max: 3 }),
      reference: fc.nat({ max: 4 }),
      amount: amounts,
      kind: kinds,
    })
    .map(({ pKa, highest, reference, amount, kind }): Weighed => ({
      charge: Math.min(highest, 3),
      pKa: pKa.toSorted((a, b) => Number(a) - Number(b)),
      reference: Math.min(reference, pKa.length),
      amount,
      kind,
    }));

/** Strengths that every model but the limiting law is asked about. */
export const ionicStrengths = fc
  .integer({ min: 0, max: 500 })
  .map((thousandths) => decimalOf(BigInt(thousandths), 3));

/** Models whose coefficients follow from the ionic strength alone. */
export const plainModels = fc.constantFrom<ActivityChoice['model']>(
  'ideal',
  'debye-huckel',
  'extended-debye-huckel',
  'guntelberg',
  'davies',
);
