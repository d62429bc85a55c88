import { Exact } from '../../shared/decimal';
import type { MixtureAnswer } from '../../shared/mixtures';
import { genericFormulas } from '../curves/species-formulas';
import { systemTitle } from '../handbook/system-title';
import type { Answered } from './mixture-queries';
import { systemsIn } from './mixture-request';

export interface ShownSpecies {
  readonly formula: string;
  readonly charge: number;
  /** mol/L. */
  readonly concentration: string;
  readonly fraction: string;
  readonly activityCoefficient: string;
}

/** A system in the mixture, however many times it was weighed in. */
export interface ShownSystem {
  readonly key: string;
  readonly title: string;
  /** As the answer has them, one for each time it was weighed in. */
  readonly members: readonly MixtureAnswer['components'][number][];
  readonly species: readonly ShownSpecies[];
}

const digits = 16;
const sum = (values: readonly string[]) =>
  values.length === 1
    ? (values[0] ?? '0')
    : values
        .reduce((total, value) => total.plus(value), new Exact(0))
        .toSignificantDigits(digits)
        .toString();

/** Name of a component of the answer as a title. */
export const componentTitle = ({ name }: MixtureAnswer['components'][number]) =>
  name === undefined ? 'Your own constants' : systemTitle(name);

/** The systems of an answer: what was weighed in as several forms is one, as it is in the flask. */
export function shownSystems({ asked, answer }: Answered): ShownSystem[] {
  const weighed = systemsIn(asked.body);
  const once = new Set(weighed.flat());
  const others = answer.components.flatMap((_, index) => (once.has(index) ? [] : [[index]]));
  return [...weighed, ...others].flatMap((indices) => {
    const members = indices.flatMap((index) => answer.components[index] ?? []);
    const [first] = members;
    if (!first) return [];
    const generic = genericFormulas({
      fullyProtonatedCharge: first.species[0]?.charge ?? 0,
      pKa: first.species.slice(1).map(() => '0'),
    });
    return {
      key: indices.join(' '),
      title: componentTitle(first),
      members,
      species: first.species.map((one, at) => ({
        formula: one.formula ?? generic[at] ?? '',
        charge: one.charge,
        concentration: sum(members.map(({ species }) => species[at]?.concentration ?? '0')),
        fraction: one.fraction,
        activityCoefficient: one.activityCoefficient,
      })),
    };
  });
}

export interface ShownIon {
  readonly ion: string;
  readonly concentration: string;
  readonly activityCoefficient: string;
}

/** Every ion beside those of the systems, those of water first. */
export const shownIons = ({ answer }: Answered): ShownIon[] => [
  {
    ion: 'H^+',
    concentration: answer.hydrogen,
    activityCoefficient: answer.hydrogenActivityCoefficient,
  },
  {
    ion: 'OH^-',
    concentration: answer.hydroxide,
    activityCoefficient: answer.hydroxideActivityCoefficient,
  },
  ...answer.ions.map(({ ion, charge, ...rest }) => ({ ion: ion ?? unnamed(charge), ...rest })),
];

const unnamed = (charge: number) => `ion^${Math.abs(charge)}${charge < 0 ? '-' : '+'}`;
