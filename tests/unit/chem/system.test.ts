import { effectivePKa, engineVersion, invertedNeighbours, speciesOf } from '../../../server/chem';

const system = (...pKa: string[]) => ({ fullyProtonatedCharge: 2, pKa });

describe('systems', () => {
  test('n constants make n + 1 species, each a charge less', () => {
    expect(speciesOf(system('2', '9', '10'))).toEqual([
      { index: 0, charge: 2, protonsLost: 0 },
      { index: 1, charge: 1, protonsLost: 1 },
      { index: 2, charge: 0, protonsLost: 2 },
      { index: 3, charge: -1, protonsLost: 3 },
    ]);
  });

  test('inverted neighbours are found, equal ones are not inverted', () => {
    expect(invertedNeighbours(system('2', '7', '12'))).toEqual([]);
    expect(invertedNeighbours(system('7', '7.0', '7'))).toEqual([]);
    expect(invertedNeighbours(system('9', '4', '4.1', '-4'))).toEqual([0, 2]);
    expect(invertedNeighbours(system(`7.${'0'.repeat(59)}1`, '7'))).toEqual([0]);
  });

  test('pK′ of the ideal model are the constants, rounded half-even and written in full', () => {
    expect(effectivePKa(system('2.148', '-0', '12.35', '1e-8', '7.25', '7.35'), 2)).toEqual([
      '2.1',
      '0.0',
      '12',
      '1.0e-8',
      '7.2',
      '7.4',
    ]);
    expect(effectivePKa(system('12.35'), 1)).toEqual(['1e+1']);
    expect(effectivePKa(system('7.10'), 6)).toEqual(['7.10000']);
  });

  test('the engine says its version', () => {
    expect(engineVersion).toMatch(/^\d+$/);
  });
});
