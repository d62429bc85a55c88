import { ProblemError } from '../../shared/client';

/** Faults that the caller may have computed all the same, by saying so. */
const passable: ReadonlySet<string> = new Set([
  'constants-outside-medium',
  'outside-model-range',
  'charge-beyond-model',
]);

const names = ['temperature', 'ionicStrength', 'activityModel'] as const;

/** What a service said of the conditions, at the field that it concerns. */
export interface ConditionFaults {
  readonly at: Readonly<Partial<Record<(typeof names)[number], string>>>;
  /** What it said that no field of conditions shows. */
  readonly elsewhere: readonly string[];
  /** Whether all of it may be computed all the same. */
  readonly passable: boolean;
}

const signed = (text: string) => text.replace(/-(?=\d)/g, '\u2212');

/**
 * Sorts the faults of a refusal. One that concerns the constants (outside their medium) is shown at
 * the ionic strength: that is what to change.
 */
export function conditionFaults(error: Error | null | undefined): ConditionFaults {
  const at: Partial<Record<(typeof names)[number], string>> = {};
  const elsewhere: string[] = [];
  const faults = error instanceof ProblemError ? (error.problem.errors ?? []) : [];
  for (const { pointer, code, detail } of faults) {
    const name =
      names.find((field) => pointer.endsWith(`/conditions/${field}`)) ??
      (passable.has(code) ? 'ionicStrength' : undefined);
    if (name === undefined) elsewhere.push(signed(detail));
    else at[name] = [at[name], signed(detail)].filter(Boolean).join(' ');
  }
  return {
    at,
    elsewhere,
    passable: faults.length > 0 && faults.every(({ code }) => passable.has(code)),
  };
}
