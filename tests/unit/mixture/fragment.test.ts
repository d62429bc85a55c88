import fc from 'fast-check';
import { electrolyteNames } from '../../../components/mixture/electrolytes';
import { formatFragment, parseFragment } from '../../../components/mixture/fragment';
import {
  emptyFlask,
  firstState,
  type MixtureState,
} from '../../../components/mixture/mixture-state';
import { activityModels } from '../../../shared/conditions';
import { text } from '../../../shared/text';

const decimal = (most: number) =>
  fc
    .record({
      whole: fc.integer({ min: 0, max: most - 1 }),
      places: fc.integer({ min: 0, max: 9999 }),
    })
    .map(({ whole, places }) => `${whole}.${String(places).padStart(4, '0')}`);

const stored = fc
  .stringMatching(/^[a-z0-9]+(-[a-z0-9]+){0,3}(@[1-9][0-9]{0,8})?$/)
  .filter((id) => id.length <= 80)
  .map((id) => ({ kind: 'stored', id }) as const);
const name = fc
  .string({ unit: 'binary', minLength: 1, maxLength: 40 })
  .map((written) => written.replace(/[\p{Cc}\p{Cs}\p{Bidi_Control}]/gu, '').trim())
  .filter((written) => text(200).safeParse(written).success);
const typed = fc.record({
  kind: fc.constant('typed' as const),
  system: fc.record(
    {
      name,
      fullyProtonatedCharge: fc.integer({ min: -100, max: 100 }),
      pKa: fc.array(decimal(70), { minLength: 1, maxLength: 8 }),
    },
    { requiredKeys: ['fullyProtonatedCharge', 'pKa'] },
  ),
});

const state: fc.Arbitrary<MixtureState> = fc.record({
  parts: fc.array(
    fc.oneof(stored, typed).chain((choice) =>
      fc.record({
        choice: fc.constant(choice),
        form: fc.option(
          fc.integer({ min: 0, max: choice.kind === 'typed' ? choice.system.pKa.length : 64 }),
          { nil: undefined },
        ),
        counterIon: fc.constantFrom(undefined, 'K^+', 'NH4^+', 'Ca^2+', 'Cl^-'),
        concentration: decimal(50),
      }),
    ),
    { maxLength: 24 },
  ),
  strongAcid: fc.oneof(fc.constant('0'), decimal(50)),
  strongBase: fc.oneof(fc.constant('0'), decimal(50)),
  electrolytes: fc.array(
    fc.record({ name: fc.constantFrom(...electrolyteNames), concentration: decimal(50) }),
    { maxLength: 12 },
  ),
  air: fc.option(decimal(100), { nil: undefined }),
  temperature: decimal(100),
  model: fc.constantFrom(...activityModels),
  ionicStrength: fc.option(decimal(20), { nil: undefined }),
  beyond: fc.boolean(),
});

describe('the fragment of the address', () => {
  test('any state comes back as it was', () => {
    fc.assert(
      fc.property(state, (given) => {
        const fragment = formatFragment(given);
        expect(fragment).toMatch(/^[!-~]*$/);
        expect(parseFragment(`#${fragment}`)).toEqual({ state: given, faulty: false });
      }),
      { numRuns: 500 },
    );
  });

  test('it reads as a person would write it', () => {
    expect(formatFragment(firstState)).toBe(
      'system=phosphoric-acid&form=1&ion=K%5E%2B&c=0.025&system=phosphoric-acid&form=2&c=0.025&T=25',
    );
    expect(formatFragment(emptyFlask)).toBe('T=25');
  });

  test('nothing is a first visit, and a temperature alone an empty flask', () => {
    expect(parseFragment('')).toEqual({ state: firstState, faulty: false });
    expect(parseFragment('#T=25')).toEqual({ state: emptyFlask, faulty: false });
  });

  test('units are taken, and an ion however it is written', () => {
    const { state: read, faulty } = parseFragment(
      '#system=tris&ion=Cl-&c=50+mmol/L&salt=NaCl&c=0.1&T=310.15+K&I=100+mmol/L',
    );
    expect(faulty).toBe(false);
    expect(read).toMatchObject({
      parts: [{ counterIon: 'Cl^-', concentration: '0.05' }],
      electrolytes: [{ name: 'NaCl', concentration: '0.1' }],
      temperature: '37',
      ionicStrength: '0.1',
    });
  });

  test.each([
    ['a concentration that is none', '#system=tris&c=much'],
    ['a component without one', '#system=tris'],
    ['a concentration of nothing', '#c=0.1'],
    ['an id that can be none', '#system=Citric+acid&c=0.1'],
    ['a form beyond the last', '#charge=0&pKa=4,5&form=3&c=0.1'],
    ['an ion that is none', '#system=tris&form=1&ion=salt&c=0.1'],
    ['a salt that is not known', '#salt=unobtainium&c=0.1'],
    ['a temperature that is none', '#T=warm'],
    ['a model that is not known', '#T=25&model=guess'],
    ['a key twice', '#system=tris&c=0.1&c=0.2'],
    ['an unknown key', '#T=25&note=hello'],
    ['a broken escape', '#name=%E0%A4%A&charge=0&pKa=4&c=0.1'],
    ['25 components', `#${Array.from({ length: 25 }, () => 'system=tris&c=0.1').join('&')}`],
  ])('%s is said to be faulty', (_, fragment) => {
    expect(parseFragment(fragment).faulty).toBe(true);
  });

  test('a fault in one component leaves the others', () => {
    const { state: read } = parseFragment('#system=tris&c=x&system=glycine&c=0.1');
    expect(read.parts).toEqual([
      { choice: { kind: 'stored', id: 'glycine' }, concentration: '0.1' },
    ]);
  });

  test('whatever stands there, a flask that can be filled comes of it', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.webFragments()), (written) => {
        const { state: read } = parseFragment(written);
        expect(parseFragment(formatFragment(read))).toEqual({ state: read, faulty: false });
      }),
      { numRuns: 500 },
    );
  });
});
