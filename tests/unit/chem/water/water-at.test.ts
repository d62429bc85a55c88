import { kelvinOf } from '../../../../server/chem/water/kelvin';
import { waterAt } from '../../../../server/chem/water/water-at';

describe('water at a temperature', () => {
  test('0 °C is 273.15 K by definition, and no decimal is lost', () => {
    expect(kelvinOf('0').toString()).toBe('273.15');
    expect(kelvinOf('-273.15').toString()).toBe('0');
    expect(kelvinOf('25.00000000000000000001').toString()).toBe('298.15000000000000000001');
    expect(kelvinOf('1e-20').toFixed()).toBe('273.15000000000000000001');
  });

  test('a quotient of a temperature does not have the 24,000 digits of exact sums', () => {
    expect(kelvinOf('26').dividedBy(7).precision()).toBeLessThan(20);
  });

  test('water at 25 °C is told as answers print it', () => {
    expect(waterAt('25')).toEqual({
      pKw: '13.994524',
      A: '0.509777',
      B: '3.284308',
      permittivity: '78.4083',
      density: '997.0449',
    });
  });

  test('every property has its places, trailing zeros kept', () => {
    for (const celsius of ['0', '4', '25.0', '37', '1e1', '99.99', '100']) {
      const { pKw, A, B, permittivity, density } = waterAt(celsius);
      for (const each of [pKw, A, B]) expect(each).toMatch(/^\d+\.\d{6}$/);
      for (const each of [permittivity, density]) expect(each).toMatch(/^\d+\.\d{4}$/);
    }
    expect(waterAt('4').permittivity).toBe('86.3090');
  });

  test('spellings of one temperature give one water', () => {
    expect(waterAt('25.000')).toEqual(waterAt('25'));
    expect(waterAt('2.5e1')).toEqual(waterAt('25'));
  });

  test('pKw and permittivity fall, A and B rise with temperature; water is densest at 4 °C', () => {
    const all = Array.from({ length: 101 }, (_, t) => waterAt(String(t)));
    const steps = all.slice(1).map((next, i) => [all[i] ?? next, next] as const);
    for (const [colder, warmer] of steps) {
      expect(Number(warmer.pKw)).toBeLessThan(Number(colder.pKw));
      expect(Number(warmer.permittivity)).toBeLessThan(Number(colder.permittivity));
      expect(Number(warmer.A)).toBeGreaterThan(Number(colder.A));
      expect(Number(warmer.B)).toBeGreaterThan(Number(colder.B));
    }
    const densities = all.map(({ density }) => Number(density));
    expect(densities.indexOf(Math.max(...densities))).toBe(4);
  });

  test.each(['-0.01', '100.01', '1e9', 'NaN', 'Infinity'])('%s °C is refused', (celsius) => {
    expect(() => waterAt(celsius)).toThrow(RangeError);
  });
});
