import type { Substance } from './substance';

export const aminoAcids: readonly Substance[] = [
  { name: 'glycine', rows: [], buffer: 'glycine', formula: 'C2H5NO2', cas: '56-40-6' },
  {
    name: 'glycinamide',
    rows: [],
    buffer: 'glycine amide',
    formula: 'C2H6N2O',
    cas: '598-41-4',
  },
  { name: 'glycylglycine', buffer: 'glycylglycine', aliases: ['diglycine', 'Gly-Gly'] },
  {
    name: 'glycylglycylglycine',
    rows: [],
    buffer: 'glycylglycylglycine',
    aliases: ['triglycine', 'Gly-Gly-Gly'],
    formula: 'C6H11N3O4',
    cas: '556-33-2',
  },
  {
    name: 'cysteine',
    rows: [],
    buffer: 'L-cysteine',
    formula: 'C3H7NO2S',
    cas: '52-90-4',
  },
  {
    name: 'histidine',
    rows: [],
    buffer: 'L-histidine',
    formula: 'C6H9N3O2',
    cas: '71-00-1',
  },
  { name: 'taurine', aliases: ['2-aminoethanesulfonic acid'] },
  { name: 'betaine', rows: ['betaine-H+'], aliases: ['trimethylglycine', 'glycine betaine'] },
  { name: 'beta-alanine', aliases: ['3-aminopropanoic acid'] },
  { name: '4-aminobutanoic acid', aliases: ['GABA', 'gamma-aminobutyric acid'] },
  { name: 'ornithine' },
  { name: 'sarcosine', aliases: ['N-methylglycine'] },
  { name: '4-hydroxyproline', aliases: ['hydroxyproline'] },
  { name: 'glutathione', aliases: ['GSH', 'gamma-glutamylcysteinylglycine'] },
];
