import type { Substance } from './substance';

export const complexingAgents: readonly Substance[] = [
  {
    name: 'EDTA',
    rows: ['EDTA (H6Y2+)'],
    aliases: ['ethylenediaminetetraacetic acid', 'edetic acid'],
    note: 'The four lowest constants were measured at I = 1 mol/L, the others at 0.1 mol/L.',
  },
  {
    name: 'DTPA',
    rows: ['DTPA (H5L to H0, 0.1 M)'],
    aliases: ['diethylenetriaminepentaacetic acid', 'pentetic acid'],
    note: 'The constants begin at the neutral acid H5L.',
  },
  { name: 'NTA', rows: ['NTA (H4L+)'], aliases: ['nitrilotriacetic acid'] },
  {
    name: 'EGTA',
    rows: ['EGTA (0.1 M)'],
    aliases: ['ethylene glycol bis(2-aminoethyl ether)tetraacetic acid', 'egtazic acid'],
    note: 'The constants begin at the neutral acid H4L.',
  },
  { name: 'iminodiacetic acid', rows: ['iminodiacetic acid-H+'], aliases: ['IDA'] },
  {
    name: 'CDTA',
    rows: ['CDTA (0.1 M)'],
    aliases: ['trans-1,2-cyclohexanediaminetetraacetic acid', 'DCTA'],
    note: 'The constants begin at the neutral acid H4L.',
  },
];
