import type { Constant } from '../../../shared/constant';
import type { Warning } from '../../../shared/model';
import { invertedNeighbours } from '../../chem';
import { systemsOf } from './cost';
import type { ResolvedRequest, ResolvedSystem } from './resolve';

/** What answers are computed for, °C, until a call can ask for other conditions. */
export const temperatureUsed = '25';

interface Caution {
  readonly code: Warning['code'];
  readonly concerns: (constant: Constant) => boolean;
  readonly words: (steps: string, constants: readonly Constant[]) => string;
}

const distinct = (values: readonly string[]) => [...new Set(values)].join(' and ');

/** What to say of stored constants that are not just thermodynamic ones at 25 °C. */
const cautions: readonly Caution[] = [
  {
    code: 'estimated-constant',
    concerns: ({ estimate }) => estimate,
    words: (steps) => `${steps}: an estimate, not a measurement.`,
  },
  {
    code: 'constants-at-their-medium',
    concerns: ({ kind }) => kind !== 'thermodynamic',
    words: (steps, constants) => {
      const media = constants.map(({ ionicStrength }) =>
        ionicStrength === null ? 'one unstated' : `${ionicStrength} mol/L`,
      );
      return `${steps}: used as given, for an ionic strength of ${distinct(media)}.`;
    },
  },
  {
    code: 'pka-not-temperature-corrected',
    concerns: ({ temperature }) => Number(temperature) !== Number(temperatureUsed),
    words: (steps, constants) => {
      const degrees = distinct(constants.map(({ temperature }) => `${temperature} °C`));
      return `${steps}: used as given, determined at ${degrees}.`;
    },
  },
];

type Unplaced = Omit<Warning, 'pointer'>;

const cautionsOf = ({ name, stored }: ResolvedSystem): Unplaced[] =>
  cautions.flatMap(({ code, concerns, words }) => {
    const these = (stored?.constants ?? []).filter(concerns);
    if (these.length === 0) return [];
    const steps = these.map(({ step, value }) => `pKa ${step} (${value})`).join(', ');
    return [{ code, message: words(`${name ?? ''}, ${steps}`, these) }];
  });

const inversion = ({ pKa }: ResolvedSystem, i: number): Unplaced => ({
  code: 'inverted-constants',
  message:
    `pKa ${i + 1} (${pKa[i]}) is greater than pKa ${i + 2} (${pKa[i + 1]}): ` +
    `species ${i + 1} never predominates, and others beside it may not either.`,
});

function ofOneSystem(system: ResolvedSystem, place: string): Warning[] {
  const constant = (i: number) => (system.stored ? `${place}/id` : `${place}/pKa/${i}`);
  return [
    ...invertedNeighbours(system).map((i) => ({
      ...inversion(system, i),
      pointer: constant(i),
    })),
    ...cautionsOf(system).map((caution) => ({ ...caution, pointer: `${place}/id` })),
  ];
}

/** What to know of the systems computed with, in words and with the place in the request. */
export const warningsOf = (request: ResolvedRequest): Warning[] =>
  systemsOf(request).flatMap((system, index) =>
    ofOneSystem(system, request.system === undefined ? `/systems/${index}` : '/system'),
  );
