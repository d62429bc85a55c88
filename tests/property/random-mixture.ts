import fc from 'fast-check';
import { type ActivityChoice, type Balance, waterAt } from '../../server/chem';
import { decimalOf } from './generators';
import { acidOf, concentrations, counterIonsOf, inertOf, type Weighed } from './mixtures';

/** Acids whose ions the tables of interactions know, with their constants at 25 °C. */
const named: readonly Omit<Weighed, 'reference' | 'amount'>[] = [
  {
    charge: 0,
    pKa: ['2.148', '7.198', '12.35'],
    names: ['H3PO4', 'H2PO4^-', 'HPO4^2-', 'PO4^3-'],
  },
  { charge: 0, pKa: ['6.351', '10.329'], names: ['CO2', 'HCO3^-', 'CO3^2-'] },
  { charge: 0, pKa: ['4.756'], names: ['CH3COOH', 'CH3COO^-'] },
  { charge: 1, pKa: ['8.072'], names: ['TrisH^+', 'Tris'] },
  { charge: 0, pKa: ['9.236'], names: ['B(OH)3', 'B(OH)4^-'] },
  { charge: 0, pKa: ['2.950', '5.408'], names: ['H2Phth', 'HPhth^-', 'Phth^2-'] },
  { charge: 0, pKa: ['3.128', '4.761', '6.396'], names: ['H3Cit', 'H2Cit^-', 'HCit^2-', 'Cit^3-'] },
];

/** pKa −10 to 24 with three places, in order as often as not. */
const constants = fc
  .tuple(
    fc.array(fc.integer({ min: -10_000, max: 24_000 }), { minLength: 1, maxLength: 6 }),
    fc.boolean(),
  )
  .map(([thousandths, sorted]) =>
    (sorted ? thousandths.toSorted((a, b) => a - b) : thousandths).map((each) =>
      decimalOf(BigInt(each), 3),
    ),
  );

/** 1e-12 to 5 mol/L, and at times nothing at all. */
const amount = fc.oneof(
  { weight: 12, arbitrary: concentrations(-12, 0) },
  { weight: 6, arbitrary: concentrations(-4, 0) },
  { weight: 2, arbitrary: fc.integer({ min: 1, max: 500 }).map((n) => decimalOf(BigInt(n), 2)) },
  { weight: 1, arbitrary: fc.constantFrom('0', '5', '1', '1e-12') },
);

const unnamedAcid = fc
  .record({
    charge: fc.integer({ min: -3, max: 5 }),
    pKa: constants,
    reference: fc.nat({ max: 6 }),
    amount,
    kind: fc.constantFrom('thermodynamic', 'thermodynamic', 'concentration', 'mixed'),
  })
  .map((acid): Weighed => ({ ...acid, reference: Math.min(acid.reference, acid.pKa.length) }));

/** Held by a gas: the neutral species, at 10⁻¹² to 10⁻³ mol/L. */
const heldAcid = fc
  .record({ which: fc.nat({ max: 4 }), amount: concentrations(-12, -3) })
  .map(({ which, amount: held }): Weighed => {
    const acid = named[which] ?? named[0];
    if (acid === undefined) throw new Error('There is no named acid.');
    return { ...acid, reference: acid.charge, amount: held, held: true };
  });

const namedAcid = fc
  .record({ which: fc.nat({ max: named.length - 1 }), reference: fc.nat({ max: 3 }), amount })
  .map(({ which, reference, amount: total }): Weighed => {
    const acid = named[which] ?? named[0];
    if (acid === undefined) throw new Error('There is no named acid.');
    return { ...acid, reference: Math.min(reference, acid.pKa.length), amount: total };
  });

const inertIon = fc
  .record({
    ion: fc.constantFrom<[string | undefined, number]>(
      ['Na^+', 1],
      ['K^+', 1],
      ['Ca^2+', 2],
      ['Cl^-', -1],
      ['SO4^2-', -2],
      [undefined, 3],
      [undefined, -4],
    ),
    amount,
  })
  .map(({ ion: [name, charge], amount: total }) => inertOf(charge, total, name));

/** How many components: mostly few, at times as many as a call may have. */
const counts = (most: number) =>
  fc.oneof(
    { weight: 20, arbitrary: fc.integer({ min: 0, max: 2 }) },
    { weight: 5, arbitrary: fc.integer({ min: 2, max: 5 }) },
    { weight: 1, arbitrary: fc.integer({ min: 5, max: most }) },
  );

const several = <T>(arbitrary: fc.Arbitrary<T>, most: number) =>
  counts(most).chain((length) => fc.array(arbitrary, { minLength: length, maxLength: length }));

/** Water from 0 to 100 °C, made once. */
const waters = Array.from({ length: 21 }, (_, fifth) => waterAt(String(5 * fifth)));

const strengths = fc.oneof(
  { weight: 1, arbitrary: fc.constant<'self-consistent'>('self-consistent') },
  { weight: 4, arbitrary: fc.integer({ min: 0, max: 2000 }).map((n) => decimalOf(BigInt(n), 3)) },
);
/** By interactions, coefficients follow from the composition: a strength says nothing there. */
const byComposition = ['specific-ion-interaction', 'pitzer'];

interface Parts {
  readonly acids: readonly Weighed[];
  readonly model: ActivityChoice['model'];
}

/** A model whose coefficients are known by ion gets acids that it knows, few at a time. */
const parts = fc.oneof(
  {
    weight: 14,
    arbitrary: fc.record<Parts>({
      acids: several(fc.oneof({ weight: 5, arbitrary: unnamedAcid }, namedAcid, heldAcid), 24),
      model: fc.constantFrom<ActivityChoice['model']>(
        'ideal',
        'debye-huckel',
        'extended-debye-huckel',
        'guntelberg',
        'davies',
        'davies',
      ),
    }),
  },
  {
    weight: 1,
    arbitrary: fc.record<Parts>({
      acids: several(fc.oneof(namedAcid, namedAcid, unnamedAcid, heldAcid), 6),
      model: fc.constantFrom<ActivityChoice['model']>('specific-ion-interaction', 'pitzer'),
    }),
  },
);

const digitsAsked = fc.oneof(
  { weight: 2, arbitrary: fc.integer({ min: 1, max: 2 }) },
  { weight: 8, arbitrary: fc.integer({ min: 3, max: 6 }) },
  { weight: 1, arbitrary: fc.constantFrom(16, 34) },
);

/** A mixture as nobody would weigh it in, and how many digits of it are asked. */
export const randomMixtures: fc.Arbitrary<{ balance: Balance; digits: number }> = fc
  .record({
    parts,
    further: several(inertIon, 6),
    water: fc.constantFrom(...waters),
    ionicStrength: strengths,
    digits: digitsAsked,
    neutralised: fc.boolean(),
  })
  .map(({ parts: { acids, model }, further, water, digits, neutralised, ...asked }) => {
    const { pKw, A, B } = water;
    const ionicStrength = byComposition.includes(model) ? 'self-consistent' : asked.ionicStrength;
    const inert = neutralised ? acids.flatMap((acid) => counterIonsOf(acid)) : [];
    return {
      digits,
      balance: {
        acids: acids.map(acidOf),
        inert: [...inert, ...further],
        pKw,
        activity: { model, A, B, linear: '0.3', ionicStrength },
      },
    };
  });
