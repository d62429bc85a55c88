import {
  type ActivityModel,
  type Balance,
  type BalanceNumbers,
  equilibrium,
  pKAt,
  waterAt,
} from '../../server/chem';

/** One step: a constant that stays, or one that moves with temperature (ΔH° kJ/mol, ΔCp° J/(mol K)). */
export type Step =
  string | { readonly pK: string; readonly deltaH: string | null; readonly deltaCp: string | null };

/** A system as a test describes it. Amounts in mol/L, or mol/kg: the models do not ask. */
export interface Component {
  readonly pKa: readonly Step[];
  /** Charge of the fully protonated species. */
  readonly z0: number;
  /** Total; of a component that a gas holds, the concentration of the species `form`. */
  readonly c: number | string;
  /** Names of the n + 1 species, charge behind ^; without them the tables know none of its ions. */
  readonly names?: readonly string[] | undefined;
  /** Index of the species weighed in or held by the gas. */
  readonly form?: number | undefined;
  readonly held?: boolean | undefined;
}

/** A solution: systems, ions that take no part, temperature, model; water's constants if others. */
export interface Description {
  readonly acids?: readonly Component[];
  /** Concentrations by name, charge behind ^: { 'Na^+': 0.05 }. */
  readonly ions?: Readonly<Record<string, number | string>>;
  /** °C. */
  readonly temperature?: number;
  readonly model?: ActivityModel;
  readonly pKw?: string;
  readonly A?: string;
  /** Davies's linear coefficient. */
  readonly linear?: string;
}

/** Charge number that a name ends with: "SO4^2-" has −2, "Na^+" 1. */
function chargeOf(name: string): number {
  const [, size = '', sign] = /\^(\d?)([+-])$/.exec(name) ?? [];
  if (sign === undefined) throw new RangeError(`${name} is no ion.`);
  return Number(`${sign}${size || 1}`);
}

/** What a function gave for an argument, kept: a table asks for the same temperatures again and again. */
function remembered<T>(of: (key: string) => T): (key: string) => T {
  const known = new Map<string, T>();
  return (key) => {
    const found = known.get(key) ?? of(key);
    known.set(key, found);
    return found;
  };
}

/** Water as the service prints it, by °C. */
export const waterOf = remembered(waterAt);

const moved = remembered((key) => {
  const [celsius = '', pK = '', deltaH = '', deltaCp = ''] = key.split(' ');
  return pKAt(celsius, { pK, deltaH, deltaCp });
});

const movedTo = (celsius: string, step: Step) =>
  typeof step === 'string'
    ? step
    : moved([celsius, step.pK, step.deltaH ?? '0', step.deltaCp ?? '0'].join(' '));

/**
 * The charge balance of a solution, with thermodynamic constants at its temperature. Water’s pKw, A
 * and B are those that the service prints, unless others are given.
 */
export function balanceOf({
  acids = [],
  ions = {},
  temperature = 25,
  model = 'ideal',
  linear = '0.3',
  ...given
}: Description): Balance {
  const celsius = String(temperature);
  const water = waterOf(celsius);
  return {
    acids: acids.map(({ pKa, z0, c, names, form = 0, held = false }) => ({
      pKa: pKa.map((step) => movedTo(celsius, step)),
      kinds: pKa.map(() => 'thermodynamic'),
      species: Array.from({ length: pKa.length + 1 }, (_, lost) => ({
        name: names?.[lost],
        charge: z0 - lost,
      })),
      reference: form,
      amount: String(c),
      held,
    })),
    inert: Object.entries(ions).map(([name, concentration]) => ({
      ion: { name, charge: chargeOf(name) },
      concentration: String(concentration),
    })),
    pKw: given.pKw ?? water.pKw,
    activity: {
      model,
      A: given.A ?? water.A,
      B: water.B,
      linear,
      ionicStrength: 'self-consistent',
    },
  };
}

/** Every number of a solution at equilibrium, to so many digits. */
export function solved(description: Description, digits = 12): BalanceNumbers {
  const found = equilibrium(balanceOf(description));
  const answer = found.ok ? found.inDigits(digits) : found;
  if (!answer.ok) throw new Error(`No equilibrium: ${answer.reason}.`);
  return answer.numbers;
}

/** The pH of a solution. */
export const pHOf = (description: Description): number => Number(solved(description, 8).pH);
