import type { SystemText } from './system-text';

/** A system to look at before any is typed: its constants, where they are from, how it is written. */
export interface Example {
  readonly id: string;
  readonly title: string;
  readonly system: SystemText;
  /** Formulas of the forms, from fully protonated to fully deprotonated. */
  readonly formulas: readonly string[];
  /** Ionic strength of the medium the constants hold in, mol/L. */
  readonly ionicStrength: string;
  readonly source: string;
  readonly note?: string;
}

/** Read from the compilation's summary as we remember it, and said so: nobody has checked it yet. */
const thermodynamic = {
  ionicStrength: '0',
  source:
    'R. N. Goldberg, N. Kishore, R. M. Lennen, J. Phys. Chem. Ref. Data 31, 231 (2002). ' +
    'Thermodynamic, 25 °C. Recalled; not yet checked against the printed table.',
} as const;

export const examples: readonly Example[] = [
  {
    id: 'phosphoric-acid',
    title: 'Phosphoric acid',
    system: {
      name: 'phosphoric acid',
      fullyProtonatedCharge: 0,
      pKa: ['2.148', '7.198', '12.35'],
    },
    formulas: ['H3PO4', 'H2PO4^-', 'HPO4^2-', 'PO4^3-'],
    ...thermodynamic,
  },
  {
    id: 'citric-acid',
    title: 'Citric acid',
    system: { name: 'citric acid', fullyProtonatedCharge: 0, pKa: ['3.128', '4.761', '6.396'] },
    formulas: ['H3Cit', 'H2Cit^-', 'HCit^2-', 'Cit^3-'],
    ...thermodynamic,
  },
  {
    id: 'carbonic-acid',
    title: 'Carbonic acid',
    system: { name: 'carbonic acid', fullyProtonatedCharge: 0, pKa: ['6.351', '10.329'] },
    formulas: ['H2CO3', 'HCO3^-', 'CO3^2-'],
    ...thermodynamic,
    note: 'The first form is dissolved carbon dioxide and carbonic acid together.',
  },
  {
    id: 'acetic-acid',
    title: 'Acetic acid',
    system: { name: 'acetic acid', fullyProtonatedCharge: 0, pKa: ['4.756'] },
    formulas: ['CH3COOH', 'CH3COO^-'],
    ...thermodynamic,
  },
  {
    id: 'glycine',
    title: 'Glycine',
    system: { name: 'glycine', fullyProtonatedCharge: 1, pKa: ['2.351', '9.78'] },
    formulas: ['H2Gly^+', 'HGly', 'Gly^-'],
    ...thermodynamic,
  },
  {
    id: 'edta',
    title: 'EDTA',
    system: {
      name: 'EDTA',
      fullyProtonatedCharge: 2,
      pKa: ['0.0', '1.5', '2.00', '2.69', '6.13', '10.37'],
    },
    formulas: ['H6Y^2+', 'H5Y^+', 'H4Y', 'H3Y^-', 'H2Y^2-', 'HY^3-', 'Y^4-'],
    ionicStrength: '0.1',
    source:
      'A. E. Martell, R. M. Smith, Critical Stability Constants. Concentration constants, 25 °C, ' +
      'I = 0.1 mol/L. Recalled; not yet checked against the printed table.',
    note: 'The four lowest constants were measured at I = 1 mol/L. All are used as given.',
  },
];
