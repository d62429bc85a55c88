import type { Substance } from './substance';

/** A base that the table lists under the name of its ion. */
const base = (name: string, ion: string, rest: Omit<Substance, 'name' | 'rows'> = {}) => ({
  ...rest,
  name,
  rows: [ion],
  aliases: [ion, ...(rest.aliases ?? [])],
});

/** A base that the table lists with its protons behind the name. */
const protonated = (name: string, ending: string, rest: Omit<Substance, 'name' | 'rows'> = {}) => ({
  ...rest,
  name,
  rows: [name + ending],
});

export const heterocycles: readonly Substance[] = [
  base('pyridine', 'pyridinium'),
  base('2-methylpyridine', '2-methylpyridinium', { aliases: ['2-picoline'] }),
  base('3-methylpyridine', '3-methylpyridinium', { aliases: ['3-picoline'] }),
  base('4-methylpyridine', '4-methylpyridinium', { aliases: ['4-picoline'] }),
  base('quinoline', 'quinolinium'),
  base('isoquinoline', 'isoquinolinium'),
  protonated('8-hydroxyquinoline', '-H+', { aliases: ['oxine', '8-quinolinol'] }),
  protonated('1,10-phenanthroline', '-H+', { aliases: ['o-phenanthroline', 'phen'] }),
  protonated("2,2'-bipyridine", '-H+', { aliases: ['bipyridyl', 'bipy'] }),
  base('imidazole', 'imidazolium', { buffer: 'imidazole' }),
  base('1-methylimidazole', '1-methylimidazolium', { aliases: ['N-methylimidazole'] }),
  base('2-methylimidazole', '2-methylimidazolium', { buffer: '2-methylimidazole' }),
  base('benzimidazole', 'benzimidazolium'),
  base('pyrazole', 'pyrazolium'),
  protonated('nicotinic acid', '-H+', { aliases: ['niacin', '3-pyridinecarboxylic acid'] }),
  protonated('picolinic acid', '-H+', { aliases: ['2-pyridinecarboxylic acid'] }),
  protonated('nicotine', '-H2'),
  protonated('caffeine', '-H+ (40 C)', { aliases: ['1,3,7-trimethylxanthine'] }),
  protonated('quinine', '-H2'),
  protonated('codeine', '-H+'),
  protonated('morphine', '-H+'),
  protonated('cocaine', '-H+'),
  protonated('procaine', '-H+'),
  protonated('ephedrine', '-H+'),
  protonated('dopamine', '-H+'),
  protonated('adrenaline', '-H+', { aliases: ['epinephrine'] }),
  protonated('adenine', '-H+'),
  protonated('cytosine', '-H+'),
  protonated('thiamine', '-H2 (thiazole)', {
    aliases: ['thiamin', 'vitamin B1'],
    formula: 'C12H17N4OS^+',
    species: ['C12H18N4OS^2+', 'C12H17N4OS^+', null],
    note:
      'The CAS number is that of the chloride. In the second step water opens the thiazolium ring: ' +
      'its product is not the cation less one proton alone.',
  }),
];
