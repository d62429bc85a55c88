import type { Substance } from './substance';

export const indicators: readonly Substance[] = [
  { name: 'methyl red', rows: ['methyl red (HIn)'] },
  {
    name: 'bromothymol blue',
    aliases: ['bromthymol blue', 'BTB'],
    note: 'The constant is that of the yellow form of charge −1.',
  },
  {
    name: 'phenolphthalein',
    rows: ['phenolphthalein (effective)'],
    species: ['C20H14O4', null],
    note: 'One effective constant for the change of colour, in which two protons leave.',
  },
  {
    name: 'methyl orange',
    formula: 'C14H15N3O3S',
    species: ['C14H15N3O3S', 'C14H14N3O3S^-'],
    note: 'The CAS number is that of the sodium salt.',
  },
];
