import {
  type ActivityModel,
  type Balance,
  equilibrium,
  ionsOf,
  pitzerAmong,
  specificInteractionAmong,
} from '../../../../server/chem';
import { decimals } from '../../../../server/chem/decimals/arithmetic';
import { chargeOf, Far } from '../../../property/mixture-oracle';
import { activityOf, inertOf, mixtureOf, pKw, type Weighed } from '../../../property/mixtures';

const digits = 40;

const phosphate = {
  charge: 0,
  pKa: ['2.148', '7.198', '12.35'],
  names: ['H3PO4', 'H2PO4^-', 'HPO4^2-', 'PO4^3-'],
};
const acetate = { charge: 0, pKa: ['4.756'], names: ['CH3COOH', 'CH3COO^-'] };
const carbonate = { charge: 0, pKa: ['6.351', '10.329'], names: ['CO2', 'HCO3^-', 'CO3^2-'] };
const tris = { charge: 1, pKa: ['8.072'], names: ['TrisH^+', 'Tris'] };

/** A mixture's acids and what else is in it. */
const mixtures: readonly [string, readonly Weighed[], readonly ReturnType<typeof inertOf>[]][] = [
  [
    'phosphate in saline',
    [
      { ...phosphate, reference: 1, amount: '0.004' },
      { ...phosphate, reference: 2, amount: '0.006' },
    ],
    [inertOf(1, '0.15', 'Na^+'), inertOf(-1, '0.15', 'Cl^-')],
  ],
  [
    'acetate, phosphate and carbonate with potassium',
    [
      { ...acetate, reference: 0, amount: '0.3' },
      { ...phosphate, reference: 0, amount: '0.02' },
      { ...carbonate, reference: 1, amount: '0.05' },
    ],
    [inertOf(1, '0.2', 'K^+')],
  ],
  [
    'Tris half neutralised by hydrochloric acid',
    [{ ...tris, reference: 1, amount: '0.1' }],
    [inertOf(-1, '0.05', 'Cl^-')],
  ],
  [
    'strong base under carbon dioxide of the air',
    [{ ...carbonate, reference: 0, amount: '0.0000135', held: true }],
    [inertOf(1, '0.1', 'Na^+')],
  ],
  ['hydrochloric acid of 1 mol/L', [], [inertOf(-1, '1', 'Cl^-')]],
  ['sodium hydroxide of 0.9 mol/L', [], [inertOf(1, '0.9', 'Na^+')]],
];

/** A name of one species and its concentration and coefficient, in the order of `ionsOf`. */
function solved(balance: Balance) {
  const found = equilibrium(balance);
  const answer = found.ok ? found.inDigits(digits) : found;
  if (!answer.ok) throw new Error(answer.reason);
  const numbers = answer.numbers;
  const species = [
    { concentration: numbers.hydrogen, activityCoefficient: numbers.hydrogenActivityCoefficient },
    { concentration: numbers.hydroxide, activityCoefficient: numbers.hydroxideActivityCoefficient },
    ...numbers.acids.flatMap((acid) => acid.species),
    ...numbers.inert,
  ];
  return {
    numbers,
    concentrations: species.map(({ concentration }) => new Far(concentration)),
    coefficients: species.map(({ activityCoefficient }) => new Far(activityCoefficient)),
  };
}

const near = (one: InstanceType<typeof Far>, other: InstanceType<typeof Far>) =>
  expect(one.dividedBy(other).minus(1).abs().lessThan('1e-37')).toBe(true);

describe.each<ActivityModel>(['specific-ion-interaction', 'pitzer'])('a mixture by %s', (model) => {
  test.each(mixtures)('%s: coefficients are those of its own composition', (_, acids, further) => {
    const balance = mixtureOf(acids, further, activityOf(model));
    const { concentrations, coefficients } = solved(balance);
    const among = model === 'pitzer' ? pitzerAmong : specificInteractionAmong;
    const arithmetic = decimals(60);
    const lg = among(ionsOf(balance)).lgGamma(
      arithmetic,
      arithmetic.of(balance.activity.A),
      concentrations.map((each) => arithmetic.of(each.toString())),
    );
    lg.forEach((each, i) => {
      near(new Far(coefficients[i] ?? NaN), Far.pow(10, each.toString()));
    });
  });

  test.each(mixtures)(
    '%s: charges balance and every law of mass action holds',
    (_, acids, further) => {
      const balance = mixtureOf(acids, further, activityOf(model));
      const { numbers, concentrations, coefficients } = solved(balance);
      expect(chargeOf(balance, concentrations).abs().lessThan('1e-38')).toBe(true);
      const activity = (i: number) =>
        new Far(concentrations[i] ?? NaN).times(coefficients[i] ?? NaN);
      near(activity(0).times(activity(1)), Far.pow(10, `-${pKw}`));
      near(activity(0), Far.pow(10, `-${numbers.pH}`));
      let first = 2;
      for (const acid of balance.acids) {
        acid.pKa.forEach((pKa, j) => {
          const quotient = activity(first + j + 1)
            .times(activity(0))
            .dividedBy(activity(first + j));
          near(quotient, Far.pow(10, new Far(pKa).negated()));
        });
        first += acid.species.length;
      }
    },
  );
});
