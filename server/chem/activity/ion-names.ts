/** Another way to write an ion than the name the tables of this folder have it under. */
interface Alias {
  readonly written: string;
  readonly name: string;
  /** Isomers share the formula: it means this ion only as a form of this handbook substance. */
  readonly only?: string;
}

/**
 * A formula stands alone where no other substance of the handbook has it. Citric acid shares its
 * formulas with isocitric, phthalic with isophthalic and terephthalic, tartaric with meso-tartaric,
 * pimelic with 3,3-dimethylglutaric acid: measured were the ions of the first of each.
 */
export const aliases: readonly Alias[] = [
  { written: 'H3O^+', name: 'H^+' },
  { written: 'HO^-', name: 'OH^-' },
  { written: 'CHO3^-', name: 'HCO3^-' },
  { written: 'H2BO3^-', name: 'B(OH)4^-' },
  { written: 'H4BO4^-', name: 'B(OH)4^-' },
  { written: 'CHO2^-', name: 'HCOO^-' },
  { written: 'C2H3O2^-', name: 'CH3COO^-' },
  { written: 'C2HO4^-', name: 'HC2O4^-' },
  { written: 'C4H12NO3^+', name: 'TrisH^+' },
  { written: 'C6H7O7^-', name: 'H2Cit^-', only: 'citric-acid' },
  { written: 'C6H6O7^2-', name: 'HCit^2-', only: 'citric-acid' },
  { written: 'C6H5O7^3-', name: 'Cit^3-', only: 'citric-acid' },
  { written: 'C8H5O4^-', name: 'HPhth^-', only: 'phthalic-acid' },
  { written: 'C8H4O4^2-', name: 'Phth^2-', only: 'phthalic-acid' },
  { written: 'C4H5O6^-', name: 'HTar^-', only: 'tartaric-acid' },
  { written: 'C4H4O6^2-', name: 'Tar^2-', only: 'tartaric-acid' },
  { written: 'C7H10O4^2-', name: 'Pim^2-', only: 'pimelic-acid' },
];

const byFormula = new Map(aliases.map((alias) => [alias.written, alias]));

/**
 * The name that the tables have an ion under, or the name as it is. A formula that isomers share is
 * resolved only where the handbook's id of the substance is given: without it C6H7O7^- may be
 * dihydrogencitrate or dihydrogenisocitrate, and stays what it is.
 */
export function canonicalIon(name: string, substance?: string): string {
  const alias = byFormula.get(name);
  if (alias === undefined) return name;
  return alias.only === undefined || alias.only === substance ? alias.name : name;
}
