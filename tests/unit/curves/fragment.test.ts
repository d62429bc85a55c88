import fc from 'fast-check';
import type { Choice } from '../../../components/constants/choice';
import type { CurvesState } from '../../../components/curves/curves-state';
import { givenConstants } from '../../../components/curves/curve-asked';
import { curveModels, firstConditions } from '../../../components/curves/curve-conditions';
import { firstState, layers, views } from '../../../components/curves/curves-state';
import { rangeOf, widestRange } from '../../../components/curves/curve-grid';
import { formatFragment, parseFragment } from '../../../components/curves/fragment';
import { pHAt } from '../../../components/curves/ph-steps';
import { text } from '../../../shared/text';

const pKa = fc
  .record({ whole: fc.integer({ min: -49, max: 69 }), decimals: fc.integer({ min: 0, max: 999 }) })
  .map(({ whole, decimals }) => `${whole}.${String(decimals).padStart(3, '0')}`);

const name = fc
  .string({ unit: 'binary', minLength: 1, maxLength: 60 })
  .map((written) => written.replace(/[\p{Cc}\p{Cs}\p{Bidi_Control}]/gu, '').trim())
  .filter((written) => text(200).safeParse(written).success);

const typed = fc.record({
  kind: fc.constant('typed' as const),
  system: fc.record(
    {
      name,
      fullyProtonatedCharge: fc.integer({ min: -100, max: 100 }),
      pKa: fc.array(pKa, { minLength: 1, maxLength: 64 }),
    },
    { requiredKeys: ['fullyProtonatedCharge', 'pKa'] },
  ),
});
const stored = fc
  .stringMatching(/^[a-z0-9]+(-[a-z0-9]+){0,3}(@[1-9][0-9]{0,8})?$/)
  .filter((id) => id.length <= 80)
  .map((id): Choice => ({ kind: 'stored', id }));

const decimal = (whole: number) =>
  fc
    .record({ whole: fc.integer({ min: 0, max: whole }), places: fc.integer({ min: 1, max: 999 }) })
    .map(({ whole, places }) => `${whole}.${String(places).padStart(3, '0')}`);
const conditions = fc.record({
  temperature: decimal(99),
  ionicStrength: decimal(19),
  activityModel: fc.constantFrom(...curveModels),
  outOfRange: fc.constantFrom('refuse' as const, 'compute' as const),
});
const asked = fc.record({
  choice: fc.oneof(stored, typed),
  conditions: fc.oneof(fc.constant(firstConditions), conditions),
});

const state: fc.Arbitrary<CurvesState> = fc
  .record({
    asked,
    at: fc.double({ min: -20, max: 40, noNaN: true }),
    layers: fc.subarray([...layers]),
    view: fc.constantFrom(...views),
    total: decimal(49),
    beside: fc.array(asked, { maxLength: 2 }),
  })
  .map(({ asked: { choice, conditions }, at, ...rest }) => {
    const range = choice.kind === 'typed' ? rangeOf(givenConstants(choice)) : widestRange;
    return { ...rest, choice, conditions, pH: pHAt(at, range) };
  });

