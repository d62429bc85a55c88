import { alongPoints } from '../../../server/chem/forms/along-points';
import { planFor } from '../../../server/chem/forms/plan';
import { fractionQuantities, meanChargeQuantity } from '../../../server/chem/forms/quantities';
import { type Quantity, settle } from '../../../server/chem/forms/settle';
import type { AcidBaseSystem } from '../../../server/chem';

const acid = (...pKa: string[]): AcidBaseSystem => ({ fullyProtonatedCharge: 0, pKa });
/** ±n·10⁻⁶⁰ beside a whole number. */
const beside = (whole: string, n: number) => `${whole}.${String(n).padStart(60, '0')}`;

/** What is written, and how many levels of precision it took. */
function settled(system: AcidBaseSystem, pH: string, digits: number, quantity: Quantity) {
  const points = { kind: 'list', values: [pH] } as const;
  const levels = new Set<number>();
  const [written] = alongPoints(system, points, planFor(system, points, digits), (point) => {
    const at = (level: number) => {
      levels.add(level);
      return point.at(level);
    };
    return settle({ ...point, at }, quantity);
  });
  return { written, levels: levels.size };
}

const fraction = (system: AcidBaseSystem, pH: string, digits: number, i: number) => {
  const quantity = fractionQuantities(system, digits)[i];
  if (quantity === undefined) throw new Error(`There is no species ${i}.`);
  return settled(system, pH, digits, quantity);
};
const charge = (system: AcidBaseSystem, pH: string, digits: number) =>
  settled(system, pH, digits, meanChargeQuantity(system, digits));

describe('settling a value', () => {
  test('the planned precision decides an ordinary one', () => {
    expect(fraction(acid('2.148', '7.198', '12.35'), '7.4', 16, 2)).toEqual({
      written: '0.6142230366163610',
      levels: 1,
    });
  });

  test('an exact tie is recognised without more precision: 1/8 to two digits', () => {
    const eight = acid(...Array<string>(7).fill('7'));
    expect(fraction(eight, '7', 2, 5)).toEqual({ written: '0.12', levels: 1 });
    expect(fraction(acid('7', '7', '7'), '7', 1, 0)).toEqual({ written: '0.2', levels: 1 });
  });

  test('an exact tie among terms of 1 and 10: 10/32 to three digits, 91/32 to four places', () => {
    const system = acid('0', '-1', '0', '0');
    expect(fraction(system, '0', 3, 4)).toEqual({ written: '0.312', levels: 1 });
    expect(charge(system, '0', 4)).toEqual({ written: '-2.8438', levels: 1 });
  });

  test('10⁻⁶⁰ beside a tie precision is raised, and each side rounds its own way', () => {
    const eight = acid(...Array<string>(7).fill('7'));
    const below = fraction(eight, beside('7', 1), 2, 0);
    const above = fraction(eight, beside('7', 1), 2, 7);
    expect([below.written, above.written]).toEqual(['0.12', '0.13']);
    for (const { levels } of [below, above]) {
      expect(levels).toBeGreaterThan(1);
      expect(levels).toBeLessThan(8);
    }
  });

  test('10⁻¹¹⁸ beside a tie too, where the first order cancels: −2.84375 + 3·10⁻¹¹⁸', () => {
    // Weights 1, 1, 10, 10, 10 times 10^(37ε) and 10^(27ε) on species 2 and 4, ε = 10⁻⁶⁰.
    const system = acid('0', beside('-1', 37), beside('0', 37), beside('-0', 27));
    const { written, levels } = charge(system, '0', 4);
    expect(written).toBe('-2.8437');
    expect(levels).toBeGreaterThan(3);
  });

  test('a charge that is an integer though fractions are irrational is written in full', () => {
    expect(charge(acid('6.7', '7.3'), '7', 3)).toEqual({ written: '-1.000', levels: 1 });
  });

  test('a half that one place can hold is not rounded', () => {
    expect(charge(acid('7'), '7', 1)).toEqual({ written: '-0.5', levels: 1 });
    expect(charge(acid('7', '7', '7'), '7', 1)).toEqual({ written: '-1.5', levels: 1 });
  });
});
