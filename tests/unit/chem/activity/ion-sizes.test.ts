import { sizeOf, sizeRows } from '../../../../server/chem/activity/ion-sizes';
import { hillFormula } from '../../../../server/database/handbook/formulas';
import { handbook } from '../../../../server/database/handbook/handbook';

const size = (name: string | undefined, charge: number) => sizeOf({ name, charge });

describe('ion sizes', () => {
  test('H⁺ is 900 pm, OH⁻ 350 pm (Kielland 1937, recalled)', () => {
    expect(size('H^+', 1)).toBe('900');
    expect(size('OH^-', -1)).toBe('350');
  });

  test('of the range 400–450 pm the textbooks’ 450 is taken: Na⁺, HCO₃⁻, H₂PO₄⁻', () => {
    for (const name of ['Na^+', 'HCO3^-', 'H2PO4^-']) expect(size(name, 1)).toBe('450');
  });

  test('an ion is known by another way to write it too', () => {
    expect(size('C2H3O2^-', -1)).toBe(size('CH3COO^-', -1));
  });

  test('an ion that Kielland does not have, or without a name, has no size', () => {
    expect(size('TrisH^+', 1)).toBeUndefined();
    expect(size(undefined, -2)).toBeUndefined();
  });

  test('no ion is listed twice', () => {
    const all = sizeRows.flatMap(({ ions }) => ions);
    expect(new Set(all).size).toBe(all.length);
  });

  /** Hydroxybenzoates: Kielland's line is about all three. */
  const meantForAll = ['HOC6H4COO^-'];
  test('a molecular formula among them is a form of one substance of the handbook only', () => {
    const molecular = sizeRows
      .flatMap(({ ions }) => ions)
      .filter((ion) => hillFormula(ion) === ion.split('^')[0]);
    for (const ion of molecular.filter((one) => !meantForAll.includes(one))) {
      const owners = handbook().filter(({ species }) =>
        species.some((form) => form.formula === ion),
      );
      expect([ion, owners.length]).toEqual([ion, 1]);
    }
    expect(molecular.length).toBeGreaterThan(5);
  });
});
