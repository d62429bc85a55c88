import { handbook } from '../../database/handbook/handbook';

/** Constants between which an ion is met as an acid or a base in water. */
const weakest = { from: 1, to: 13 };

/**
 * Ions that are forms of a system of the handbook with a constant between 1 and 13 beside them, with
 * the system’s name: NH4^+ of ammonia, SO4^2- of sulfuric acid, and not Cl^-.
 */
const protolytes: ReadonlyMap<string, string> = new Map(
  handbook().flatMap(({ name, pKa, species }) =>
    species.flatMap(({ formula, charge }, j) => {
      const beside = [pKa[j - 1], pKa[j]].filter((constant) => constant !== undefined);
      const takesPart = beside
        .map(Number)
        .some((constant) => constant > weakest.from && constant < weakest.to);
      return takesPart && charge !== 0 && formula ? [[formula, name] as const] : [];
    }),
  ),
);

/** The system of which an ion is a form that takes part in proton transfer; undefined for others. */
export const systemOfIon = (ion: string): string | undefined => protolytes.get(ion);
