import type { Ion } from './ion';
import { canonicalIon } from './ion-names';

interface SizeRow {
  /** pm. */
  readonly size: string;
  readonly ions: readonly string[];
}

/**
 * Ion sizes å of the extended Debye–Hückel equation at 25 °C: J. Kielland, J. Am. Chem. Soc. 59, 1675
 * (1937), Tables I–III. Recalled: surely for inorganic ions, moderately for organic ones.
 *
 * Na⁺, HCO₃⁻, H₂PO₄⁻ and those beside them he gives as 400–450 pm; taken is 450, as textbooks that
 * reprint the table do. Molecular formulas are the handbook's: C4H4O4^2- succinate, C5H6O4^2-
 * glutarate, C6H8O4^2- adipate, C8H12O4^2- suberate, C2H6NO2^+ and C2H4NO2^- those of glycine,
 * C6H2N3O7^- picrate. HOC6H4COO^- is any hydroxybenzoate.
 */
export const sizeRows: readonly SizeRow[] = [
  { size: '250', ions: ['Rb^+', 'Cs^+', 'NH4^+', 'Tl^+', 'Ag^+'] },
  { size: '300', ions: ['K^+', 'Cl^-', 'Br^-', 'I^-', 'CN^-', 'NO2^-', 'NO3^-'] },
  {
    size: '350',
    ions: ['OH^-', 'F^-', 'SCN^-', 'OCN^-', 'HS^-', 'ClO3^-', 'ClO4^-', 'BrO3^-', 'IO4^-'],
  },
  { size: '350', ions: ['MnO4^-', 'HCOO^-', 'H2Cit^-', 'CH3NH3^+', '(CH3)2NH2^+'] },
  { size: '400', ions: ['C2H6NO2^+', '(CH3)3NH^+', 'C2H5NH3^+'] },
  {
    size: '400',
    ions: ['Hg2^2+', 'SO4^2-', 'S2O3^2-', 'S2O6^2-', 'S2O8^2-', 'SeO4^2-', 'CrO4^2-', 'HPO4^2-'],
  },
  { size: '400', ions: ['PO4^3-', 'Fe(CN)6^3-', 'Cr(NH3)6^3+', 'Co(NH3)6^3+'] },
  { size: '450', ions: ['Na^+', 'CdCl^+', 'ClO2^-', 'IO3^-', 'HCO3^-', 'H2PO4^-', 'HSO3^-'] },
  { size: '450', ions: ['H2AsO4^-', 'Co(NH3)4(NO2)2^+'] },
  { size: '450', ions: ['CH3COO^-', 'ClCH2COO^-', '(CH3)4N^+', '(C2H5)2NH2^+', 'C2H4NO2^-'] },
  {
    size: '450',
    ions: ['Pb^2+', 'CO3^2-', 'SO3^2-', 'MoO4^2-', 'C2O4^2-', 'HCit^2-', 'Co(NH3)5Cl^2+'],
  },
  { size: '450', ions: ['Fe(CN)5NO^2-'] },
  { size: '500', ions: ['Cl2CHCOO^-', 'Cl3CCOO^-', '(C2H5)3NH^+', 'C3H7NH3^+'] },
  { size: '500', ions: ['Sr^2+', 'Ba^2+', 'Ra^2+', 'Cd^2+', 'Hg^2+', 'S^2-', 'S2O4^2-', 'WO4^2-'] },
  { size: '500', ions: ['CH2(COO)2^2-', 'C4H4O4^2-', 'Tar^2-', 'Cit^3-', 'Fe(CN)6^4-'] },
  { size: '600', ions: ['Li^+', 'C6H5COO^-', 'HOC6H4COO^-', 'ClC6H4COO^-', 'C6H5CH2COO^-'] },
  { size: '600', ions: ['CH2=CHCH2COO^-', '(C2H5)4N^+', '(C3H7)2NH2^+', 'Co(S2O3)(CN)5^4-'] },
  { size: '600', ions: ['Ca^2+', 'Cu^2+', 'Zn^2+', 'Sn^2+', 'Mn^2+', 'Fe^2+', 'Ni^2+', 'Co^2+'] },
  { size: '600', ions: ['Phth^2-', 'C5H6O4^2-', 'C6H8O4^2-'] },
  { size: '700', ions: ['C6H2N3O7^-', '(C3H7)3NH^+', 'CH3OC6H4COO^-', 'Pim^2-', 'C8H12O4^2-'] },
  { size: '800', ions: ['(C6H5)2CHCOO^-', '(C3H7)4N^+', 'Mg^2+', 'Be^2+'] },
  {
    size: '900',
    ions: ['H^+', 'Al^3+', 'Fe^3+', 'Cr^3+', 'Sc^3+', 'Y^3+', 'La^3+', 'In^3+', 'Ce^3+', 'Pr^3+'],
  },
  { size: '900', ions: ['Nd^3+', 'Sm^3+'] },
  { size: '1100', ions: ['Th^4+', 'Zr^4+', 'Ce^4+', 'Sn^4+'] },
];

const sizes = new Map(sizeRows.flatMap(({ size, ions }) => ions.map((ion) => [ion, size])));

/** Kielland's size of an ion in pm, for the extended Debye–Hückel equation; undefined if not his. */
export const sizeOf = ({ name }: Ion): string | undefined =>
  name === undefined ? undefined : sizes.get(canonicalIon(name));
