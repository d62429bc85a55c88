import { isCasNumber } from '../../../../server/database/handbook/cas-number';
import { atomsOf } from '../../../../server/database/handbook/formulas';
import { handbook } from '../../../../server/database/handbook/handbook';
import { tableRows } from '../../../../server/database/handbook/sources';

const entries = handbook();
const entry = (id: string) => {
  const found = entries.find((one) => one.id === id);
  if (!found) throw new Error(`No ${id}`);
  return found;
};
const preferred = (id: string) => entry(id).determinations[0]?.constants ?? [];

test('the preferred constants of phosphoric acid are the thermodynamic ones, ΔH° and ΔCp° beside them', () => {
  expect(entry('phosphoric-acid').pKa).toEqual(['2.148', '7.198', '12.35']);
  expect(preferred('phosphoric-acid').map(({ deltaH, deltaCp }) => [deltaH, deltaCp])).toEqual([
    ['-8.0', '-141.0'],
    ['3.6', '-230.0'],
    ['16.0', '-242.0'],
  ]);
  expect(entry('phosphoric-acid').determinations[1]).toMatchObject({
    preferred: false,
    listedAs: 'phosphoric acid (CRC)',
    constants: [
      { value: '2.16', provenance: 'read' },
      { value: '7.21', provenance: 'recalled', provenanceNote: 'sure' },
      { value: '12.32', provenance: 'recalled', provenanceNote: 'sure' },
    ],
  });
});

test('each entry has one preferred determination, first, with all its steps', () => {
  for (const { id, pKa, species, determinations } of entries) {
    const [first, ...others] = determinations;
    expect([id, first?.preferred, others.some((one) => one.preferred)]).toEqual([id, true, false]);
    expect(first?.constants.map(({ step }) => step)).toEqual(pKa.map((_, i) => i + 1));
    expect(first?.constants.map(({ value }) => value)).toEqual(pKa);
    expect(species).toHaveLength(pKa.length + 1);
    for (const { step } of others.flatMap(({ constants }) => constants)) {
      expect([id, step <= pKa.length]).toEqual([id, true]);
    }
  }
});

test('ids read well and are safe in an address', () => {
  expect(entries.map(({ id }) => id).filter((id) => !/^[a-z0-9]+(-[a-z0-9]+)*$/.test(id))).toEqual(
    [],
  );
  for (const id of ['phosphoric-acid', 'tris', 'edta', 'acetic-acid', 'ammonia', 'boric-acid']) {
    expect(entry(id).id).toBe(id);
  }
});

test('names are free of conditions and of forms', () => {
  const odd = entries.filter(({ name }) => / C\)| M\)|H\d?[LY]|-H|\(CRC\)|step|\+/.test(name));
  expect(odd.map(({ name }) => name)).toEqual([]);
});

const media: [id: string, step: number, kind: string, I: string | null, temperature: string][] = [
  ['boric-acid', 1, 'thermodynamic', '0', '25'],
  ['hydrogen-telluride', 1, 'thermodynamic', '0', '18'],
  ['hydrogen-telluride', 2, 'thermodynamic', '0', '25'],
  ['silicic-acid', 2, 'thermodynamic', '0', '30'],
  ['caffeine', 1, 'thermodynamic', '0', '40'],
  ['egta', 1, 'concentration', '0.1', '25'],
  ['dtpa', 5, 'concentration', '0.1', '25'],
  ['diethylenetriamine', 1, 'concentration', '0.1', '25'],
  ['edta', 4, 'concentration', '1', '25'],
  ['edta', 5, 'concentration', '0.1', '25'],
  ['nta', 4, 'thermodynamic', '0', '25'],
];
test.each(media)('the medium of %s, step %i, is as the table says', (id, step, kind, I, t) => {
  expect(preferred(id)[step - 1]).toMatchObject({ kind, ionicStrength: I, temperature: t });
});

test('a determination at another temperature or in an unstated medium says so', () => {
  expect(entry('boric-acid').determinations[1]?.constants).toMatchObject([
    { value: '9.27', temperature: '20', kind: 'thermodynamic' },
  ]);
  expect(entry('oxalic-acid').determinations[1]?.constants).toMatchObject([
    { value: '1.25', kind: 'thermodynamic', ionicStrength: '0' },
    { value: '3.81', kind: 'concentration', ionicStrength: null },
  ]);
});

