import { OpenAPIRegistry, OpenApiGeneratorV31 } from '@asteasolutions/zod-to-openapi';
import fc from 'fast-check';
import { z } from 'zod';
import { faultsOf } from '../../../server/http/faults';
import { quantity } from '../../../shared/quantity';
import { dimensions, unitsOf, type Dimension } from '../../../shared/units';

const wide = { from: '-1e100', to: '1e100', decimals: 80 };

/** What a quantity comes out as, or the codes it is refused with. */
function outcome(dimension: Dimension, input: unknown, range = wide) {
  const { data, error } = quantity(dimension, range).safeParse(input, { reportInput: true });
  return error ? faultsOf(error).map(({ code }) => code) : data;
}

describe('a value in the own unit stays as it was written', () => {
  test.each(['0', '-0', '0.0250', '2.50e-2', '1E+1', '25.000'])('%s', (value) => {
    expect(outcome('concentration', value)).toBe(value);
    expect(outcome('concentration', `${value} mol/L`)).toBe(value);
  });
});

test.each([
  ['concentration', '25 mmol/L', '0.025'],
  ['temperature', '37 °C', '37'],
  ['volume', '100 uL', '0.0001'],
  ['pressure', '0.0004 atm', '40.53'],
  ['pressure', '400 µatm', '40.53'],
  ['molar energy', '-1.9 kcal/mol', '-7.9496'],
  ['molar heat capacity', '-55 cal/(mol K)', '-230.12'],
  ['length', '4.5 Å', '450'],
  ['concentration', '25.000 mmol/L', '0.025'],
] as const)('%s: %s is %s', (dimension, input, own) => {
  expect(outcome(dimension, input)).toBe(own);
});

const concentration = { from: '0', to: '50', decimals: 60 };

describe('is refused', () => {
  test.each(['1e-400 K', `${'1'.repeat(75)}e-400 K`, '1e400 K'])(
    'a temperature of %s, not rounded in silence',
    (input) => {
      expect(outcome('temperature', input)).toEqual(['out-of-range']);
    },
  );

  test.each([
    ['25mmol/L', 'not-a-quantity'],
    ['25  mmol/L', 'not-a-quantity'],
    ['25 mmol/L ', 'not-a-quantity'],
    [' 25 mmol/L', 'not-a-quantity'],
    ['25 ', 'not-a-quantity'],
    ['', 'not-a-quantity'],
    ['mmol/L', 'not-a-quantity'],
    ['25\tmmol/L', 'not-a-quantity'],
    ['25\u00a0mmol/L', 'not-a-quantity'],
    ['25\nmmol/L', 'not-a-quantity'],
    ['25 mmol/L\n', 'not-a-quantity'],
    ['+25 mmol/L', 'not-a-quantity'],
    ['2,5 mmol/L', 'not-a-quantity'],
    ['1e999 mol/L', 'not-a-quantity'],
    ['NaN mol/L', 'not-a-quantity'],
    ['Infinity', 'not-a-quantity'],
    ['__proto__', 'not-a-quantity'],
    [`0.${'1'.repeat(79)} mmol/L`, 'not-a-quantity'],
    // Wide digits and a ligature that NFKC would turn into what we know.
    ['\uff12\uff15 mmol/L', 'not-a-quantity'],
    ['25 \uff4dmol/L', 'unknown-unit'],
    ['25 mmol\u2215L', 'unknown-unit'],
    ['25 mol/m\u00b3', 'unknown-unit'],
    ['25 mmol/l', 'unknown-unit'],
    ['25 mM', 'unknown-unit'],
    ['25 mmol/kg', 'unknown-unit'],
    ['25 °C', 'unknown-unit'],
    ['1 __proto__', 'unknown-unit'],
    ['1 constructor', 'unknown-unit'],
    ['2 mmol/L; DROP', 'unknown-unit'],
    ['2 mmol/L mmol/L', 'unknown-unit'],
    ['2 * mmol/L', 'unknown-unit'],
    ['2 ${mol/L}', 'unknown-unit'],
    ['50.001', 'out-of-range'],
    ['50001 mmol/L', 'out-of-range'],
    ['-1 mmol/L', 'out-of-range'],
    ['1e400 mmol/L', 'out-of-range'],
    ['1e-400 mmol/L', 'out-of-range'],
    ['1e-58 mmol/L', 'out-of-range'],
  ])('%j as %s', (input, code) => {
    expect(outcome('concentration', input, concentration)).toEqual([code]);
  });

  test('a JSON number, which has lost digits before we see it', () => {
    expect(outcome('concentration', 0.025)).toEqual(['decimal-must-be-string']);
  });

  test.each([null, true, ['25'], { value: '25' }])('%j, which is no text', (input) => {
    expect(outcome('concentration', input)).toEqual(['wrong-type']);
  });

  test('what would be longer than a decimal may be, in its own unit', () => {
    const range = { from: '0', to: '1e200', decimals: 200 };
    expect(outcome('concentration', '1e-77 mmol/L', range)).toEqual(['out-of-range']);
    expect(outcome('concentration', '1e-75 mmol/L', range)).toBe(`0.${'0'.repeat(77)}1`);
    expect(outcome('mass', '1e80 kg', range)).toEqual(['out-of-range']);
  });

  test.each(['\u2103', '\u2109', '\u212a', 'C', 'F', 'degF', 'k'])(
    'a temperature in %s',
    (unit) => {
      expect(outcome('temperature', `25 ${unit}`)).toEqual(['unknown-unit']);
    },
  );
});

