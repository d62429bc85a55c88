import { pKAtTemperature } from '../../../../server/chem/constants/pk-at-temperature';
import { Exact } from '../../../../server/chem/decimals/contexts';
import { kelvinOf } from '../../../../server/chem/water/kelvin';
import { pKAt, pKPlaces } from '../../../../server/chem/water/water-at';

const tris = { pK: '8.072', deltaH: '47.45', deltaCp: '-59' };
const constant = (pK: string, deltaH: string, deltaCp: string) => ({
  pK: new Exact(pK),
  deltaH: new Exact(deltaH),
  deltaCp: new Exact(deltaCp),
});

describe('a constant at a temperature', () => {
  test('at 25 °C it is the one that was given, as it was written', () => {
    expect(pKAt('25', { ...tris, pK: '8.0720' })).toBe('8.0720');
    expect(pKAt('25.00', { ...tris, pK: '1e-40' })).toBe('1e-40');
    const long = constant('0.00000000000000000005', '47.45', '-59');
    expect(pKAtTemperature(30, long, kelvinOf('25')).toString()).toBe('5e-20');
    expect(pKAtTemperature(30, constant('0', '1', '1'), kelvinOf('25')).toString()).toBe('0');
  });

  test('without enthalpy and heat capacity it stays', () => {
    expect(pKAt('60', { pK: '4.7600', deltaH: '0' })).toBe('4.7600');
    expect(pKAt('60', { pK: '4.7600', deltaH: '0.0', deltaCp: '0' })).toBe('4.7600');
    expect(pKAtTemperature(2, constant('1.25', '0', '0'), kelvinOf('60')).toString()).toBe('1.2');
  });

  test('moved, it has at most ten places and no trailing zeros', () => {
    expect(pKPlaces).toBe(10);
    expect(pKAt('37', tris)).toBe('7.7527346929');
    const more = pKAtTemperature(40, constant('8.072', '47.45', '-59'), kelvinOf('37'));
    expect(more.toFixed(pKPlaces, Exact.rounding)).toBe(pKAt('37', tris));
    // A hair from 25 °C nothing is left of it: ten places, then stripped.
    expect(pKAt('25.00000000000000000001', tris)).toBe('8.072');
    expect(pKAt('25.00000000000000000001', { pK: '0', deltaH: '1' })).toBe('0');
  });

  test('ten places are rounded from the exact value: a tie that was given is decided by ΔH°', () => {
    // An exothermic ionization raises pK with temperature, an endothermic one lowers it.
    const tie = '7.00000000005';
    const warmer = '25.00000000000000000001';
    expect(pKAt(warmer, { pK: tie, deltaH: '-1' })).toBe('7.0000000001');
    expect(pKAt(warmer, { pK: tie, deltaH: '1' })).toBe('7');
  });

  test('digits that cancel are made up for', () => {
    // pK − its own shift of 25 digits leaves what follows them.
    const T = kelvinOf('37');
    const shift = pKAtTemperature(60, constant('0', '47.45', '-59'), T);
    const nearly = shift.negated().toSignificantDigits(25).toString();
    const left = pKAtTemperature(20, constant(nearly, '47.45', '-59'), T);
    const expected = new Exact(shift).plus(nearly).toSignificantDigits(20);
    expect(left.toString()).toBe(expected.toString());
  });

  test('ΔCp° left out is nought', () => {
    expect(pKAt('37', { pK: '7', deltaH: '10' })).toBe(
      pKAt('37', { pK: '7', deltaH: '10', deltaCp: '0' }),
    );
  });

  test('its slope at 25 °C is that of van ’t Hoff, −ΔH°/(R T² ln 10)', () => {
    const at = (celsius: string) =>
      pKAtTemperature(60, constant('8.072', '47.45', '-59'), kelvinOf(celsius));
    const slope = at('25.0000001').minus(at('24.9999999')).dividedBy('2e-7').toNumber();
    expect(slope).toBeCloseTo(-47450 / (8.314462618 * 298.15 ** 2 * Math.LN10), 12);
  });
});
