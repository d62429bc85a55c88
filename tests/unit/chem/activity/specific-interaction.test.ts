import type { Ion } from '../../../../server/chem/activity/ion';
import { specificInteractionAmong } from '../../../../server/chem/activity/specific-interaction';
import { doubles } from '../../../../server/chem/decimals/arithmetic';

const ion = (name: string | undefined, charge: number): Ion => ({ name, charge });
const sodium = ion('Na^+', 1);
const chloride = ion('Cl^-', -1);
const phosphate = ion('HPO4^2-', -2);
const A = 0.51;
const D = (I: number) => (A * Math.sqrt(I)) / (1 + 1.5 * Math.sqrt(I));

describe('specific ion interaction', () => {
  test('lg γ = −z² D + Σ ε m over the ions of opposite charge, by hand', () => {
    const [na, cl, hpo4] = specificInteractionAmong([sodium, chloride, phosphate]).lgGamma(
      doubles,
      A,
      [0.5, 0.1, 0.2],
    );
    const I = 0.7;
    expect(na).toBeCloseTo(-D(I) + 0.03 * 0.1 - 0.15 * 0.2, 14);
    expect(cl).toBeCloseTo(-D(I) + 0.03 * 0.5, 14);
    expect(hpo4).toBeCloseTo(-4 * D(I) - 0.15 * 0.5, 14);
  });

  test('a neutral species has γ = 1', () => {
    const among = specificInteractionAmong([sodium, chloride, ion('H3PO4', 0)]);
    expect(among.lgGamma(doubles, A, [1, 1, 1])[2]).toBe(0);
  });

  test('every ε used is told with its uncertainty and source', () => {
    const { used } = specificInteractionAmong([sodium, chloride]);
    expect(used).toEqual([
      expect.objectContaining({
        cation: 'Na^+',
        anion: 'Cl^-',
        epsilon: '0.03',
        uncertainty: '0.01',
        source: expect.stringContaining('NEA'),
        provenance: expect.stringContaining('recalled'),
      }),
    ]);
  });

  test('pairs without ε count 0 and are named, unnamed ions by their charge', () => {
    const ions = [sodium, ion('TrisH^+', 1), chloride, ion(undefined, -2), ion(undefined, -2)];
    const among = specificInteractionAmong(ions);
    expect(among.missing).toEqual([
      ['Na^+', '2-'],
      ['TrisH^+', 'Cl^-'],
      ['TrisH^+', '2-'],
    ]);
    const lg = among.lgGamma(doubles, A, [0, 1, 1, 0, 0]);
    expect(lg[1]).toBeCloseTo(-D(1), 15);
  });

  test('an ion of two components is one ion', () => {
    const once = specificInteractionAmong([sodium, chloride]).lgGamma(doubles, A, [0.3, 0.3]);
    const among = specificInteractionAmong([sodium, sodium, chloride]);
    expect(among.used).toHaveLength(1);
    const [first = NaN, second = NaN, other = NaN] = among.lgGamma(doubles, A, [0.1, 0.2, 0.3]);
    expect(first).toBe(second);
    [first, other].forEach((lg, i) => expect(lg).toBeCloseTo(once[i] ?? NaN, 15));
  });

  test('an ion has its ε under the name it is given', () => {
    const { used, missing } = specificInteractionAmong([sodium, ion('C2H3O2^-', -1)]);
    expect(used[0]).toMatchObject({ anion: 'CH3COO^-', epsilon: '0.08' });
    expect(missing).toEqual([]);
  });
});
