import { capacityOf, capacityOfWater } from '../../../components/mixture/capacity-of';
import { drawnCapacity } from '../../../components/mixture/drawn-capacity';
import type { Answered } from '../../../components/mixture/mixture-queries';
import { shownIons, shownSystems } from '../../../components/mixture/shown-mixture';
import type { MixtureAnswer } from '../../../shared/mixtures';

type Component = MixtureAnswer['components'][number];

/** A component of an answer from its total and its fractions. */
function component(
  name: string,
  charge: number,
  total: string,
  fractions: readonly string[],
  heldBy: Component['heldBy'] = null,
): Component {
  return {
    name,
    weighedAs: null,
    heldBy,
    total,
    species: fractions.map((fraction, index) => ({
      index,
      charge: charge - index,
      formula: null,
      concentration: String(Number(total) * Number(fraction)),
      fraction,
      activityCoefficient: '1',
    })),
  };
}

/** KH2PO4 and Na2HPO4, 0.025 mol/L each, by Davies at 25 °C, as /v1/mixtures answers. */
const phosphateOf = (total: string) =>
  component('phosphoric acid', 0, total, [
    '0.000007299943430299538',
    '0.4999897206399115',
    '0.4999972072481209',
    '0.000005772168537297620',
  ]);
const phosphate = phosphateOf('0.05');
const water = { hydrogen: '1.701074525130779e-7', hydroxide: '9.752536425460782e-8' };
const pH = 6.876459120162433;

describe('the capacity around an answer', () => {
  // Of /v1/buffer-capacity for the same system at the ionic strength of that answer, to 8 digits.
  test.each([
    [2, 0.028720357, 0.029471222],
    [5, 0.0016164911, 0.000029474207],
    [11.5, 0.02532692, 0.0094378735],
  ])('at pH %d is what the service computes there', (at, part, ofWater) => {
    expect(capacityOf(phosphate, at - pH)).toBeCloseTo(part, 9);
    expect(capacityOfWater(water, at - pH)).toBeCloseTo(ofWater, 9);
  });

  test('a lone monoprotic buffer peaks at 0.576 of its concentration', () => {
    // Van Slyke, J. Biol. Chem. 52, 525 (1922): β = 0.576 c at pH = pK′.
    expect(capacityOf(component('acid', 0, '1', ['0.5', '0.5']), 0)).toBeCloseTo(0.576, 3);
    expect(capacityOf(component('acid', 0, '1', ['0.5', '0.5']), 3)).toBeLessThan(0.0024);
  });

  test('of what the air holds grows tenfold a pH unit, as its hydrogencarbonate does', () => {
    const air = component('carbonic acid', 0, '0.0000143', ['1', '0'], {
      partialPressure: '42.5565',
      henryConstant: '0.0340455',
    });
    const species = air.species.map((one, i) =>
      i === 1 ? { ...one, concentration: '1e-6' } : one,
    );
    const held = { ...air, species };
    expect(capacityOf(held, 0)).toBeCloseTo(Math.LN10 * 1e-6, 15);
    expect(capacityOf(held, 2)).toBeCloseTo(Math.LN10 * 1e-4, 13);
  });

  test('does not lose a form that no double can hold', () => {
    const rare = component('acid', 0, '1', ['1.000000', '1e-400']);
    expect(capacityOf(rare, 400)).toBeCloseTo(0.576, 3);
  });
});

const answered = {
  asked: {
    body: {
      components: [1, 2].map((form) => ({
        system: { id: 'phosphoric-acid' },
        concentration: '0.025',
        form,
      })),
    },
    components: [0, 1],
    ions: [],
  },
  answer: {
    pH: String(pH),
    ...water,
    hydrogenActivityCoefficient: '0.78',
    hydroxideActivityCoefficient: '0.78',
    bufferCapacity: '0.02878593987453230',
    components: [phosphateOf('0.025'), phosphateOf('0.025')],
    ions: [{ ion: null, charge: 2, concentration: '0.1', activityCoefficient: '0.37' }],
  },
} as unknown as Answered;

describe('the mixture as it is shown', () => {
  test('a system weighed in as two salts is one, its portions added', () => {
    const [system, ...others] = shownSystems(answered);
    expect(others).toEqual([]);
    expect(system?.title).toBe('Phosphoric acid');
    expect(system?.species.map(({ formula }) => formula)).toEqual([
      'H3A',
      'H2A^-',
      'HA^2-',
      'A^3-',
    ]);
    expect(Number(system?.species[1]?.concentration)).toBeCloseTo(0.05 * 0.4999897206399115, 12);
  });

  test('the ions of water come first, and one without a name shows its charge', () => {
    expect(shownIons(answered).map(({ ion }) => ion)).toEqual(['H^+', 'OH^-', 'ion^2+']);
  });

  test('the curve passes through the answer’s own capacity, and ends above its parts', () => {
    const drawn = drawnCapacity(answered);
    const i = drawn.pH.findIndex((value) => value > pH);
    expect(drawn.range).toEqual([1, 13]);
    // Two points 0.05 of pH apart beside a maximum of 28.79 mmol/L per pH.
    expect(drawn.whole[i]).toBeCloseTo(28.79, 1);
    expect(drawn.at.text).toBe('28.8');
    expect(drawn.top).toBe(40);
    expect(drawn.parts).toHaveLength(1);
  });
});
