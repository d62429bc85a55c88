import type { ActivityModel } from '../../shared/conditions';

interface ModelWords {
  readonly name: string;
  /** As it is printed on a plot. */
  readonly short: string;
  /** Up to where it may be used, in one line. */
  readonly range: string;
}

/** The activity models in words, each with its range in water. */
export const modelWords: Readonly<Record<ActivityModel, ModelWords>> = {
  ideal: {
    name: 'Ideal',
    short: 'ideal',
    range: 'Every activity coefficient is 1, whatever the ionic strength.',
  },
  'debye-huckel': {
    name: 'Debye–Hückel limiting law',
    short: 'Debye–Hückel',
    range: 'Good to I = 0.005 mol/L in water.',
  },
  'extended-debye-huckel': {
    name: 'Extended Debye–Hückel',
    short: 'extended Debye–Hückel',
    range: 'With ion sizes; good to I = 0.1 mol/L in water.',
  },
  guntelberg: {
    name: 'Güntelberg',
    short: 'Güntelberg',
    range: 'Good to I = 0.1 mol/L in water.',
  },
  davies: { name: 'Davies', short: 'Davies', range: 'Good to I = 0.5 mol/L in water.' },
  'specific-ion-interaction': {
    name: 'Specific ion interaction',
    short: 'specific ion interaction',
    range: 'Good from about 0.1 to 1 mol/kg, and for mixed salts.',
  },
  pitzer: {
    name: 'Pitzer',
    short: 'Pitzer',
    range: 'Only where every major pair of ions has parameters.',
  },
};

/** A model as it is printed; one that is not known here, as the answer names it. */
export const modelInShort = (model: string): string =>
  model in modelWords ? modelWords[model as ActivityModel].short : model;
