import { Exact } from '../../../server/chem/decimals/contexts';
import {
  keptForPlaces,
  roundsOneWay,
  tailAfter,
  tieNear,
  writePlaces,
  writeSignificant,
} from '../../../server/chem/decimals/rounding';

describe('digits behind the rounding place', () => {
  test('are the seven that follow in the coefficient, wherever words begin', () => {
    const digits = '314159265358979323846264338327950288419716939937510582097494459';
    for (let exponent = -30; exponent <= 30; exponent++) {
      const x = new Exact(`${digits}e${exponent}`);
      for (let kept = 0; kept <= 70; kept++) {
        const expected = Number(digits.padEnd(90, '0').slice(kept, kept + 7));
        expect(tailAfter(x, kept)).toBe(expected);
      }
    }
  });

  test('are none before the first digit, and none of zero', () => {
    expect(tailAfter(new Exact('0.09'), -1)).toBe(0);
    expect(tailAfter(new Exact(0), 3)).toBe(0);
  });

  test('decide unless they are next to one half', () => {
    expect(roundsOneWay(new Exact('0.12499'), 2)).toBe(true);
    expect(roundsOneWay(new Exact('0.124999999'), 2)).toBe(false);
    expect(roundsOneWay(new Exact('0.125'), 2)).toBe(false);
    expect(roundsOneWay(new Exact('0.125000001'), 2)).toBe(false);
    expect(roundsOneWay(new Exact('0.12501'), 2)).toBe(true);
    expect(roundsOneWay(new Exact(`0.${'9'.repeat(300)}`), 5)).toBe(true);
  });

  test('next to one half the tie is found, from below and from above', () => {
    expect(tieNear(new Exact('0.124999999'), 2).toString()).toBe('0.125');
    expect(tieNear(new Exact('0.125000001'), 2).toString()).toBe('0.125');
    expect(tieNear(new Exact('-1234.4999999'), 4).toString()).toBe('-1234.5');
    expect(tieNear(new Exact('0.0499999999'), 0).toString()).toBe('0.05');
    expect(tieNear(new Exact('2.4999999999e-300'), 1).toString()).toBe('2.5e-300');
  });
});

describe('how a number is written', () => {
  test.each([
    ['0.38576791', 3, '0.386'],
    ['2.5e-28', 1, '2e-28'],
    ['2.052846829e-28', 3, '2.05e-28'],
    ['1e20', 4, '1.000e+20'],
    ['1000', 4, '1000'],
    ['9999.6', 4, '1.000e+4'],
    ['0.000001', 2, '0.0000010'],
    ['0.00000099999', 2, '0.0000010'],
    ['9.94e-7', 2, '9.9e-7'],
    ['0', 4, '0.000'],
    ['-0', 2, '0.0'],
    ['0', 1, '0'],
    ['-5', 3, '-5.00'],
    ['0.125', 2, '0.12'],
    ['0.375', 2, '0.38'],
  ])('%s to %d significant digits is %s', (x, digits, written) => {
    expect(writeSignificant(new Exact(x), digits)).toBe(written);
  });

  test.each([
    ['-1.6142346', 4, '-1.6142'],
    ['-0.004', 2, '0.00'],
    ['-0.005', 2, '0.00'],
    ['-0.0051', 2, '-0.01'],
    ['-0', 1, '0.0'],
    ['12', 3, '12.000'],
    ['1e-30', 2, '0.00'],
    ['-99.95', 1, '-100.0'],
  ])('%s to %d places is %s', (x, places, written) => {
    expect(writePlaces(new Exact(x), places)).toBe(written);
  });

  test('places after the point are digits of the coefficient, none of them for a small number', () => {
    expect(keptForPlaces(new Exact('12.345'), 2)).toBe(4);
    expect(keptForPlaces(new Exact('0.05'), 1)).toBe(0);
    expect(keptForPlaces(new Exact('0.005'), 1)).toBe(-1);
  });
});
