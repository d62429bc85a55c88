import { aliases, canonicalIon } from '../../../../server/chem/activity/ion-names';
import { handbook } from '../../../../server/database/handbook/handbook';

/** Which substances of the handbook have a form of this formula. */
const withForm = (formula: string) =>
  handbook()
    .filter(({ species }) => species.some((form) => form.formula === formula))
    .map(({ id }) => id);

describe('names of ions', () => {
  test('an ion is found under the name of the tables, however the handbook writes it', () => {
    expect(canonicalIon('C4H12NO3^+')).toBe('TrisH^+');
    expect(canonicalIon('C2H3O2^-')).toBe('CH3COO^-');
    expect(canonicalIon('HPO4^2-')).toBe('HPO4^2-');
    expect(canonicalIon('Unobtainium^3+')).toBe('Unobtainium^3+');
  });

  test('C6H7O7^- is dihydrogencitrate of citric acid alone, not of isocitric', () => {
    expect(canonicalIon('C6H7O7^-', 'citric-acid')).toBe('H2Cit^-');
    expect(canonicalIon('C6H7O7^-', 'isocitric-acid')).toBe('C6H7O7^-');
    expect(canonicalIon('C6H7O7^-')).toBe('C6H7O7^-');
  });

  test('a canonical name stays what it is', () => {
    for (const { name, only } of aliases) expect(canonicalIon(name, only)).toBe(name);
  });

  test.each(aliases.filter(({ only }) => only === undefined).map(({ written }) => written))(
    '%s is no form of two substances of the handbook',
    (written) => {
      expect(withForm(written).length).toBeLessThanOrEqual(1);
    },
  );

  test.each(aliases.flatMap(({ written, only }) => (only === undefined ? [] : [[written, only]])))(
    '%s has isomers in the handbook, and means %s',
    (written = '', only = '') => {
      expect(withForm(written)).toContain(only);
      expect(withForm(written).length).toBeGreaterThan(1);
    },
  );
});
