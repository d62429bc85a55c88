import type { Constant } from '../../shared/constant';

/** Constants from one source that came here in one way. */
export interface Basis {
  /** Which constants, from 1. */
  readonly steps: readonly number[];
  readonly source: string;
  readonly provenance: Constant['provenance'];
  readonly provenanceNote: string | null;
  readonly media: readonly MediumOf[];
}

/** Constants of one kind, temperature and medium. */
export interface MediumOf {
  readonly steps: readonly number[];
  readonly kind: Constant['kind'];
  /** °C. */
  readonly temperature: string;
  /** mol/L; null where it is not stated. */
  readonly ionicStrength: string | null;
}

/** Groups of constants that agree in every one of the keys, in the order of their first ones. */
function gathered<Key extends keyof Constant>(
  constants: readonly Constant[],
  keys: readonly Key[],
): (Pick<Constant, Key> & { constants: Constant[]; steps: number[] })[] {
  const groups: { constants: Constant[]; first: Constant }[] = [];
  for (const constant of constants) {
    const same = groups.find(({ first }) => keys.every((key) => first[key] === constant[key]));
    if (same) same.constants.push(constant);
    else groups.push({ constants: [constant], first: constant });
  }
  return groups.map(({ constants: these, first }) => ({
    ...first,
    constants: these,
    steps: these.map(({ step }) => step),
  }));
}

/** What constants stand on: by source and provenance, and within these by kind and medium. */
export const basesOf = (constants: readonly Constant[]): Basis[] =>
  gathered(constants, ['source', 'provenance', 'provenanceNote']).map((group) => ({
    ...group,
    media: gathered(group.constants, ['kind', 'temperature', 'ionicStrength']),
  }));

/** Numbers of constants as they are read, runs joined: `1`, `1 and 2`, `1 to 4`, `1, 3 and 5 to 7`. */
export function stepsInWords(steps: readonly number[]): string {
  const runs: number[][] = [];
  for (const step of steps) {
    const run = runs.at(-1);
    if (run && step === (run.at(-1) ?? 0) + 1) run.push(step);
    else runs.push([step]);
  }
  const parts = runs.flatMap((run) =>
    run.length > 2 ? [`${run[0]} to ${run.at(-1)}`] : run.map(String),
  );
  return [parts.slice(0, -1).join(', '), parts.at(-1)].filter(Boolean).join(' and ');
}

export const kindWords: Readonly<Record<Constant['kind'], string>> = {
  thermodynamic: 'Thermodynamic',
  mixed: 'Mixed',
  concentration: 'Concentration',
};

/** What the kind of a constant means. */
export const kindMeaning: Readonly<Record<Constant['kind'], string>> = {
  thermodynamic: 'all activities, at ionic strength 0',
  mixed: 'activity of hydrogen ion, concentrations of the rest',
  concentration: 'all concentrations',
};

/** How a value came here: `Read in a public copy`, `Recalled: within 0.05`. */
export function provenanceWords({
  provenance,
  provenanceNote,
}: Pick<Basis, 'provenance' | 'provenanceNote'>): string {
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