describe('says', () => {
  const detail = (dimension: Dimension, input: unknown) => {
    const { error } = quantity(dimension, concentration).safeParse(input, { reportInput: true });
    return error && faultsOf(error)[0]?.detail;
  };

  test.each(['25mmol/L', '25  mmol/L'])('of %j how a quantity is written', (input) => {
    expect(detail('concentration', input)).toContain('one space and a unit, such as "25 mmol/L"');
  });

  test('which units a dimension has', () => {
    expect(detail('concentration', '25 mM')).toContain(
      'mol/L, mmol/L, µmol/L (or umol/L), nmol/L, mol/m3',
    );
    expect(detail('temperature', '98.6 °F')).toContain('°C, K');
  });

  test('what to do with molalities', () => {
    expect(detail('concentration', '0.1 mol/kg')).toContain('without a unit');
  });

  test('the range in the own unit', () => {
    expect(detail('concentration', '51000 mmol/L')).toContain('between 0 and 50 mol/L');
  });

  test('nothing of what was sent', () => {
    expect(detail('concentration', '1 <script>')).not.toContain('script');
  });
});

describe('in the OpenAPI document', () => {
  const field = quantity('concentration', concentration);
  const asked = z.strictObject({ it: field, mine: field.meta({ description: 'Mine.' }) });
  const registry = new OpenAPIRegistry();
  registry.registerPath({
    method: 'post',
    path: '/',
    request: {
      body: { content: { 'application/json': { schema: asked.meta({ id: 'Asked' }) } } },
    },
    responses: {},
  });
  const { components } = new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: { title: 'One field, twice', version: '1' },
  });

  test('a quantity is a string with a pattern, its own unit, and a description of one’s own', () => {
    const common = {
      type: 'string',
      'x-unit': 'mol/L',
      pattern: expect.stringContaining('mmol/L'),
    };
    expect(components?.schemas?.Asked).toMatchObject({
      properties: {
        it: { ...common, description: expect.stringContaining('umol/L') },
        mine: { ...common, description: 'Mine.' },
      },
    });
  });

  test.each(dimensions)('the pattern of a %s knows its units', (dimension) => {
    const { pattern, maxLength } = quantity(dimension, wide).meta() ?? {};
    const matches = new RegExp(String(pattern), 'u');
    for (const spelling of unitsOf(dimension).units.flatMap(({ spellings }) => spellings)) {
      expect(matches.test(`-2.5e-3 ${spelling}`)).toBe(true);
      expect(matches.test(`-2.5e-3${spelling}`)).toBe(false);
      expect(`${'1'.repeat(80)} ${spelling}`.length).toBeLessThanOrEqual(Number(maxLength));
    }
  });

  test('what a pattern does not know is refused', () => {
    const field = quantity('molar heat capacity', wide);
    const matches = new RegExp(String(field.meta()?.pattern), 'u');
    const near = fc.string({ unit: fc.constantFrom(...'0123.e-kJcal/(mo K)') });
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string(),
          near,
          near.map((unit) => `1 ${unit}`),
        ),
        (input) => {
          expect(field.safeParse(input).success && !matches.test(input)).toBe(false);
        },
      ),
      { numRuns: 2_000 },
    );
  });
});
