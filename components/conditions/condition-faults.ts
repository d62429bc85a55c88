import { ProblemError } from '../../shared/client';

const names = ['temperature', 'ionicStrength', 'activityModel'] as const;
type Name = (typeof names)[number];

/**
 * Faults that the caller may have computed all the same, by saying so, and where to change what led
 * to them: they concern the constants of a system as well.
 */
const passable: ReadonlyMap<string, Name> = new Map([
  ['constants-outside-medium', 'ionicStrength'],
  ['outside-model-range', 'ionicStrength'],
  ['charge-beyond-model', 'activityModel'],
]);

/** What a service said of the conditions, at the field that it concerns. */
export interface ConditionFaults {
  readonly at: Readonly<Partial<Record<Name, string>>>;
  /** What it said that no field of conditions shows. */
  readonly elsewhere: readonly string[];
  /** Whether all of it may be computed all the same. */
  readonly passable: boolean;
}

/** The service's words, without what only a caller of the API can do: a button does it here. */
export const saidHere = (detail: string) =>
  detail
    .replace(/,? or "outOfRange": "compute"[^.]*\./, '.')
    .replace(', give constants for this one.', ' or give constants for this one.')
    .replace('"activityModel": "ideal"', 'the ideal model')
    .replace(/-(?=\d)/g, '\u2212');

/** Sorts the faults of a refusal. */
export function conditionFaults(error: Error | null | undefined): ConditionFaults {
  const at: Partial<Record<Name, string>> = {};
  const elsewhere: string[] = [];
  const faults = error instanceof ProblemError ? (error.problem.errors ?? []) : [];
  for (const { pointer, code, detail } of faults) {
    const name =
      passable.get(code) ?? names.find((field) => pointer.endsWith(`/conditions/${field}`));
    if (name === undefined) elsewhere.push(saidHere(detail));
    else at[name] = [at[name], saidHere(detail)].filter(Boolean).join(' ');
  }
  return {
    at,
    elsewhere,
    passable: faults.length > 0 && faults.every(({ code }) => passable.has(code)),
  };
}
