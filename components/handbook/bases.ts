import type { Constant } from '../../shared/constant';

/** What one or more constants of a determination have in common besides their values. */
export interface Basis {
  /** Which constants, from 1. */
  readonly steps: readonly number[];
  /** One of them, for all. */
  readonly of: Constant;
}

const shared = [
  'kind',
  'temperature',
  'ionicStrength',
  'source',
  'provenance',
  'provenanceNote',
] as const satisfies readonly (keyof Constant)[];

const standAlike = (one: Constant, other: Constant) =>
  shared.every((key) => one[key] === other[key]) &&
  (one.uncertainty === null) === (other.uncertainty === null);

/** Constants gathered by kind, temperature, medium, source and provenance, in their order. */
export function basesOf(constants: readonly Constant[]): Basis[] {
  const bases: { steps: number[]; of: Constant }[] = [];
  for (const constant of constants) {
    const same = bases.find(({ of }) => standAlike(of, constant));
    if (same) same.steps.push(constant.step);
    else bases.push({ steps: [constant.step], of: constant });
  }
  return bases;
}

/** Numbers of constants as they are read: `1`, `1 and 2`, `1, 2 and 4`. */
export const stepsInWords = (steps: readonly number[]) =>
  [steps.slice(0, -1).join(', '), String(steps.at(-1))].filter(Boolean).join(' and ');

export const kindWords: Readonly<Record<Constant['kind'], string>> = {
  thermodynamic: 'Thermodynamic',
  mixed: 'Mixed',
  concentration: 'Concentration',
};

/** What the kind of a constant means, in a sentence. */
export const kindMeaning: Readonly<Record<Constant['kind'], string>> = {
  thermodynamic: 'all activities, at ionic strength 0',
  mixed: 'activity of hydrogen ion, concentrations of the rest',
  concentration: 'all concentrations',
};

/** How a value came here: `Read in a public copy`, `Recalled: within 0.05`. */
export function provenanceWords({
  provenance,
  provenanceNote,
}: Pick<Constant, 'provenance' | 'provenanceNote'>): string {
  switch (provenance) {
    case 'read':
      return `Read in ${provenanceNote ?? 'a copy of the source'}`;
    case 'recalled':
      return provenanceNote === null ? 'Recalled' : `Recalled: ${provenanceNote}`;
    case 'stated':
      return 'Stated by its owner';
  }
}

/** What a recalled value asks of a reader. */
export const recalledMeans = 'From memory: check it against the source before you rely on it.';
