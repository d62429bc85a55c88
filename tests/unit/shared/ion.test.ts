import fc from 'fast-check';
import { faultsOf } from '../../../server/http/faults';
import { chargeOfIon, ionInput } from '../../../shared/ion';

const nameOf = (input: unknown) => ionInput.safeParse(input).data;

describe('an ion', () => {
  test.each([
    // What follows ^ is the charge.
    ['K^+', 'K^+', 1],
    ['K^1+', 'K^+', 1],
    ['SO4^2-', 'SO4^2-', -2],
    ['Fe^3+', 'Fe^3+', 3],
    ['Fe(CN)6^3-', 'Fe(CN)6^3-', -3],
    ['Hg2^2+', 'Hg2^2+', 2],
    ['I3^-', 'I3^-', -1],
    ['O2^-', 'O2^-', -1],
    ['Mo7O24^6-', 'Mo7O24^6-', -6],
    ['C10H15^+', 'C10H15^+', 1],
    // One symbol, a digit and a sign.
    ['Ca2+', 'Ca^2+', 2],
    ['Al3+', 'Al^3+', 3],
    ['Th4+', 'Th^4+', 4],
    ['S2-', 'S^2-', -2],
    // The sign alone.
    ['K+', 'K^+', 1],
    ['Cl-', 'Cl^-', -1],
    ['NH4+', 'NH4^+', 1],
    ['H2PO4-', 'H2PO4^-', -1],
    ['B(OH)4-', 'B(OH)4^-', -1],
    ['HCO3-', 'HCO3^-', -1],
    ['OH-', 'OH^-', -1],
    ['VO2+', 'VO2^+', 1],
    ['C4H12NO3+', 'C4H12NO3^+', 1],
  ])('%s is %s, of charge %s', (input, name, charge) => {
    expect(nameOf(input)).toBe(name);
    expect(chargeOfIon(name)).toBe(charge);
  });

  // SO42- may be SO4^2- or SO42^-; I3- is written of triiodide, and no I^3- is known.
  test.each(['SO42-', 'PO43-', 'Cr2O72-', 'Hg22+', 'C10H15+', 'I3-', 'N3-', 'Ca2-'])(
    '%s is asked to say where its charge begins',
    (input) => {
      const { error } = ionInput.safeParse(input, { reportInput: true });
      expect(error && faultsOf(error)).toEqual([
        { pointer: '', code: 'not-an-ion', detail: expect.stringContaining('what follows ^') },
      ]);
    },
  );
});

test.each([
  '',
  '+',
  '^+',
  '2+',
  'K',
  'K^',
  'K^0+',
  'K^7+',
  'K^10+',
  'K7+',
  'Ca+2',
  'Ca^+2',
  'Ca++',
  'Ca^2+^',
  'Ca^2^+',
  'Ca 2+',
  ' K+',
  'K+\n',
  'K\u0000+',
  'Ca\u00b2\u207a',
  'SO\u20844^2-',
  'Cl\u2212',
  '\uff2b+',
  'k+',
  'NQ+',
  'Xx+',
  'Na0+',
  'NaO0^-',
  'NO03^-',
  'O1000^-',
  '()^+',
  'B(OH4-',
  'B)OH(4-',
  'B((OH))4-',
  '(+',
  '__proto__+',
  'constructor',
  'K+; DROP',
  `${'C'.repeat(40)}+`,
])('%j is no ion', (input) => {
  const { error } = ionInput.safeParse(input, { reportInput: true });
  expect(error && faultsOf(error).map(({ code }) => code)).toEqual(['not-an-ion']);
});

test.each([null, 1, ['K+'], { ion: 'K+' }])(
  '%j, which is no text, is of the wrong type',
  (input) => {
    const { error } = ionInput.safeParse(input, { reportInput: true });
    expect(error && faultsOf(error).map(({ code }) => code)).toEqual(['wrong-type']);
  },
);

test('a canonical name stands for itself, has a charge, and the document’s pattern knows it', () => {
  const pattern = new RegExp(String(ionInput.meta()?.pattern), 'u');
  const near = fc.string({ unit: fc.constantFrom(...'HNaOClS246()^+-'), maxLength: 9 });
  const charged = fc
    .tuple(
      near,
      fc.constantFrom('^', ''),
      fc.constantFrom('', '1', '2', '6'),
      fc.constantFrom('+', '-'),
    )
    .map((parts) => parts.join(''));
  let ions = 0;
  fc.assert(
    fc.property(fc.oneof(charged, fc.string()), (input) => {
      const name = nameOf(input);
      if (name === undefined) return;
      ions += 1;
      expect(pattern.test(input)).toBe(true);
      expect(nameOf(name)).toBe(name);
      expect(name.endsWith(chargeOfIon(name) > 0 ? '+' : '-')).toBe(true);
      expect([1, 2, 3, 4, 5, 6]).toContain(Math.abs(chargeOfIon(name)));
    }),
    { numRuns: 5_000 },
  );
  expect(ions).toBeGreaterThan(100);
});

test.each(['K+', 'K', '', 'SO4^-2', 'K^0+'])('%j is no canonical name', (name) => {
  expect(() => chargeOfIon(name)).toThrow(RangeError);
});
