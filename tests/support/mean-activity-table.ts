import { debyeHuckelTerm } from '../../server/chem/activity/debye-huckel';
import type { Ion } from '../../server/chem/activity/ion';
import { sizeOf } from '../../server/chem/activity/ion-sizes';
import { ionicStrength } from '../../server/chem/activity/ionic-strength';
import type { AmongIons } from '../../server/chem/activity/pairs';
import { pitzerAmong } from '../../server/chem/activity/pitzer';
import { specificInteractionAmong } from '../../server/chem/activity/specific-interaction';
import { doubles } from '../../server/chem/decimals/arithmetic';
import { waterAt } from '../../server/chem/water/water-at';
import table from '../reference/data/mean-activity.json';

const ofStrength = ['debye-huckel', 'extended-debye-huckel', 'guntelberg', 'davies'] as const;
const ofComposition = {
  'specific-ion-interaction': specificInteractionAmong,
  pitzer: pitzerAmong,
} as const;

/** Models in the order of their reach. */
export const comparedModels = [...ofStrength, 'specific-ion-interaction', 'pitzer'] as const;

export type ComparedModel = (typeof comparedModels)[number];

/** One published mean activity coefficient at 25 °C, and what each model makes of it. */
export interface MeanActivityRow {
  electrolyte: string;
  /** mol/kg. */
  molality: number;
  /** mol/kg, of the dissociated electrolyte. */
  ionicStrength: number;
  published: number;
  /** Models that have no parameters of the electrolyte are left out. */
  calculated: Partial<Record<ComparedModel, number>>;
}

const water = waterAt('25');
const slope = Number(water.A);
const davies = 0.3;

/** lg γ± = (ν₊ lg γ₊ + ν₋ lg γ₋)/ν of one cation of charge z and z anions of charge −1. */
const mean = (z: number, [cation = NaN, anion = NaN]: readonly number[]) =>
  10 ** ((cation + z * anion) / (1 + z));

/**
 * Every published coefficient (source and provenance: data/mean-activity.json) beside the models',
 * with A and B as the answers have them. `A` may be another, to judge parameters by the A they were
 * fitted with.
 */
export function meanActivityTable(A: number = slope): MeanActivityRow[] {
  return table.rows.flatMap(({ electrolyte, cation, anion, charge, molalities, published }) => {
    const ions: Ion[] = [
      { name: cation, charge },
      { name: anion, charge: -1 },
    ];
    const among = Object.entries(ofComposition).map(([model, of]): [string, AmongIons<unknown>] => [
      model,
      of(ions),
    ]);
    return molalities.map((molality, i) => {
      const composition = [molality, charge * molality];
      const I = ionicStrength(doubles, ions, composition);
      const byStrength = ofStrength.map((model) => {
        const term = (ion: Ion) =>
          debyeHuckelTerm(doubles, model, I, {
            A,
            B: Number(water.B),
            linear: davies,
            size: Number(sizeOf(ion)),
          });
        return [
          model,
          mean(
            charge,
            ions.map((ion) => -(ion.charge ** 2) * term(ion)),
          ),
        ];
      });
      const byComposition = among
        .filter(([, { missing }]) => missing.length === 0)
        .map(([model, { lgGamma }]) => [model, mean(charge, lgGamma(doubles, A, composition))]);
      return {
        electrolyte,
        molality,
        ionicStrength: I,
        published: published[i] ?? NaN,
        calculated: Object.fromEntries([...byStrength, ...byComposition]),
      };
    });
  });
}

/** γ calculated over γ published, less 1; undefined where the model has no parameters. */
export function departure({ published, calculated }: MeanActivityRow, model: ComparedModel) {
  const gamma = calculated[model];
  return gamma === undefined ? undefined : gamma / published - 1;
}

/**
 * The molality up to which a model stays within a relative bound of every published coefficient of
 * an electrolyte; 0 where it misses the first, undefined where it has no parameters.
 */
export function holdsTo(
  rows: readonly MeanActivityRow[],
  model: ComparedModel,
  bound: number,
): number | undefined {
  if (rows.some((row) => departure(row, model) === undefined)) return undefined;
  const beyond = rows.findIndex((row) => Math.abs(departure(row, model) ?? NaN) > bound);
  return (beyond === -1 ? rows : rows.slice(0, beyond)).at(-1)?.molality ?? 0;
}
