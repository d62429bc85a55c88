import type { Constant } from '../../../shared/constant';
import type { StoredSystem } from '../../../shared/stored-system';
import type { SystemInFull, SystemInput } from '../../../shared/system';
import { type AcidBaseSystem, canonicalIon, type ConstantKind } from '../../chem';
import { Refusal } from '../../refusal';
import { preferredConstants } from '../systems/stored-system';
import { misfit } from './refuse';

/** What is known of one constant beside its value. */
export interface Step {
  readonly kind: ConstantKind;
  /** Where it holds, mol/L; null where nobody says. */
  readonly ionicStrength: string | null;
  /** °C. */
  readonly temperature: string;
  /** How it moves with temperature: kJ/mol and J/(mol K). */
  readonly thermo: { readonly deltaH: string; readonly deltaCp: string } | null;
}

/** Where the constants of a stored system come from. */
interface Stored {
  readonly id: string;
  readonly revision: number;
  readonly constants: readonly Constant[];
  /** What to know before using the constants. */
  readonly note: string | null;
}

/** A system to compute with; `stored` where it was named by its id. */
export interface ResolvedSystem extends AcidBaseSystem {
  readonly name?: string | undefined;
  /** One a constant. */
  readonly steps: readonly Step[];
  /** How the species are written, where it is known. */
  readonly formulas?: readonly (string | null)[] | undefined;
  /** By which name activity models know each species. */
  readonly ions: readonly (string | undefined)[];
  /** Sizes given by the caller, pm. */
  readonly ionSizes?: readonly string[] | undefined;
  readonly stored?: Stored;
}

/** The stored systems that systems name, as they write them. */
export const referencesAmong = (systems: readonly SystemInput[]): string[] =>
  systems.flatMap((one) => ('id' in one ? [one.id] : []));

function ofStored(system: StoredSystem): ResolvedSystem {
  const constants = preferredConstants(system);
  const formulas = system.species.map(({ formula }) => formula ?? null);
  return {
    name: system.name,
    fullyProtonatedCharge: system.fullyProtonatedCharge,
    pKa: system.pKa,
    steps: constants.map(({ kind, ionicStrength, temperature, deltaH, deltaCp }) => ({
      kind,
      ionicStrength: kind === 'thermodynamic' ? '0' : ionicStrength,
      temperature,
      thermo: deltaH === null ? null : { deltaH, deltaCp: deltaCp ?? '0' },
    })),
    formulas,
    ions: formulas.map((formula) => (formula ? canonicalIon(formula, system.id) : undefined)),
    stored: { id: system.id, revision: system.revision, constants, note: system.note },
  };
}

/** Temperature at which constants hold where nobody says another, °C. */
const ordinaryTemperature = '25';

/** Charge that a formula is written with, behind `^`; undefined where it is written with none. */
function writtenCharge(formula: string): number | undefined {
  const [, size, sign] = /\^(\d*)([+-])$/.exec(formula) ?? [];
  return sign === undefined ? undefined : Number(`${sign}${size || 1}`);
}

/** Refused where a formula has another charge than its species: parameters are found by it. */
function checkFormulas({ formulas = [], fullyProtonatedCharge }: SystemInFull, pointer: string) {
  formulas.forEach((formula, j) => {
    const charge = fullyProtonatedCharge - j;
    if ((writtenCharge(formula) ?? charge) === charge) return;
    const detail = `Species ${j} has a charge of ${charge}, and ${formula} another.`;
    throw misfit('formula-charge', `${pointer}/formulas/${j}`, detail);
  });
}

function ofFull(system: SystemInFull): ResolvedSystem {
  const { name, fullyProtonatedCharge, pKa, constants, thermo, ionSizes, formulas } = system;
  return {
    name,
    fullyProtonatedCharge,
    pKa,
    steps: pKa.map((_, i) => ({
      kind: constants?.kind ?? 'thermodynamic',
      ionicStrength: constants?.ionicStrength ?? '0',
      temperature: constants?.temperature ?? ordinaryTemperature,
      thermo: thermo?.[i] ? { ...thermo[i], deltaCp: thermo[i].deltaCp ?? '0' } : null,
    })),
    formulas,
    ions: Array.from({ length: pKa.length + 1 }, (_, j) =>
      formulas?.[j] ? canonicalIon(formulas[j]) : undefined,
    ),
    ionSizes,
  };
}

const unknownSystem = (id: string, pointer: string) => {
  const detail = `There is no system ${id}: GET /v1/systems finds those there are.`;
  return new Refusal('invalid-request', detail, [{ pointer, code: 'unknown-system', detail }]);
};

/** Stored systems by the reference that a request has them under. */
export type FoundSystems = ReadonlyMap<string, StoredSystem>;

/** A system in full. Refused with `unknown-system` where its id names none, or `formula-charge`. */
export function resolvedSystem(
  system: SystemInput,
  pointer: string,
  found: FoundSystems,
): ResolvedSystem {
  if (!('id' in system)) {
    checkFormulas(system, pointer);
    return ofFull(system);
  }
  const stored = found.get(system.id);
  if (!stored) throw unknownSystem(system.id, `${pointer}/id`);
  return ofStored(stored);
}
