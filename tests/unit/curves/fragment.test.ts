import fc from 'fast-check';
import type { Choice } from '../../../components/constants/choice';
import type { CurvesState } from '../../../components/curves/curves-state';
import { firstState, givenConstants, layers, views } from '../../../components/curves/curves-state';
import { rangeOf } from '../../../components/curves/curve-grid';
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

const state: fc.Arbitrary<CurvesState> = fc
  .record({
    choice: fc.oneof(stored, typed),
    at: fc.double({ min: -20, max: 40, noNaN: true }),
    layers: fc.subarray([...layers]),
    view: fc.constantFrom(...views),
  })
  .map(({ at, ...rest }) => ({ ...rest, pH: pHAt(at, rangeOf(givenConstants(rest.choice))) }));

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
    ['a pH out of the range', '#system=glycine&pH=39'],
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
