/** Parameters of one cation and one anion, for ln γ at 25 °C. */
export interface PitzerPair {
  readonly cation: string;
  readonly anion: string;
  /** kg/mol, like the other β. */
  readonly beta0: string;
  readonly beta1: string;
  readonly beta2?: string;
  /** kg²/mol². */
  readonly cphi: string;
  readonly source: string;
  readonly provenance: string;
  readonly note?: string;
}

/**
 * What two ions of one sign (θ, kg/mol), these and one of the other sign (ψ, kg²/mol²), or an ion
 * and a neutral species (λ, kg/mol) add, for ln γ at 25 °C.
 */
export interface PitzerMixing {
  readonly symbol: 'theta' | 'psi' | 'lambda';
  readonly among: readonly string[];
  readonly value: string;
  readonly source: string;
  readonly provenance: string;
}

/** A row of either table. */
export type PitzerRow = PitzerPair | PitzerMixing;

const pitzerMayorga1973 = 'K.S. Pitzer & G. Mayorga, J. Phys. Chem. 77, 2300 (1973)';
const harvie1984 = 'C.E. Harvie, N. Moller & J.H. Weare, Geochim. Cosmochim. Acta 48, 723 (1984)';
const felmy1986 = 'A.R. Felmy & J.H. Weare, Geochim. Cosmochim. Acta 50, 2771 (1986)';
const lodeiro2021 =
  'P. Lodeiro, D.R. Turner, E.P. Achterberg, S.L. Clegg and co-workers, J. Chem. Eng. Data / J. Solution Chem. 2021 (osmotic coefficients of TrisHCl; the Tris-buffer Pitzer papers)';
const mendonca2005 =
  'A.J.G. de Mendonca, P.M. Juusola et al., Fluid Phase Equilib. 231, 114 (2005)';
const pitzerKim1974 = 'K.S. Pitzer & J.J. Kim, J. Am. Chem. Soc. 96, 5701 (1974)';
const hershey1989 = 'J.P. Hershey, M. Fernandez & F.J. Millero, J. Solution Chem. 18, 875 (1989)';

const pair = (
  cation: string,
  anion: string,
  [beta0, beta1, cphi]: readonly [string, string, string],
  source: string,
  provenance: string,
  rest: Pick<PitzerPair, 'beta2' | 'note'> = {},
): PitzerPair => ({ cation, anion, beta0, beta1, cphi, source, provenance, ...rest });

const mixing = (
  symbol: PitzerMixing['symbol'],
  among: readonly string[],
  value: string,
  source: string,
  provenance: string,
): PitzerMixing => ({ symbol, among, value, source, provenance });

