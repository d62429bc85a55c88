import { barPlaces, placesOf } from '../../../components/shell/places';
import { roles } from '../../../shared/scopes';

const labels = (all: ReturnType<typeof placesOf>) => all.map(({ label }) => label);

test('keys are a place of developers and admins alone', () => {
  const finders = roles.filter((role) => labels(placesOf(role)).includes('Keys'));
  expect(finders).toEqual(['admin', 'developer']);
  expect(labels(placesOf(undefined))).not.toContain('Keys');
});

test('Curves comes first for everybody', () => {
  for (const role of [undefined, ...roles]) expect(placesOf(role)[0]?.label).toBe('Curves');
});

test('a bar shows four places beside its last slot, and loses none', () => {
  for (const role of [undefined, ...roles]) {
    const all = placesOf(role);
    const { shown, behind } = barPlaces(all);
    expect(shown.length).toBeLessThanOrEqual(4);
    expect([...shown, ...behind]).toEqual(all);
    expect(behind.length > 0).toBe(all.length > 4);
  }
});
