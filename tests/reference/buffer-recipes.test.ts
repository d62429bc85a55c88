import { type Recipe, recipeDepartures, recipes, spanOf } from '../support/recipes-table';

/**
 * Published recipes, volumes against pH: sources and provenance in data/buffer-recipes.json (recalled
 * but for McIlvaine and two of Bower and Bates). Constants as for the standards; nothing is fitted.
 * Gomori's citrate and succinate recipes, known to depart by 0.2 to 0.4, are not in the collection.
 */
const recipeOf = (table: string, name: string): Recipe => {
  const found = recipes.find((one) => one.table === table && one.name.startsWith(name));
  if (found === undefined) throw new Error(`There is no recipe ${name} of ${table}.`);
  return found;
};
const both = ['davies', 'specific-ion-interaction'] as const;

/** Departures of a recipe by Davies’s equation, and where they lie within bounds. */
const davies = (table: string, name: string) => recipeDepartures(recipeOf(table, name), 'davies');
const expectWithin = (found: readonly { departure: number }[], low: number, high: number) => {
  const [least, most] = spanOf(found);
  expect(least).toBeGreaterThan(low);
  expect(most).toBeLessThan(high);
};

test('sixteen recipes of three collections', () => {
  expect(recipes.map(({ table, name }) => `${table}: ${name}`)).toHaveLength(16);
});

describe('Bower and Bates (1955, 1956), 25 °C, on the scale of the standards', () => {
  test.each(['KCl-HCl', 'phthalate-NaOH', 'Tris', 'KCl-NaOH'])(
    '%s: within 0.04, the 0.02 that they claim and the 0.02 that Davies does',
    (name) => {
      for (const model of both) {
        expectWithin(recipeDepartures(recipeOf('Bower and Bates', name), model), -0.04, 0.04);
      }
    },
  );

  test('borax with HCl: polyborates, which the model leaves out, lower pH 8 by 0.17', () => {
    const found = davies('Bower and Bates', 'borax-HCl');
    const at = (pH: number) => found.find(({ published }) => published === pH)?.departure;
    expectWithin(found, 0, 0.17);
    expect(at(8)).toBeCloseTo(0.166, 3);
    expect(at(8.5)).toBeCloseTo(0.058, 3);
    // They join two or more of boric acid to one borate: most where little is borate.
    expectWithin(
      found.filter(({ published }) => published >= 9),
      -0.02,
      0.02,
    );
  });

  test('bicarbonate with NaOH is 0.05 to 0.13 low, and departs from the standard as well', () => {
    expectWithin(davies('Bower and Bates', 'bicarbonate-NaOH'), -0.131, -0.05);
    // 12.5 mL make the carbonate standard diluted to half: pH 10.012 + 0.079 (01d, recalled). The
    // recipe prints 10.1 at 12.2 mL and 10.2 at 13.8 mL: 0.03 above, outside the ±0.02 it claims.
    const between = 10.1 + (0.1 * (12.5 - 12.2)) / (13.8 - 12.2);
    expect(between - (10.012 + 0.079)).toBeCloseTo(0.028, 3);
  });
});

describe('Gomori (1955), room temperature', () => {
  test.each(['phosphate', 'maleate'])('%s: within 0.05 by both models', (name) => {
    for (const model of both) {
      expectWithin(recipeDepartures(recipeOf('Gomori', name), model), -0.05, 0.05);
    }
  });

  /** The scale of Sørensen (1909) lies 0.04 below that of the standards: R. G. Bates 1973, recalled. */
  const scale = 0.04;
  const onOldScale = (name: string) =>
    davies('Gomori', name).map((one) => ({ ...one, departure: one.departure - scale }));

  test('phthalate with HCl is of Clark and Lubs (1917), on Sørensen’s scale: within 0.04 of it', () => {
    expectWithin(onOldScale('phthalate-HCl'), -0.04, 0.04);
  });

  test('acetate is Walpole’s (1914), on the same scale: within 0.02 but for two rows', () => {
    const found = onOldScale('acetate');
    const off = found.filter(({ departure }) => Math.abs(departure) > 0.02);
    // 4.4 and 5.4 lie off the course of their neighbours, to opposite sides: slips of print.
    expect(off.map(({ published, departure }) => [published, departure])).toEqual([
      [4.4, expect.closeTo(0.044, 3)],
      [5.4, expect.closeTo(-0.115, 3)],
    ]);
  });

  test('KCl with HCl prints −lg [H⁺]: the concentration is within 0.03, the activity is not', () => {
    const found = davies('Gomori', 'KCl-HCl');
    for (const { pHOfConcentration, published } of found) {
      expect(Math.abs(pHOfConcentration - published)).toBeLessThan(0.03);
    }
    expectWithin(found, 0.06, 0.14);
  });

  /** Measured, not claimed; no reason is known. All three are recalled (one unit in the last digit). */
  test.each([
    ['Tris-HCl', 0.01, 0.08],
    // Falls off at both ends, where little of one form is left.
    ['glycine-HCl', -0.22, -0.01],
    // High at every pH: its volumes belong to a pK′ of 7.7, and barbital’s is 7.90 there.
    ['barbital', 0.1, 0.23],
  ])('%s departs by %d to %d', (name, low, high) => {
    expectWithin(davies('Gomori', name), low, high);
  });

  test('borax with NaOH is no check: it calls for more base than there is boric acid', () => {
    const { data, note } = recipeOf('Gomori', 'borax-NaOH');
    expect(note).toMatch(/^DO NOT USE AS A CHECK/);
    const [, volume = NaN] = data.at(-1) ?? [];
    // 50 mL of 0.05 mol/L borax: 10 mmol of boron, half of it free acid.
    expect(volume * 0.2).toBeGreaterThan(5);
  });
});

describe('McIlvaine (1921), 21 °C, read', () => {
  const recipe = recipeOf('McIlvaine', 'McIlvaine');

  test('by specific ion interaction −0.02 to 0.11: citrate and phosphate with sodium have ε', () => {
    const found = recipeDepartures(recipe, 'specific-ion-interaction');
    expectWithin(found, -0.02, 0.11);
    // From pH 6.4 on, mostly phosphate, within 0.05.
    expectWithin(
      found.filter(({ published }) => published > 6.3),
      -0.05,
      0.05,
    );
  });

  test('by Davies 0.03 to 0.20: the ionic strength goes to 0.58, beyond its range', () => {
    const found = recipeDepartures(recipe, 'davies');
    expectWithin(found, 0.03, 0.2);
    expect(Math.max(...found.map(({ ionicStrength }) => ionicStrength))).toBeCloseTo(0.584, 3);
  });
});
