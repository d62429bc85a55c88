/** An ion by its canonical name, and how many of it one formula unit brings. */
interface Part {
  readonly ion: string;
  readonly count: number;
}

interface Electrolyte {
  readonly ions: readonly Part[];
  /** Its cation pairs with hydroxide, which takes some of the base out of sight. */
  readonly pairs?: string;
}

const salt = (...parts: readonly (readonly [ion: string, count: number])[]): Electrolyte => ({
  ions: parts.map(([ion, count]) => ({ ion, count })),
});

/**
 * What may be weighed in beside acids and bases with constants: inert salts, and strong acids and
 * bases other than HCl and NaOH, of which only the ion that takes no part is named.
 */
export const electrolytes = {
  NaCl: salt(['Na^+', 1], ['Cl^-', 1]),
  KCl: salt(['K^+', 1], ['Cl^-', 1]),
  LiCl: salt(['Li^+', 1], ['Cl^-', 1]),
  NaNO3: salt(['Na^+', 1], ['NO3^-', 1]),
  KNO3: salt(['K^+', 1], ['NO3^-', 1]),
  NaClO4: salt(['Na^+', 1], ['ClO4^-', 1]),
  KBr: salt(['K^+', 1], ['Br^-', 1]),
  MgCl2: salt(['Mg^2+', 1], ['Cl^-', 2]),
  CaCl2: salt(['Ca^2+', 1], ['Cl^-', 2]),
  HNO3: salt(['NO3^-', 1]),
  HClO4: salt(['ClO4^-', 1]),
  KOH: salt(['K^+', 1]),
  LiOH: salt(['Li^+', 1]),
  'Ca(OH)2': { ...salt(['Ca^2+', 1]), pairs: 'Ca^2+' },
} as const satisfies Record<string, Electrolyte>;

export type ElectrolyteName = keyof typeof electrolytes;
export const electrolyteNames = Object.keys(electrolytes) as readonly ElectrolyteName[];

export const electrolyteOf = (name: ElectrolyteName): Electrolyte => electrolytes[name];