describe('the fragment of the address', () => {
  test('any state comes back as it was', () => {
    fc.assert(
      fc.property(state, (given) => {
        expect(parseFragment(`#${formatFragment(given)}`)).toEqual({ state: given, faulty: false });
      }),
      { numRuns: 2000 },
    );
  });

  test('it is plain ASCII without blanks, so that it survives being sent by mail', () => {
    fc.assert(fc.property(state, (given) => expect(formatFragment(given)).toMatch(/^[!-~]*$/)));
  });

  test('it reads as a person would write it', () => {
    expect(formatFragment(firstState)).toBe('system=phosphoric-acid&pH=7.40');
    const own: Choice = {
      kind: 'typed',
      system: { name: 'Tarn Street B', fullyProtonatedCharge: 0, pKa: ['2.148', '7.198', '12.35'] },
    };
    expect(formatFragment({ ...firstState, choice: own, layers: ['fractions'] })).toBe(
      'name=Tarn+Street+B&charge=0&pKa=2.148,7.198,12.35&pH=7.40&layers=fractions',
    );
    const inPlasma = {
      temperature: '37',
      ionicStrength: '0.15',
      activityModel: 'davies',
      outOfRange: 'refuse',
    } as const;
    expect(formatFragment({ ...firstState, conditions: inPlasma, total: '0.01' })).toBe(
      'system=phosphoric-acid&T=37&I=0.15&pH=7.40&c=0.01',
    );
  });

  test('a curve beside is a fragment within the fragment', () => {
    const beside = [{ choice: { kind: 'stored', id: 'citric-acid' }, conditions: firstConditions }];
    expect(formatFragment({ ...firstState, beside } as CurvesState)).toBe(
      'system=phosphoric-acid&pH=7.40&with=system%3Dcitric-acid',
    );
  });

  test('a temperature may be written in kelvin, a total with its unit', () => {
    const { state: read, faulty } = parseFragment('#system=tris&T=310.15+K&c=20+mmol/L');
    expect(faulty).toBe(false);
    expect(read.conditions.temperature).toBe('37');
    expect(read.total).toBe('0.02');
  });

  test('no fragment is the first visit', () => {
    expect(parseFragment('')).toEqual({ state: firstState, faulty: false });
    expect(parseFragment('#')).toEqual({ state: firstState, faulty: false });
  });

  test('what is left out is as on a first visit', () => {
    expect(parseFragment('#system=glycine')).toEqual({
      state: { ...firstState, choice: { kind: 'stored', id: 'glycine' } },
      faulty: false,
    });
  });

  test('the first pH gives way to a range that does not hold it', () => {
    const { state: read, faulty } = parseFragment('#charge=0&pKa=30');
    expect(read.pH).toBe('7.40');
    expect(faulty).toBe(false);
  });

  test.each([
    ['an id that can be none', '#system=Citric+acid&pH=7.40'],
    ['a revision that can be none', '#system=tris@0&pH=7.40'],
    ['an id and constants at once', '#system=glycine&charge=0&pKa=4'],
    ['constants without a charge', '#pKa=4'],
    ['a constant that is none', '#charge=0&pKa=4,x'],
    ['65 constants', `#charge=0&pKa=${Array.from({ length: 65 }, () => '4').join(',')}`],
    ['a charge that is none', '#charge=1e1&pKa=4'],
    ['a pH that is none', '#system=glycine&pH=NaN'],
    ['a pH that the contract does not take', '#system=glycine&pH=41'],
    ['a pH out of the range of typed constants', '#charge=0&pKa=4&pH=39'],
    ['a temperature that is none', '#system=glycine&T=warm'],
    ['an ionic strength below none', '#system=glycine&I=-0.1'],
    ['an unknown activity model', '#system=glycine&model=price'],
    ['a total of nothing', '#system=glycine&c=0'],
    ['three curves beside', '#with=system%3Dtris&with=system%3Dedta&with=system%3Dglycine'],
    ['a curve beside that is none', '#with=system%3DA+b'],
    ['a curve beside with a pH of its own', '#with=system%3Dtris%26pH%3D7'],
    ['an unknown layer', '#system=glycine&layers=fractions,price'],
    ['an unknown view', '#system=glycine&view=price'],
    ['an unknown key', '#system=glycine&note=hello'],
    ['a key twice', '#system=glycine&system=edta'],
    ['a broken escape', '#name=%E0%A4%A&charge=0&pKa=4'],
    ['a prototype', '#__proto__=x'],
    ['no pairs at all', '#/etc/passwd'],
  ])('%s is said to be faulty', (_, fragment) => {
    expect(parseFragment(fragment).faulty).toBe(true);
  });

  test('a fault in one part leaves the others', () => {
    const { state: read, faulty } = parseFragment('#system=citric-acid&pH=soon&view=charge');
    expect(faulty).toBe(true);
    expect(read).toEqual({
      ...firstState,
      choice: { kind: 'stored', id: 'citric-acid' },
      view: 'charge',
    });
  });

  test('whatever stands there, a state that can be drawn comes of it', () => {
    fc.assert(
      fc.property(
        fc.oneof(fc.string(), fc.string({ unit: 'binary' }), fc.webFragments()),
        (text) => {
          const { state: read } = parseFragment(text);
          expect(parseFragment(formatFragment(read))).toEqual({ state: read, faulty: false });
        },
      ),
      { numRuns: 2000 },
    );
  });
});
