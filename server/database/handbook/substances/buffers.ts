import type { Substance } from './substance';

/** A substance that only the table of thermodynamic quantities has: formula and CAS are added. */
const buffer = (
  name: string,
  formula: string,
  cas: string,
  rest: Omit<Substance, 'name' | 'rows' | 'formula' | 'cas'> = {},
) => ({ buffer: name, ...rest, name, rows: [], formula, cas });

/** A substance of both tables under one name. */
const inBoth = (name: string, aliases: readonly string[] = []) => ({ name, buffer: name, aliases });

const fromHL = 'The constants begin at the form of charge −1: the steps before it are not listed.';

export const buffers: readonly Substance[] = [
  inBoth('HEPES', ['4-(2-hydroxyethyl)-1-piperazineethanesulfonic acid']),
  inBoth('MES', ['2-(N-morpholino)ethanesulfonic acid', '4-morpholineethanesulfonic acid']),
  inBoth('MOPS', ['3-(N-morpholino)propanesulfonic acid', '4-morpholinepropanesulfonic acid']),
  {
    name: 'PIPES',
    rows: ['PIPES (HL-)'],
    buffer: 'PIPES',
    aliases: ['1,4-piperazinediethanesulfonic acid'],
    note: fromHL,
  },
  inBoth('TES', ['2-[tris(hydroxymethyl)methylamino]ethanesulfonic acid']),
  inBoth('BES', ['N,N-bis(2-hydroxyethyl)-2-aminoethanesulfonic acid']),
  inBoth('tricine', ['N-[tris(hydroxymethyl)methyl]glycine']),
  inBoth('bicine', ['N,N-bis(2-hydroxyethyl)glycine']),
  inBoth('TAPS', ['3-[tris(hydroxymethyl)methylamino]propanesulfonic acid']),
  inBoth('CHES', ['2-(cyclohexylamino)ethanesulfonic acid']),
  inBoth('CAPS', ['3-(cyclohexylamino)propanesulfonic acid']),
  inBoth('CAPSO', ['3-(cyclohexylamino)-2-hydroxypropanesulfonic acid']),
  inBoth('ACES', ['2-(carbamoylmethylamino)ethanesulfonic acid']),
  inBoth('ADA', ['N-(2-acetamido)iminodiacetic acid', 'N-(carbamoylmethyl)iminodiacetic acid']),
  {
    name: 'cacodylic acid',
    buffer: 'cacodylate',
    aliases: ['dimethylarsinic acid', 'dimethylarsenic acid'],
  },
  buffer('3-amino-1-propanesulfonic acid', 'C3H9NO3S', '3687-18-1', { aliases: ['homotaurine'] }),
  buffer('AMPSO', 'C7H17NO5S', '68399-79-1'),
  buffer('DIPSO', 'C7H17NO6S', '68399-80-4'),
  buffer('HEPBS', 'C10H22N2O4S', '161308-36-7'),
  buffer('HEPPS', 'C9H20N2O4S', '16052-06-5', { buffer: 'HEPPS (EPPS)', aliases: ['EPPS'] }),
  buffer('HEPPSO', 'C9H20N2O5S', '68399-78-0'),
  buffer('MOBS', 'C8H17NO4S', '115724-21-5'),
  buffer('MOPSO', 'C7H15NO5S', '68399-77-9'),
  buffer('POPSO', 'C10H22N2O8S2', '68189-43-5', { note: fromHL }),
  buffer('TAPSO', 'C7H17NO7S', '68399-81-5'),
  buffer('glycerol 2-phosphate', 'C3H9O6P', '17181-54-3', { aliases: ['beta-glycerophosphate'] }),
];
