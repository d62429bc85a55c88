import type { DataSource } from 'typeorm';
import { createDataSource } from '../../../server/database/data-source';
import { handbook } from '../../../server/database/handbook/handbook';
import {
  tableRows,
  thermodynamicRows,
  thermodynamicSource,
} from '../../../server/database/handbook/sources';
import { substances } from '../../../server/database/handbook/substances';
import { migrate } from '../../../server/database/migrate';
import { seedHandbook } from '../../../server/database/seed-handbook';
import { createTestDatabase, type TestDatabase } from '../../support/database';

let place: TestDatabase;
let database: DataSource;
beforeAll(async () => {
  place = await createTestDatabase();
  database = await createDataSource(place.url).initialize();
  await migrate(database);
});
afterAll(async () => {
  await database.destroy();
  await place.drop();
});

interface Row {
  name: string;
  listed_as: string;
  value: string;
  source: string;
  charge: number;
  delta_h: string | null;
  delta_cp: string | null;
  approximate: boolean;
  determination: number;
  step: number;
}

/** Every constant, with the charge of the form that loses the proton. */
const seeded = () =>
  database.query<Row[]>(
    `SELECT r.name, c.listed_as, c.value, c.source, c.delta_h, c.delta_cp, c.approximate,
       c.determination, c.step, r.fully_protonated_charge - c.step + 1 AS charge
     FROM systems s JOIN system_revisions r ON r.system_id = s.id AND r.revision = s.revision
     JOIN system_constants c ON c.system_id = s.id AND c.revision = s.revision
     ORDER BY s.id, c.determination, c.step`,
  );

const substanceOf = (row: string) =>
  substances.find(({ name, rows = [name] }) => rows.includes(row))?.name;

test('the table of constants is found again, row by row and digit by digit', async () => {
  const all = await seeded();
  expect(tableRows).toHaveLength(228);
  for (const row of tableRows) {
    const charges = row.pKa.map((_, i) => row.charge_fully_protonated - i);
    const of = all.filter(({ name }) => name === substanceOf(row.name));
    // A row whose source is "see 03a" repeats the thermodynamic quantities, which stand first.
    const found = row.source.endsWith('see 03a')
      ? of.filter(({ determination }) => determination === 1)
      : of.filter((one) => one.listed_as === row.name && one.source === row.source);
    expect([row.name, found.map(({ value, charge }) => [value, charge])]).toEqual([
      row.name,
      row.pKa.map((value, i) => [value, charges[i]]),
    ]);
  }
});

test('the table of thermodynamic quantities is found again, row by row and digit by digit', async () => {
  const all = await seeded();
  expect(thermodynamicRows).toHaveLength(103);
  for (const row of thermodynamicRows) {
    const found = all.filter(
      ({ source, listed_as, charge }) =>
        source === thermodynamicSource && listed_as === row.buffer && charge === row.charge_acid,
    );
    expect([row.buffer, found]).toMatchObject([
      row.buffer,
      [
        {
          value: row.pK,
          delta_h: row.dH_kJ,
          delta_cp: row.dCp_J,
          approximate: row.approximate ?? false,
          determination: 1,
        },
      ],
    ]);
  }
});

test('nothing is seeded that neither table has', async () => {
  const all = await seeded();
  const pointers = tableRows.filter(({ source }) => source.endsWith('see 03a'));
  const steps = tableRows
    .filter((row) => !pointers.includes(row))
    .reduce((sum, { pKa }) => sum + pKa.length, thermodynamicRows.length);
  expect(all).toHaveLength(steps);
});

const everything = () =>
  database.query<object[]>(
    `SELECT s::text, r::text, (SELECT string_agg(c::text, ';' ORDER BY c) FROM system_constants c
       WHERE c.system_id = s.id) AS c, (SELECT string_agg(t::text, ';' ORDER BY t)
       FROM system_terms t WHERE t.system_id = s.id) AS t
     FROM systems s JOIN system_revisions r ON r.system_id = s.id ORDER BY s.id, r.revision`,
  );

test('seeding again changes nothing', async () => {
  const before = await everything();
  expect(await seedHandbook(database)).toBe(0);
  await migrate(database);
  expect(await everything()).toEqual(before);
});

test('an entry whose source changed gets a new revision; the old one stays, the others too', async () => {
  const changed = handbook().map((entry) =>
    entry.id === 'tris' ? { ...entry, aliases: ['THAM'] } : entry,
  );
  const before = await everything();
  expect(await seedHandbook(database, changed)).toBe(1);
  const revisions = await database.query<object[]>(
    `SELECT s.revision AS present, array_agg(r.revision ORDER BY r.revision) AS all
     FROM systems s JOIN system_revisions r ON r.system_id = s.id
     WHERE s.id = 'tris' GROUP BY s.revision`,
  );
  expect(revisions).toEqual([{ present: 2, all: [1, 2] }]);
  const terms = await database.query<{ term: string }[]>(
    `SELECT term FROM system_terms WHERE system_id = 'tris' AND kind = 'name' ORDER BY term`,
  );
  expect(terms.map(({ term }) => term)).toEqual(['tham', 'tris']);
  const others = (rows: object[]) => rows.filter((row) => !/\(tris,/.test(JSON.stringify(row)));
  expect(others(await everything())).toEqual(others(before));
  expect(await seedHandbook(database, changed)).toBe(0);
});

test('two seeds at once leave one handbook', async () => {
  const another = await createDataSource(place.url).initialize();
  try {
    await Promise.all([migrate(database), migrate(another)]);
  } finally {
    await another.destroy();
  }
  const [counts] = await database.query<{ systems: number }[]>(
    'SELECT count(*)::int AS systems FROM systems',
  );
  expect(counts).toEqual({ systems: handbook().length });
});
