import fc from 'fast-check';
import {
  ionicStrengthAsked,
  temperatureAsked,
  totalAsked,
} from '../../../components/conditions/asked-quantities';
import { inUnit, typedQuantity } from '../../../components/conditions/typed-quantity';

describe('a quantity as it is typed', () => {
  test.each([
    ['37', '37'],
    ['37 °C', '37'],
    ['37°C', '37'],
    ['36,6', '36.6'],
    // 0 °C is 273.15 K by definition (SI brochure).
    ['310.15 K', '37.00'],
    ['310.15K', '37.00'],
    ['  25 ', '25'],
  ])('%s is a temperature', (text, celsius) => {
    const typed = typedQuantity(text, temperatureAsked);
    expect(typed.ok && Number(typed.value)).toBe(Number(celsius));
  });

  test('a bare number is in the unit of the field', () => {
    expect(typedQuantity('50', totalAsked)).toEqual({ ok: true, value: '0.05' });
    expect(typedQuantity('0.15', ionicStrengthAsked)).toEqual({ ok: true, value: '0.15' });
    expect(typedQuantity('150 mmol/L', ionicStrengthAsked)).toEqual({ ok: true, value: '0.15' });
  });

  test.each(['', 'warm', '25 F', '2 5', '-', '1e3', '25 °C °C'])('“%s” is none', (text) => {
    expect(typedQuantity(text, temperatureAsked)).toEqual({
      ok: false,
      error: 'Write 37 or 310.15 K.',
    });
  });

  test('a comma before three digits is asked about: a thousand to some, one to others', () => {
    expect(typedQuantity('1,000 mmol/L', totalAsked)).toEqual({
      ok: false,
      error: 'Write 1000 or 1.000: the comma could mean either.',
    });
    expect(typedQuantity('0,025 mol/L', ionicStrengthAsked)).toEqual({ ok: true, value: '0.025' });
  });

  test('beyond its range it is told the range, in the unit of the field', () => {
    expect(typedQuantity('\u22125', temperatureAsked)).toEqual({
      ok: false,
      error: 'Write a value from 0 to 100 °C.',
    });
    expect(typedQuantity('0', totalAsked)).toEqual({
      ok: false,
      error: 'Write a value from 0.000000001 to 50000 mmol/L.',
    });
  });

  test('what is shown of a value is read as that value', () => {
    const decimal = fc
      .record({
        whole: fc.integer({ min: 0, max: 49 }),
        places: fc.integer({ min: 1, max: 99999 }),
      })
      .map(({ whole, places }) => `${whole}.${String(places).padStart(5, '0')}`);
    fc.assert(
      fc.property(decimal, (value) => {
        for (const asked of [totalAsked, temperatureAsked]) {
          const back = typedQuantity(inUnit(value, asked), asked);
          expect(back.ok && Number(back.value)).toBe(Number(value));
        }
      }),
    );
  });
});
