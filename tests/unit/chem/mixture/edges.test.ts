import { type ActivityModel, type Balance, equilibrium } from '../../../../server/chem';
import { Far } from '../../../property/mixture-oracle';
import {
  activityOf,
  ideal,
  inertOf,
  mixtureOf,
  pKw,
  type Weighed,
} from '../../../property/mixtures';

function numbersOf(balance: Balance, digits = 20) {
  const found = equilibrium(balance);
  const answer = found.ok ? found.inDigits(digits) : found;
  if (!answer.ok) throw new Error(answer.reason);
  return answer.numbers;
}

const models: readonly ActivityModel[] = [
  'ideal',
  'debye-huckel',
  'extended-debye-huckel',
  'guntelberg',
  'davies',
  'specific-ion-interaction',
  'pitzer',
];
/** Models in which H⁺ and OH⁻ have the same coefficient. */
const even = models.filter((model) => !['extended-debye-huckel', 'pitzer'].includes(model));
const half = new Far(pKw).dividedBy(2);

const acetic = { charge: 0, pKa: ['4.756'], reference: 0 } as const;
const carbonDioxide = { charge: 0, pKa: ['6.351', '10.329'], reference: 0, held: true } as const;

test('a balance that no pH moves is refused for a reason, not thrown', () => {
  // 50 mol/L of a +20 charge by Davies: a coefficient of 10^-thousands leaves no charge to a double.
  const balance = mixtureOf(
    [{ charge: 20, pKa: ['7'], reference: 0, amount: '50' }],
    [inertOf(-1, '1000')],
    activityOf('davies'),
  );
  expect(equilibrium(balance)).toEqual({ ok: false, reason: 'no-convergence' });
});

test('a model by interactions takes the ions present, whatever ionic strength is given', () => {
  const salt = mixtureOf(
    [],
    [inertOf(1, '0.1'), inertOf(-1, '0.1')],
    activityOf('pitzer', '1.631'),
  );
  const consistent = { ...salt, activity: activityOf('pitzer') };
  expect(numbersOf(salt).pH).toBe(numbersOf(consistent).pH);
});

