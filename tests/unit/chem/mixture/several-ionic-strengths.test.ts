import { type ActivityModel, type Balance, equilibrium } from '../../../../server/chem';
import { solvedNear } from '../../../property/mixture-oracle';
import { activityOf, inertOf, mixtureOf } from '../../../property/mixtures';

/** An acid of many protons, pKa 3.0, 3.1 …, weighed in uncharged, with an inert salt beside it. */
function manyProtons(protons: number, amount: string, salt: string, model: ActivityModel): Balance {
  const pKa = Array.from({ length: protons }, (_, i) => (3 + i / 10).toFixed(1));
  return mixtureOf(
    [{ charge: 0, pKa, reference: 0, amount }],
    salt === '0' ? [] : [inertOf(1, salt), inertOf(-1, salt)],
    activityOf(model),
  );
}

function solved(balance: Balance, digits = 12) {
  const found = equilibrium(balance);
  const answer = found.ok ? found.inDigits(digits) : found;
  if (!answer.ok) throw new Error(answer.reason);
  const { pH, ionicStrengthUsed } = answer.numbers;
  return [
    { pH, ionicStrength: ionicStrengthUsed },
    ...answer.others.map((other) => ({ pH: other.pH, ionicStrength: other.ionicStrength })),
  ];
}

/** Ionic strengths of an answer, to three digits. */
const strengths = (balance: Balance) =>
  solved(balance).map(({ ionicStrength }) => Number(ionicStrength).toPrecision(3));

describe('compositions that several ionic strengths fit', () => {
  test.each<[ActivityModel, string[]]>([
    ['debye-huckel', ['0.00543', '0.0218', '2.10']],
    ['extended-debye-huckel', ['0.00524', '0.0437', '2.10']],
    ['guntelberg', ['0.00532', '0.0330', '2.10']],
    ['davies', ['0.00528', '0.0425', '0.631']],
  ])(
    'an acid of twenty protons has three at 0.01 mol/L by %s, and the smallest answers',
    (...row) => {
      const [model, expected] = row;
      expect(strengths(manyProtons(20, '0.01', '0', model))).toEqual(expected);
    },
  );

  test('each of the three is a root to every digit', () => {
    const balance = manyProtons(20, '0.01', '0', 'davies');
    const roots = solved(balance, 30);
    expect(roots).toHaveLength(3);
    for (const { pH, ionicStrength } of roots) {
      const exact = solvedNear(balance, ionicStrength);
      expect(ionicStrength).toBe(exact.I.toPrecision(30));
      expect(pH).toBe(exact.u.log(10).toPrecision(30));
    }
  });

  test('six protons are enough where the limiting law is asked too much, but not Güntelberg', () => {
    expect(strengths(manyProtons(6, '0.1', '0', 'debye-huckel'))).toHaveLength(3);
    expect(strengths(manyProtons(6, '0.1', '0', 'guntelberg'))).toHaveLength(1);
  });

  // Beyond the fold at 0.019808412 mol/L of salt the two smaller ionic strengths are gone, and the
  // pH leaps. Shortly before it they are closer together than points of any scan.
  test.each([
    ['0.0196', 3],
    ['0.01977', 3],
    ['0.0198064', 3],
    ['0.01980839', 3],
    ['0.019808411', 3],
    ['0.0198085', 1],
    ['0.02', 1],
  ])(
    'two ionic strengths that are about to meet are not stepped over: %s mol/L NaCl',
    (salt, count) => {
      const balance = manyProtons(20, '0.01', salt, 'davies');
      const roots = solved(balance);
      expect(roots).toHaveLength(count);
      expect(Number(roots[0]?.ionicStrength) < 0.03).toBe(count === 3);
    },
  );

  test('close to the fold, digits are right all the same', () => {
    const balance = manyProtons(20, '0.01', '0.01980839', 'davies');
    for (const { pH, ionicStrength } of solved(balance, 20).slice(0, 2)) {
      const exact = solvedNear(balance, ionicStrength);
      expect(ionicStrength).toBe(exact.I.toPrecision(20));
      expect(pH).toBe(exact.u.log(10).toPrecision(20));
    }
  });
});
