import type { Warning } from '../../../shared/model';
import { invertedNeighbours } from '../../chem';
import type { ConditionsUsed } from './conditions-used';
import type { ResolvedSystem, Step } from './resolved-system';

const distinct = (values: readonly string[]) => [...new Set(values)].join(' and ');

/** Some constants of a system in words: "citric acid, pKa 1 (3.128), pKa 2 (4.761)". */
export function constantsInWords({ name, pKa }: ResolvedSystem, which: readonly number[]): string {
  const steps = which.map((i) => `pKa ${i + 1} (${pKa[i]})`).join(', ');
  return name === undefined ? steps : `${name}, ${steps}`;
}

const those = (system: ResolvedSystem, concerns: (step: Step, i: number) => boolean) =>
  system.steps.flatMap((step, i) => (concerns(step, i) ? [i] : []));

function inversions(system: ResolvedSystem, pKa: readonly string[], place: string): Warning[] {
  return invertedNeighbours({ ...system, pKa }).map((i) => ({
    code: 'inverted-constants',
    message:
      `pKa ${i + 1} (${pKa[i]}) is greater than pKa ${i + 2} (${pKa[i + 1]}): ` +
      `species ${i + 1} never predominates, and others beside it may not either.`,
    pointer: system.stored ? `${place}/id` : `${place}/pKa/${i}`,
  }));
}

function estimates(system: ResolvedSystem, pointer: string): Warning[] {
  const which = those(system, (_, i) => system.stored?.constants[i]?.estimate === true);
  if (which.length === 0) return [];
  const message = `${constantsInWords(system, which)}: an estimate, not a measurement.`;
  return [{ code: 'estimated-constant', message, pointer }];
}

/** Constants of a medium, where nobody asked about any: they answer for their own. */
function media(system: ResolvedSystem, { isAsked }: ConditionsUsed, pointer: string): Warning[] {
  const which = isAsked ? [] : those(system, ({ kind }) => kind !== 'thermodynamic');
  if (which.length === 0) return [];
  const strengths = which.map((i) => {
    const strength = system.steps[i]?.ionicStrength;
    return strength == null ? 'one unstated' : `${strength} mol/L`;
  });
  const message = `${constantsInWords(system, which)}: used as given, for an ionic strength of ${distinct(strengths)}.`;
  return [{ code: 'constants-at-their-medium', message, pointer }];
}

/** Constants with ΔCp° are trusted to this, °C; handbooks say so of the relation. */
const trustedTo = 60;

function temperatures(
  system: ResolvedSystem,
  pKa: readonly string[],
  { temperature }: ConditionsUsed,
  pointer: string,
): Warning[] {
  const unmoved = those(
    system,
    (step) => !step.thermo && Number(step.temperature) !== Number(temperature),
  );
  const moved = those(system, (_, i) => pKa[i] !== system.pKa[i]);
  const warnings: Warning[] = [];
  if (unmoved.length > 0) {
    const degrees = distinct(unmoved.map((i) => `${system.steps[i]?.temperature} °C`));
    const message = `${constantsInWords(system, unmoved)}: used as given, determined at ${degrees}.`;
    warnings.push({ code: 'pka-not-temperature-corrected', message, pointer });
  }
  if (Number(temperature) > trustedTo && moved.length > 0) {
    const message = `${constantsInWords(system, moved)}: moved to ${temperature} °C with a constant ΔCp°, which is trusted to ${trustedTo} °C.`;
    warnings.push({ code: 'temperature-beyond-trust', message, pointer });
  }
  return warnings;
}

/** What to know of a system’s constants (`pKa`: at the temperature), with the place in the request. */
export function systemWarnings(
  system: ResolvedSystem,
  pKa: readonly string[],
  conditions: ConditionsUsed,
  place: string,
): Warning[] {
  const pointer = system.stored ? `${place}/id` : `${place}/pKa`;
  return [
    ...inversions(system, pKa, place),
    ...estimates(system, pointer),
    ...media(system, conditions, pointer),
    ...temperatures(system, pKa, conditions, pointer),
  ];
}
