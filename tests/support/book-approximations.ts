const { log10, sqrt } = Math;
/** K₁ of maleic acid in older editions, with which 1.54 belongs; 1.3 × 10⁻² gives 1.52. */
const olderMaleic = 0.012;

/**
 * What textbooks printed by an approximation of their own, written out, by problem, quantity and mL of
 * data/worked-examples-equilibria.json. Each gives the printed number, and the exact answer does not.
 */
export const approximations: Record<string, number> = {
  // All of the acid left, or of the base: [H⁺] = √(K c).
  'pH of 0.534 M formic acid: H': sqrt(0.00018 * 0.534),
  'pH of 0.25 M trimethylamine: OH': sqrt(6.3e-5 * 0.25),
  '0.0750 M NH3 (Ka 5.70e-10): [OH-]: OH': sqrt((1e-14 / 5.7e-10) * 0.075),
  'titration table 25.00 mL 0.100 M acetic acid (1.8e-5) with 0.100 M NaOH: pH 0':
    -log10(1.8e-5 * 0.1) / 2,
  '50.0 mL 0.100 M formic acid (1.8e-4) with 0.200 M NaOH: pH 0': -log10(1.8e-4 * 0.1) / 2,
  // [OH⁻] = √(K_b c), with K_b rounded to 5.6 × 10⁻¹¹ for formate.
  '50.0 mL 0.100 M formic acid (1.8e-4) with 0.200 M NaOH: pH 25': 14 + log10(5.6e-11 * 0.0667) / 2,
  '0.001000 M acetic acid 50.00 mL with 0.001000 M NaOH (Ka 1.75e-5): pH 50':
    14 + log10((1e-14 / 1.75e-5) * 0.0005) / 2,
  // A printed number from another that was rounded before.
  'pH of 0.10 M Al(3+) aqua ion, Ka 1.4e-5: pH': -log10(0.0012),
  'nicotine 0.050 M, Kb1 7e-7, Kb2 1.4e-11: H': 1e-14 / 0.00019,
  // OH⁻ of the base alone, without that of water.
  '0.000500 M HCl 50.00 mL with 0.001000 M NaOH: pH 25.1': 14 + log10((0.001 * 0.1) / 75.1),
  // [H⁺]² = (K₃ c + K_w)/(1 + c/K₂).
  '1.00e-3 M Na2HPO4 (7.11e-3, 6.32e-8, 4.5e-13): H': sqrt(
    (4.5e-13 * 1e-3 + 1e-14) / (1 + 1e-3 / 6.32e-8),
  ),
  // A slip, or an older constant (moderately sure).
  'maleic acid 25.00 mL 0.1000 M (1.3e-2, 5.9e-7) with 0.1000 M NaOH: start, second equivalence, 51.00 mL: pH 0':
    -log10((-olderMaleic + sqrt(olderMaleic ** 2 + 4 * olderMaleic * 0.1)) / 2),
};

/** Recalled as 7.47: 7.455 by the ratio of amounts, 7.377 with hydrolysis. Not explained. */
export const unexplained =
  '0.001000 M acetic acid 50.00 mL with 0.001000 M NaOH (Ka 1.75e-5): pH 49.9';
