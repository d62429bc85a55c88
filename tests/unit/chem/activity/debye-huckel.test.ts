import {
  type DebyeHuckelModel,
  debyeHuckelTerm,
} from '../../../../server/chem/activity/debye-huckel';
import { decimals, doubles } from '../../../../server/chem/decimals/arithmetic';

const models: DebyeHuckelModel[] = [
  'debye-huckel',
  'guntelberg',
  'davies',
  'extended-debye-huckel',
];
const parameters = { A: 0.51, linear: 0.3, B: 3.3, size: 900 };
const at = (model: DebyeHuckelModel, ionicStrength: number, more: object = {}) =>
  debyeHuckelTerm(doubles, model, ionicStrength, { ...parameters, ...more });

describe('coefficients that depend on the ionic strength alone', () => {
  test('at I = 0 every ion is ideal', () => {
    for (const model of models) expect(at(model, 0)).toBe(0);
  });

  test('at great dilution all of them are the limiting law', () => {
    // The first term left out is B å √I of one, 3·10⁻⁵ at I = 10⁻¹⁰.
    for (const model of models) expect(at(model, 1e-10) / 0.51e-5).toBeCloseTo(1, 4);
  });

  test('√I = 0.1 by hand', () => {
    expect(at('debye-huckel', 0.01)).toBeCloseTo(0.051, 15);
    expect(at('guntelberg', 0.01)).toBeCloseTo(0.051 / 1.1, 15);
    expect(at('davies', 0.01)).toBeCloseTo(0.51 * (0.1 / 1.1 - 0.003), 15);
    expect(at('extended-debye-huckel', 0.01)).toBeCloseTo(0.051 / (1 + 3.3 * 0.9 * 0.1), 15);
  });

  test('Davies: γ of a monovalent ion is 0.78 at I = 0.1 (recalled, textbooks)', () => {
    expect(10 ** -at('davies', 0.1)).toBeCloseTo(0.78, 2);
  });

  test('the Bates–Guggenheim convention is an ion with B å = 1.5', () => {
    const chloride = at('extended-debye-huckel', 0.1, { B: 3.3, size: 1500 / 3.3 });
    expect(chloride).toBeCloseTo((0.51 * Math.sqrt(0.1)) / (1 + 1.5 * Math.sqrt(0.1)), 15);
  });

  test('Davies’s γ rises again and passes 1 at I = 1.95, as said', () => {
    expect(at('davies', 1.94)).toBeGreaterThan(0);
    expect(at('davies', 1.96)).toBeLessThan(0);
  });

  test('decimals give the same digits', () => {
    const { of } = decimals(40);
    for (const model of models) {
      const exact = debyeHuckelTerm(decimals(40), model, of('0.1'), {
        A: of('0.51'),
        linear: of('0.3'),
        B: of('3.3'),
        size: of('900'),
      });
      expect(Math.abs(exact.toNumber() - at(model, 0.1))).toBeLessThan(1e-15);
    }
  });
});
