import type { Model, Warning } from '../../../shared/model';
import {
  type Balance,
  type Equilibrium,
  ionsOf,
  pitzerAmong,
  shownAs,
  specificInteractionAmong,
} from '../../chem';
import type { ConditionsUsed } from '../chemistry/conditions-used';
import { noAnswer } from '../chemistry/refuse';

type Interactions = NonNullable<Model['interactions']>;

/** Shares of the ionic strength from which an ion counts: as major, and as more than a trace. */
const major = 0.01;
const trace = 0.001;
/** Pairs that a warning names; more are counted. */
const namedAtMost = 12;

/** The parameters that a model by interactions takes for a balance; undefined for other models. */
export function interactionsUsed(balance: Balance): Interactions | undefined {
  const ions = ionsOf(balance);
  const { model } = balance.activity;
  if (model === 'specific-ion-interaction') {
    return specificInteractionAmong(ions).used.map(
      ({ cation, anion, epsilon, source, provenance }) => ({
        ions: [cation, anion],
        parameters: { epsilon },
        source,
        provenance,
      }),
    );
  }
  if (model !== 'pitzer') return undefined;
  return pitzerAmong(ions).used.map((row) => {
    const { source, provenance } = row;
    if ('symbol' in row) {
      return { ions: [...row.among], parameters: { [row.symbol]: row.value }, source, provenance };
    }
    const { cation, anion, beta0, beta1, beta2, cphi } = row;
    const parameters = { beta0, beta1, ...(beta2 === undefined ? {} : { beta2 }), cphi };
    return { ions: [cation, anion], parameters, source, provenance };
  });
}

const inWords = (pairs: readonly (readonly [string, string])[]) => {
  const named = pairs.slice(0, namedAtMost).map(([cation, anion]) => `${cation} with ${anion}`);
  const more = pairs.length - named.length;
  return named.join(', ') + (more > 0 ? ` and ${more} more` : '');
};

/**
 * What to say of pairs that the tables miss. Refused with `interaction-missing` where Pitzer’s model
 * misses a pair of major ions, unless the caller says compute: without a β it is plainly wrong.
 */
export function missingInteractions(
  balance: Balance,
  { ionicStrength, molalities }: Equilibrium,
  { outOfRange }: ConditionsUsed,
): Warning[] {
  const { model } = balance.activity;
  if (model !== 'specific-ion-interaction' && model !== 'pitzer') return [];
  const ions = ionsOf(balance);
  const share = new Map<string, number>();
  ions.forEach((ion, i) => {
    const part = ((molalities[i] ?? 0) * ion.charge ** 2) / ionicStrength;
    share.set(shownAs(ion), (share.get(shownAs(ion)) ?? 0) + part);
  });
  const { missing } = model === 'pitzer' ? pitzerAmong(ions) : specificInteractionAmong(ions);
  const above = (least: number) =>
    missing.filter((pair) => pair.every((ion) => (share.get(ion) ?? 0) >= least));
  const pointer = '/conditions/activityModel';
  const lacking = above(major);
  if (model === 'pitzer' && lacking.length > 0 && outOfRange === 'refuse') {
    const detail =
      `Pitzer’s model has no parameters here for ${inWords(lacking)}. ` +
      'Choose another model, or "outOfRange": "compute" to count them 0.';
    throw noAnswer('interaction-missing', pointer, detail);
  }
  const told = above(trace);
  if (told.length === 0) return [];
  const message = `No parameters are known for ${inWords(told)}: they count 0.`;
  return [{ code: 'missing-interaction', message, pointer }];
}