/** β0, β1, Cφ (and β2) of buffer ions. Nothing is fitted to a pH standard. */
export const pitzerPairs: readonly PitzerPair[] = [
  pair('H^+', 'Cl^-', ['0.1775', '0.2945', '0.0008'], pitzerMayorga1973, 'recalled (very sure)'),
  pair('Na^+', 'Cl^-', ['0.0765', '0.2664', '0.00127'], pitzerMayorga1973, 'recalled (very sure)'),
  pair('K^+', 'Cl^-', ['0.04835', '0.2122', '-0.00084'], pitzerMayorga1973, 'recalled (very sure)'),
  pair('Na^+', 'OH^-', ['0.0864', '0.253', '0.0044'], pitzerMayorga1973, 'recalled (very sure)'),
  pair('K^+', 'OH^-', ['0.1298', '0.32', '0.0041'], pitzerMayorga1973, 'recalled (very sure)'),
  pair(
    'Na^+',
    'H2PO4^-',
    ['-0.0533', '0.0396', '0.00795'],
    pitzerMayorga1973,
    'recalled (very sure)',
  ),
  pair('K^+', 'H2PO4^-', ['-0.0678', '-0.1042', '0'], pitzerMayorga1973, 'recalled (very sure)'),
  pair('Na^+', 'HPO4^2-', ['-0.0583', '1.4655', '0.0294'], pitzerMayorga1973, 'recalled (sure)', {
    note: 'printed as 4/3 beta0, 4/3 beta1, 2^(5/2)/3 cphi in the 2-1 table; here reduced',
  }),
  pair('K^+', 'HPO4^2-', ['0.0248', '1.2743', '0.0164'], pitzerMayorga1973, 'recalled (sure)', {
    note: 'as above',
  }),
  pair(
    'Na^+',
    'CH3COO^-',
    ['0.1426', '0.3237', '-0.00629'],
    pitzerMayorga1973,
    'recalled (very sure)',
  ),
  pair(
    'K^+',
    'CH3COO^-',
    ['0.1587', '0.3251', '-0.0066'],
    pitzerMayorga1973,
    'recalled (very sure)',
  ),
  pair('Na^+', 'HCO3^-', ['0.0277', '0.0411', '0'], harvie1984, 'recalled (very sure)'),
  pair('Na^+', 'CO3^2-', ['0.0399', '1.389', '0.0044'], harvie1984, 'recalled (very sure)'),
  pair('K^+', 'HCO3^-', ['0.0296', '-0.013', '-0.008'], harvie1984, 'recalled (very sure)'),
  pair('K^+', 'CO3^2-', ['0.1488', '1.43', '-0.0015'], harvie1984, 'recalled (very sure)'),
  pair('Ca^2+', 'OH^-', ['-0.1747', '-0.2303', '0'], harvie1984, 'recalled (very sure)', {
    beta2: '-5.72',
    note: 'no CaOH+ pair with these',
  }),
  pair('Ca^2+', 'Cl^-', ['0.3159', '1.614', '-0.00034'], harvie1984, 'recalled (very sure)'),
  pair('Na^+', 'B(OH)4^-', ['-0.0427', '0.089', '0.0114'], felmy1986, 'recalled (sure)'),
  pair('K^+', 'B(OH)4^-', ['0.035', '0.14', '0'], felmy1986, 'recalled (sure)'),
  pair(
    'TrisH^+',
    'Cl^-',
    ['0.04181', '0.16024', '-0.00132'],
    lodeiro2021,
    'recalled (moderately sure; gives gamma 0.762 at 0.1 mol/kg; the source table was not read)',
  ),
  pair('K^+', 'HPhth^-', ['0.084', '0', '0'], mendonca2005, 'read in the abstract', {
    note: 'printed only as the sum beta0(K,HPh)+theta(Cl,HPh) = 0.084 +- 0.013; used here as beta0 with theta = 0',
  }),
  pair('K^+', 'Phth^2-', ['0.25', '0.86', '-0.01'], mendonca2005, 'read in the abstract', {
    note: 'printed as beta0(K2Ph)+theta(Cl,Ph) = 0.25 +- 0.01, C(K2Ph) = -0.010 (C, not cphi: cphi = 2 sqrt2 C would be -0.028; the difference is below 0.0005 in pH here), psi(K,Cl,Ph) = 0.014',
  }),
];

/** θ, ψ and λ of buffer ions. */
export const pitzerMixing: readonly PitzerMixing[] = [
  mixing('theta', ['Na^+', 'K^+'], '-0.012', harvie1984, 'recalled (very sure)'),
  mixing('theta', ['H^+', 'Na^+'], '0.036', harvie1984, 'recalled (very sure)'),
  mixing('theta', ['H^+', 'K^+'], '0.005', harvie1984, 'recalled (very sure)'),
  mixing('theta', ['Cl^-', 'HCO3^-'], '0.03', harvie1984, 'recalled (very sure)'),
  mixing('theta', ['Cl^-', 'CO3^2-'], '-0.02', harvie1984, 'recalled (very sure)'),
  mixing('theta', ['HCO3^-', 'CO3^2-'], '-0.04', harvie1984, 'recalled (very sure)'),
  mixing('theta', ['Cl^-', 'OH^-'], '-0.05', harvie1984, 'recalled (very sure)'),
  mixing('theta', ['Cl^-', 'H2PO4^-'], '0.1', pitzerKim1974, 'recalled (sure)'),
  mixing('theta', ['Cl^-', 'HPO4^2-'], '0.105', hershey1989, 'read in the abstract'),
  mixing('theta', ['Cl^-', 'B(OH)4^-'], '-0.065', felmy1986, 'recalled (sure)'),
  mixing('psi', ['Na^+', 'K^+', 'Cl^-'], '-0.0018', harvie1984, 'recalled (very sure)'),
  mixing('psi', ['Na^+', 'Cl^-', 'HCO3^-'], '-0.015', harvie1984, 'recalled (very sure)'),
  mixing('psi', ['Na^+', 'Cl^-', 'CO3^2-'], '0.0085', harvie1984, 'recalled (very sure)'),
  mixing('psi', ['Na^+', 'HCO3^-', 'CO3^2-'], '0.002', harvie1984, 'recalled (very sure)'),
  mixing('psi', ['Na^+', 'Cl^-', 'H2PO4^-'], '-0.028', hershey1989, 'read in the abstract'),
  mixing('psi', ['K^+', 'Cl^-', 'H2PO4^-'], '-0.0105', pitzerKim1974, 'recalled (moderately sure)'),
  mixing('psi', ['Na^+', 'Cl^-', 'HPO4^2-'], '-0.003', hershey1989, 'read in the abstract'),
  mixing('lambda', ['Na^+', 'H3PO4'], '-0.075', hershey1989, 'read in the abstract'),
];