describe('mixtures at the edge of what can be mixed', () => {
  test.each(even)('pure water: the pH is pKw/2 to every digit, by %s', (model) => {
    const water = mixtureOf([], [], activityOf(model));
    for (const digits of [1, 6, 7, 16, 60]) {
      expect(numbersOf(water, digits).pH).toBe(half.toPrecision(digits));
    }
  });

  test.each(['0', '0.001', '0.1', '0.5'])('and at an ionic strength of %s, given', (I) => {
    for (const model of ['debye-huckel', 'guntelberg', 'davies'] as const) {
      const numbers = numbersOf(mixtureOf([], [], activityOf(model, I)), 30);
      expect(numbers.pH).toBe(half.toPrecision(30));
      expect(numbers.hydrogen).toBe(numbers.hydroxide);
    }
  });

  test('a pKw whose half is a tie goes to the even digit: 13.995/2 to four digits', () => {
    for (const model of ['ideal', 'davies'] as const) {
      const water = { ...mixtureOf([], [], activityOf(model)), pKw: '13.995' };
      expect(numbersOf(water, 4).pH).toBe('6.998');
      expect(numbersOf({ ...water, pKw: '13.993' }, 4).pH).toBe('6.996');
      expect(numbersOf({ ...water, pKw: `13.99300000${'0'.repeat(50)}1` }, 4).pH).toBe('6.997');
    }
  });

  test.each(models)('components of which there is nothing change nothing, by %s', (model) => {
    const nothing = { charge: 0, pKa: ['2.148', '7.198', '12.35'], reference: 1, amount: '0' };
    const balance = mixtureOf([nothing, nothing], [inertOf(2, '0')], activityOf(model));
    const numbers = numbersOf(balance);
    expect(numbers.pH).toBe(numbersOf(mixtureOf([], [], activityOf(model))).pH);
    const [first] = numbers.acids;
    expect(first?.species.map(({ concentration }) => Number(concentration))).toEqual([0, 0, 0, 0]);
    const sum = first?.species.reduce((all, { fraction }) => all + Number(fraction), 0);
    expect(sum).toBeCloseTo(1, 12);
  });

  test.each(even)('as much strong acid as strong base leaves the neutral point, by %s', (model) => {
    for (const amount of ['1e-12', '1e-7', '0.01', '0.5']) {
      const salt = [inertOf(1, amount), inertOf(-1, amount)];
      const numbers = numbersOf(mixtureOf([], salt, activityOf(model)), 25);
      expect(numbers.pH).toBe(half.toPrecision(25));
    }
  });

  test('strong acid alone, ideal: [H⁺] solves h² − c h − Kw = 0, from 10⁻¹² to 5 mol/L', () => {
    for (const c of ['1e-12', '1e-10', '1e-8', '1e-7', '3.3e-7', '1e-4', '0.0275', '1', '5']) {
      const Kw = Far.pow(10, new Far(pKw).negated());
      const root = new Far(c).pow(2).plus(Kw.times(4)).sqrt().plus(c).dividedBy(2);
      for (const digits of [2, 17, 60]) {
        const numbers = numbersOf(mixtureOf([], [inertOf(-1, c)], ideal), digits);
        expect(numbers.hydrogen).toBe(root.toPrecision(digits));
        expect(numbers.pH).toBe(root.log(10).negated().toPrecision(digits));
      }
    }
  });

  test('a pH beside 0 keeps its significant digits', () => {
    const acid = mixtureOf([], [inertOf(-1, '1.0000000000001')], ideal);
    const Kw = Far.pow(10, new Far(pKw).negated());
    const c = new Far('1.0000000000001');
    const root = c.pow(2).plus(Kw.times(4)).sqrt().plus(c).dividedBy(2);
    expect(numbersOf(acid, 20).pH).toBe(root.log(10).negated().toPrecision(20));
  });

  test('a weak acid at half its neutralisation is near pKa, and at pKa to first order in h/c', () => {
    const buffer = mixtureOf([{ ...acetic, amount: '0.1' }], [inertOf(1, '0.05')], ideal);
    // h (c_b + h)/(c_a − h) = K: h = K (1 − h/c_a − h/c_b …), c_a = c_b = 0.05.
    const K = 10 ** -4.756;
    expect(Number(numbersOf(buffer).pH)).toBeCloseTo(-Math.log10(K * (1 - (2 * K) / 0.05)), 5);
  });

  test('at the tie of acid and base, concentrations of both are printed alike', () => {
    // Ideal, without water: half of one acid neutralised lies exactly at its constant.
    const balance = {
      ...mixtureOf([{ ...acetic, amount: '0.25' }], [inertOf(1, '0.125')]),
      pKw: undefined,
    };
    const found = equilibrium(balance);
    expect(found.ok && found.pH).toBeCloseTo(4.756, 12);
  });

  test.each([
    ['0.125', 2],
    ['0.0275', 2],
    ['0.00045', 1],
  ])('an amount of %s that is a tie at %i digits costs no further steps', (amount, digits) => {
    const ties = mixtureOf([{ ...acetic, amount }], [inertOf(1, amount)], activityOf('davies'));
    expect(numbersOf(ties, digits).iterations).toBeLessThan(20);
    const held = { ...carbonDioxide, amount: new Far(amount).dividedBy(1000).toFixed() };
    const gas = mixtureOf([held], [inertOf(1, '0.01')], activityOf('davies'));
    const numbers = numbersOf(gas, digits);
    expect(numbers.iterations).toBeLessThan(20);
    expect(numbers.acids[0]?.species[0]?.concentration).toBe(
      new Far(held.amount).toPrecision(digits),
    );
  });

  test('carbon dioxide held above strong base: bicarbonate and carbonate carry its charge', () => {
    // 1.0·10⁻⁵ mol/L of CO2, 0.1 mol/L of NaOH, ideal: a quadratic in 1/h when water is left out.
    const K1 = 10 ** -6.351;
    const K2 = 10 ** -10.329;
    const balance = mixtureOf([{ ...carbonDioxide, amount: '1e-5' }], [inertOf(1, '0.1')], ideal);
    const numbers = numbersOf(balance);
    const h = Number(numbers.hydrogen);
    const bound = 1e-5 * (K1 / h + (2 * K1 * K2) / h ** 2) + Number(numbers.hydroxide) - h;
    expect(bound).toBeCloseTo(0.1, 12);
    expect(Number(numbers.pH)).toBeGreaterThan(9);
  });

  test('constants from −50 to 70 are answered', () => {
    const acid: Weighed = { charge: 0, pKa: ['-50', '7', '70'], reference: 0, amount: '0.1' };
    for (const model of models) {
      const { pH, acids } = numbersOf(mixtureOf([acid], [], activityOf(model)));
      expect(Number(pH)).toBeGreaterThan(0.5);
      expect(Number(pH)).toBeLessThan(1.5);
      expect(Number(acids[0]?.species[3]?.fraction)).toBeLessThan(1e-60);
    }
  });

  test('a component that is its own inert ion shares its activity coefficient', () => {
    // Acetate as an acid and as an ion that takes no part: one ion to the model.
    const names = ['CH3COOH', 'CH3COO^-'];
    for (const model of ['davies', 'specific-ion-interaction', 'pitzer'] as const) {
      const balance = mixtureOf(
        [{ ...acetic, names, amount: '0.05' }],
        [inertOf(1, '0.1', 'Na^+'), inertOf(-1, '0.05', 'CH3COO^-')],
        activityOf(model),
      );
      const { acids, inert } = numbersOf(balance);
      expect(inert[1]?.activityCoefficient).toBe(acids[0]?.species[1]?.activityCoefficient);
    }
  });

  test('twenty-four components are one when they are the same', () => {
    const share = { ...acetic, amount: '0.0025' };
    const many = mixtureOf(
      Array<Weighed>(24).fill(share),
      [inertOf(1, '0.03')],
      activityOf('davies'),
    );
    const one = mixtureOf(
      [{ ...acetic, amount: '0.06' }],
      [inertOf(1, '0.03')],
      activityOf('davies'),
    );
    expect(numbersOf(many, 40).pH).toBe(numbersOf(one, 40).pH);
    expect(numbersOf(many, 40).bufferCapacity).toBe(numbersOf(one, 40).bufferCapacity);
  });

  test('constants of each kind agree where they are those of one another', () => {
    // Davies at I = 0.1: pK′ = pK° + f (2 z₀ − 1) and pK_c = pK′ + lg γ(H⁺), f = −lg γ of |z| = 1.
    const activity = activityOf('davies', '0.1');
    const root = new Far('0.1').sqrt();
    const f = root.dividedBy(root.plus(1)).minus('0.03').times(activity.A);
    const of = (kind: 'thermodynamic' | 'mixed' | 'concentration', pKa: string) =>
      numbersOf(
        mixtureOf(
          [{ ...acetic, pKa: [pKa], kind, amount: '0.05' }],
          [inertOf(1, '0.02')],
          activity,
        ),
        30,
      ).pH;
    const mixed = new Far('4.756').minus(f);
    expect(of('mixed', mixed.toFixed(100))).toBe(of('thermodynamic', '4.756'));
    expect(of('concentration', mixed.minus(f).toFixed(100))).toBe(of('thermodynamic', '4.756'));
  });

  test('an ionic strength that is given fixes the coefficients, and the composition’s is told', () => {
    const salt = [inertOf(1, '0.02'), inertOf(-1, '0.02')];
    const numbers = numbersOf(mixtureOf([], salt, activityOf('davies', '0.1')), 5);
    expect(numbers.ionicStrengthUsed).toBe('0.10000');
    expect(numbers.ionicStrengthOfComposition).toBe('0.020000');
    expect(equilibrium(mixtureOf([], salt, activityOf('davies', '0.1')))).toMatchObject({
      ok: true,
    });
  });
});
