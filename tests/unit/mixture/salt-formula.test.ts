import { broughtOf, counterIonsFor } from '../../../components/mixture/counter-ions';
import { chargeOf, saltFormula } from '../../../components/mixture/salt-formula';
import { electrolyteNames, electrolyteOf } from '../../../components/mixture/electrolytes';

describe('a salt is written as its bottle has it', () => {
  // Common practice: IUPAC Red Book 2005, IR-4.4: cations before anions; acetates by their group.
  test.each([
    ['H3PO4', 'Na^+', 'H3PO4'],
    ['H2PO4^-', 'K^+', 'KH2PO4'],
    ['HPO4^2-', 'Na^+', 'Na2HPO4'],
    ['PO4^3-', 'Na^+', 'Na3PO4'],
    ['H2PO4^-', 'NH4^+', 'NH4H2PO4'],
    ['HPO4^2-', 'NH4^+', '(NH4)2HPO4'],
    ['HPO4^2-', 'Ca^2+', 'CaHPO4'],
    ['H2PO4^-', 'Ca^2+', 'Ca(H2PO4)2'],
    ['PO4^3-', 'Ca^2+', 'Ca3(PO4)2'],
    ['HCO3^-', 'Na^+', 'NaHCO3'],
    ['CO3^2-', 'K^+', 'K2CO3'],
    ['B(OH)4^-', 'Na^+', 'NaB(OH)4'],
    ['B(OH)4^-', 'Ca^2+', 'Ca[B(OH)4]2'],
    ['CH3COO^-', 'Na^+', 'CH3COONa'],
    ['C6H5O7^3-', 'Na^+', 'Na3C6H5O7'],
    ['NH4^+', 'Cl^-', 'NH4Cl'],
    ['C4H12NO3^+', 'Cl^-', 'C4H12NO3Cl'],
    ['N2H6^2+', 'Cl^-', 'N2H6Cl2'],
    ['H3NC6H4COOH^+', 'Cl^-', '[H3NC6H4COOH]Cl'],
    ['HA^-', 'Na^+', 'NaHA'],
  ])('%s with %s is %s', (species, ion, salt) => {
    expect(saltFormula(species, ion)).toBe(salt);
  });

  test('the charge stands after the mark', () => {
    expect(['PO4^3-', 'K^+', 'Ca^2+', 'H3PO4'].map(chargeOf)).toEqual([-3, 1, 2, 0]);
  });
});

describe('a counter-ion', () => {
  test('comes in the amount that takes the charge, with the places of the concentration', () => {
    expect(broughtOf(-2, 'Na^+', '0.0640')).toBe('0.1280');
    expect(broughtOf(-1, 'Ca^2+', '0.05')).toBe('0.025');
    expect(broughtOf(-2, 'Ca^2+', '0.05')).toBe('0.05');
    expect(broughtOf(1, 'Cl^-', '1')).toBe('1');
  });

  test('ammonium is offered only where the acid has an uncharged form', () => {
    expect(counterIonsFor(-1, true)).toContain('NH4^+');
    expect(counterIonsFor(-1, false)).not.toContain('NH4^+');
    expect(counterIonsFor(1, true)).toEqual(['Cl^-', 'Br^-', 'NO3^-', 'ClO4^-']);
  });
});

test('every salt by name brings no charge, or the one ion of a strong acid or base', () => {
  for (const name of electrolyteNames) {
    const { ions } = electrolyteOf(name);
    const charge = ions.reduce((sum, { ion, count }) => sum + chargeOf(ion) * count, 0);
    const isStrong = /OH|^H/.test(name);
    expect([name, charge !== 0]).toEqual([name, isStrong]);
    expect(ions).toHaveLength(isStrong ? 1 : 2);
  }
});
