/** ε of one cation and one anion, kg/mol, for lg γ at 25 °C. */
export interface Interaction {
  readonly cation: string;
  readonly anion: string;
  readonly epsilon: string;
  readonly uncertainty: string;
  readonly source: string;
  readonly provenance: string;
  readonly note?: string;
}

const nea1992 =
  'I. Grenthe et al., Chemical Thermodynamics of Uranium (NEA-TDB 1), 1992, App. B; R. Guillaumont et al. (NEA-TDB 5), 2003, App. B (value carried from L. Ciavatta, Ann. Chim. (Rome) 70, 551 (1980))';
const ciavatta = 'L. Ciavatta, Ann. Chim. (Rome) 70, 551 (1980)';
const nea2005 =
  'W. Hummel et al., Chemical Thermodynamics of Compounds and Complexes of U, Np, Pu, Am, Tc, Se, Ni and Zr with Selected Organic Ligands (NEA-TDB 9), Elsevier 2005';

const row = (
  cation: string,
  anion: string,
  epsilon: string,
  uncertainty: string,
  source: string,
  provenance: string,
  note?: string,
): Interaction => ({
  cation,
  anion,
  epsilon,
  uncertainty,
  source,
  provenance,
  ...(note === undefined ? {} : { note }),
});

/**
 * The interaction coefficients of buffer ions, nearly all recalled; nothing is fitted to a pH
 * standard. None is published for H⁺ with a buffer's anion, for K⁺ with tartrate or phthalate, for
 * TrisH⁺ and Cl⁻, or for Ca²⁺ and CaOH⁺ with OH⁻.
 */
export const interactions: readonly Interaction[] = [
  row('H^+', 'Cl^-', '0.12', '0.01', nea1992, 'recalled (very sure)'),
  row('Na^+', 'Cl^-', '0.03', '0.01', nea1992, 'recalled (very sure)'),
  row('K^+', 'Cl^-', '0', '0.01', ciavatta, 'recalled (very sure)'),
  row('Ca^2+', 'Cl^-', '0.14', '0.01', nea1992, 'recalled (very sure)'),
  row('Na^+', 'OH^-', '0.04', '0.01', nea1992, 'recalled (very sure)'),
  row('K^+', 'OH^-', '0.09', '0.01', ciavatta, 'recalled (very sure)'),
  row('Na^+', 'HCO3^-', '0', '0.02', nea1992, 'recalled (sure)'),
  row('K^+', 'HCO3^-', '-0.06', '0.05', nea1992, 'recalled (moderately sure)'),
  row(
    'Na^+',
    'CO3^2-',
    '-0.08',
    '0.03',
    nea1992,
    'recalled (very sure)',
    '-0.05 in Ciavatta 1980; NEA adopted -0.08',
  ),
  row('K^+', 'CO3^2-', '0.02', '0.01', ciavatta, 'recalled (sure)'),
  row('Na^+', 'H2PO4^-', '-0.08', '0.04', nea1992, 'recalled (very sure)'),
  row('K^+', 'H2PO4^-', '-0.14', '0.04', nea1992, 'recalled (very sure)'),
  row('Na^+', 'HPO4^2-', '-0.15', '0.06', nea1992, 'recalled (very sure)'),
  row('K^+', 'HPO4^2-', '-0.1', '0.06', nea1992, 'recalled (very sure)'),
  row('Na^+', 'PO4^3-', '-0.25', '0.03', nea1992, 'recalled (sure)'),
  row('K^+', 'PO4^3-', '-0.09', '0.02', nea1992, 'recalled (sure)'),
  row('Na^+', 'B(OH)4^-', '-0.07', '0.05', ciavatta, 'recalled (sure)'),
  row('Na^+', 'CH3COO^-', '0.08', '0.01', ciavatta, 'recalled (very sure)'),
  row('K^+', 'CH3COO^-', '0.09', '0.01', ciavatta, 'recalled (sure)'),
  row('Na^+', 'HC2O4^-', '-0.07', '0.01', nea2005, 'recalled (sure)'),
  row('K^+', 'HC2O4^-', '-0.01', '0.08', nea2005, 'recalled (sure)'),
  row('Na^+', 'C2O4^2-', '-0.08', '0.01', nea2005, 'recalled (sure)'),
  row('K^+', 'C2O4^2-', '0.07', '0.08', nea2005, 'recalled (sure)'),
  row('Na^+', 'H2Cit^-', '-0.05', '0.01', nea2005, 'recalled (sure)'),
  row('K^+', 'H2Cit^-', '-0.04', '0.01', nea2005, 'recalled (sure)'),
  row('Na^+', 'HCit^2-', '-0.04', '0.02', nea2005, 'recalled (sure)'),
  row('K^+', 'HCit^2-', '-0.01', '0.02', nea2005, 'recalled (sure)'),
  row('Na^+', 'Cit^3-', '-0.076', '0.03', nea2005, 'recalled (sure)'),
  row('K^+', 'Cit^3-', '0.02', '0.02', nea2005, 'recalled (sure)'),
  row('Na^+', 'SO4^2-', '-0.12', '0.06', nea1992, 'recalled (very sure)'),
];