test('a row about one step of a substance stands at that step', () => {
  expect(entry('hydrazine').determinations[1]).toMatchObject({
    listedAs: 'hydrazinium(1+)',
    constants: [{ step: 2, value: '8.1' }],
  });
  expect(entry('sulfuric-acid')).toMatchObject({
    fullyProtonatedCharge: -1,
    formula: 'H2SO4',
    species: [{ formula: 'HSO4^-' }, { formula: 'SO4^2-' }],
  });
});

test('strong acids alone are marked as estimates', () => {
  const marked = entries.filter(({ determinations }) =>
    determinations.some(({ constants }) => constants.some(({ estimate }) => estimate)),
  );
  expect(marked.map(({ id }) => id)).toEqual([
    'perchloric-acid',
    'nitric-acid',
    'hydrochloric-acid',
  ]);
});

test('every CAS number of the table and of the entries has its check digit', () => {
  const numbers = [...tableRows.map(({ CAS }) => CAS), ...entries.map(({ cas }) => cas)].filter(
    (cas) => cas !== null,
  );
  expect(numbers.length).toBeGreaterThan(400);
  expect(numbers.filter((cas) => !isCasNumber(cas))).toEqual([]);
});

test.each(['7664-38-3', '7664-38', '07664-38-2', '7664382', '7664-3-2', ''])(
  '%j is no CAS number',
  (text) => {
    expect(isCasNumber(text)).toBe(false);
  },
);

/** Hydrated ions and acids that add water: their forms differ by H2O too. */
const withWater = new Set(
  ['boric-acid', 'aluminium-iii', 'magnesium-ii', 'calcium-ii'].concat(['barium-ii', 'lithium-i']),
);

const written = entries.flatMap(({ id, species }) =>
  species.flatMap((form, i) => {
    const next = species[i + 1];
    return form.formula && next?.formula ? [[id, form.formula, next.formula] as const] : [];
  }),
);

test('each form is the one before less one proton, atom by atom', () => {
  for (const [id, before, after] of written.filter(([one]) => !withWater.has(one))) {
    const atoms = atomsOf(before);
    const hydrogen = (atoms.get('H') ?? 0) - 1;
    if (hydrogen === 0) atoms.delete('H');
    else atoms.set('H', hydrogen);
    expect([id, after, Object.fromEntries(atomsOf(after))]).toEqual([
      id,
      after,
      Object.fromEntries(atoms),
    ]);
  }
  expect(written.length).toBeGreaterThan(350);
});

const chargeIn = (formula: string) => {
  const [, size, sign] = /\^(\d*)([+-])$/.exec(formula) ?? [];
  return sign === undefined ? 0 : Number(`${sign}${size === '' ? 1 : size}`);
};

test('each formula carries the charge of its form', () => {
  for (const { id, species } of entries) {
    for (const { formula, charge } of species) {
      if (formula) expect([id, formula, chargeIn(formula)]).toEqual([id, formula, charge]);
    }
  }
});

/** Atoms with an odd number of bonds: a neutral closed-shell molecule has an even number of them. */
const odd = ['H', 'N', 'F', 'Cl', 'Br', 'I', 'P', 'As', 'B', 'Li'];

test('no neutral formula is a radical: a hydrogen too many or too few would make it one', () => {
  const neutral = entries.flatMap(({ id, formula }) =>
    formula === null || formula.includes('^') ? [] : [[id, formula] as const],
  );
  for (const [id, formula] of neutral) {
    const count = odd.reduce((sum, atom) => sum + (atomsOf(formula).get(atom) ?? 0), 0);
    expect([id, formula, count % 2]).toEqual([id, formula, 0]);
  }
  expect(neutral.length).toBeGreaterThan(240);
});

test('forms that the tables do not settle are left unwritten', () => {
  const unwritten = entries.filter(({ species }) => species.some(({ formula }) => !formula));
  expect(unwritten.map(({ id }) => id)).toEqual(['thiamine', 'phenolphthalein']);
});
