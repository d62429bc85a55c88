import type { Arithmetic } from '../decimals/arithmetic';
import { nth } from '../decimals/nth';
import { type DebyeHuckelModel, debyeHuckelTerm } from './debye-huckel';
import type { Ion } from './ion';
import { ionicStrength } from './ionic-strength';
import { sizeOf } from './ion-sizes';
import type { ActivityModel } from './ranges';
import { pitzerAmong } from './pitzer';
import { specificInteractionAmong } from './specific-interaction';

/** An ion that may bring a size of its own, pm. */
export interface SizedIon extends Ion {
  readonly size?: string | undefined;
}

/** The model of activity coefficients and its constants, decimals taken as exact. */
export interface ActivityChoice {
  readonly model: ActivityModel;
  /** (kg/mol)^½, for lg γ; needed by all but the ideal model. */
  readonly A: string;
  /** (kg/mol)^½ nm⁻¹. */
  readonly B: string;
  /** kg/mol. */
  readonly linear: string;
  /** mol/L or mol/kg: fixes the coefficients; or they follow from the composition. */
  readonly ionicStrength: string | 'self-consistent';
}

/**
 * Activity coefficients of a list of ions. They depend on a state (nothing, the ionic strength, or
 * all molalities), which itself follows from the composition. Ions of one class share γ.
 */
export interface Coefficients {
  readonly classOf: readonly number[];
  readonly dependsOn: 'nothing' | 'ionic-strength' | 'composition';
  readonly stateOf: <N>(arithmetic: Arithmetic<N>, molalities: readonly N[]) => N[];
  /** lg γ of each class. */
  readonly lgGamma: <N>(arithmetic: Arithmetic<N>, state: readonly N[]) => N[];
}

/** Size taken for an ion of which none is known, pm. */
export const sizeAssumed = '450';

const ideal = (ions: readonly Ion[]): Coefficients => ({
  classOf: ions.map(() => 0),
  dependsOn: 'nothing',
  stateOf: () => [],
  lgGamma: ({ of }) => [of(0)],
});

/** Ions sorted into classes by a key, with the first ion of each. */
function classesBy(ions: readonly SizedIon[], keyOf: (ion: SizedIon) => string) {
  const keys = [...new Set(ions.map(keyOf))];
  const place = new Map(keys.map((key, i) => [key, i]));
  const firsts = keys.map((key) => ions.find((ion) => keyOf(ion) === key));
  return {
    classOf: ions.map((ion) => place.get(keyOf(ion)) ?? 0),
    firsts: firsts.filter((ion) => ion !== undefined),
  };
}

function debyeHuckel(
  ions: readonly SizedIon[],
  model: DebyeHuckelModel,
  { A, B, linear, ionicStrength: given }: ActivityChoice,
): Coefficients {
  const sized = model === 'extended-debye-huckel';
  const size = (ion: SizedIon) => (sized ? (ion.size ?? sizeOf(ion) ?? sizeAssumed) : '0');
  const { classOf, firsts } = classesBy(ions, (ion) => `${ion.charge ** 2} ${size(ion)}`);
  const fixed = given === 'self-consistent' ? undefined : given;
  return {
    classOf,
    dependsOn: fixed === undefined ? 'ionic-strength' : 'nothing',
    stateOf: (arithmetic, molalities) =>
      fixed === undefined ? [ionicStrength(arithmetic, ions, molalities)] : [],
    lgGamma: (arithmetic, state) => {
      const { of, times } = arithmetic;
      const strength = fixed === undefined ? nth(state, 0) : of(fixed);
      const term = (one: string) =>
        debyeHuckelTerm(arithmetic, model, strength, {
          A: of(A),
          B: of(B),
          linear: of(linear),
          size: of(one),
        });
      const terms = new Map([...new Set(firsts.map(size))].map((one) => [one, term(one)]));
      return firsts.map((ion) => times(of(-(ion.charge ** 2)), terms.get(size(ion)) ?? of(0)));
    },
  };
}

function byInteractions(
  ions: readonly Ion[],
  { lgGamma }: ReturnType<typeof specificInteractionAmong | typeof pitzerAmong>,
  { A }: ActivityChoice,
): Coefficients {
  return {
    classOf: ions.map((_, i) => i),
    dependsOn: 'composition',
    stateOf: (_, molalities) => [...molalities],
    lgGamma: (arithmetic, state) => lgGamma(arithmetic, arithmetic.of(A), state),
  };
}

/** The coefficients of these ions by this model. */
export function coefficientsOf(ions: readonly SizedIon[], choice: ActivityChoice): Coefficients {
  switch (choice.model) {
    case 'ideal':
      return ideal(ions);
    case 'specific-ion-interaction':
      return byInteractions(ions, specificInteractionAmong(ions), choice);
    case 'pitzer':
      return byInteractions(ions, pitzerAmong(ions), choice);
    case 'debye-huckel':
    case 'extended-debye-huckel':
    case 'guntelberg':
    case 'davies':
      return debyeHuckel(ions, choice.model, choice);
  }
}
