import type { Constant } from '../../../shared/constant';
import type { Determination, StoredSystem } from '../../../shared/stored-system';
import { isCasNumber } from './cas-number';
import { formsOf, neutralFormula } from './formulas';
import { mediumOf } from './medium';
import { provenanceOf } from './provenance';
import { tableRows, thermodynamicRows, thermodynamicSource, type TableRow } from './sources';
import { substances } from './substances';
import type { Substance } from './substances/substance';

/** A handbook entry: a system as it is stored, but for its revision. */
export type HandbookEntry = Omit<StoredSystem, 'revision' | 'origin'>;

interface Steps {
  /** Charge number of the form that loses the first proton of these. */
  readonly charge: number;
  readonly listedAs: string;
  readonly constants: readonly Omit<Constant, 'step'>[];
}

const unknown = { uncertainty: null, deltaH: null, deltaCp: null } as const;

const ofTable = (row: TableRow, estimate: boolean): Steps => ({
  charge: row.charge_fully_protonated,
  listedAs: row.name,
  constants: row.pKa.map((value, i) => ({
    value,
    ...mediumOf(row, i + 1),
    ...unknown,
    approximate: false,
    estimate,
    source: row.source,
    ...provenanceOf(row.provenance, i + 1),
  })),
});

function ofThermodynamics(buffer: string): Steps {
  const rows = thermodynamicRows.filter((row) => row.buffer === buffer);
  if (rows[0] === undefined) throw new Error(`No thermodynamic quantities of ${buffer}`);
  return {
    charge: rows[0].charge_acid,
    listedAs: buffer,
    constants: rows.map((row, i) => ({
      value: row.pK,
      kind: 'thermodynamic',
      temperature: '25',
      ionicStrength: '0',
      ...unknown,
      deltaH: row.dH_kJ,
      deltaCp: row.dCp_J,
      approximate: row.approximate ?? false,
      estimate: false,
      source: thermodynamicSource,
      ...provenanceOf(row.provenance, i + 1),
    })),
  };
}

const rowOf = (name: string): TableRow => {
  const row = tableRows.find((one) => one.name === name);
  if (row === undefined) throw new Error(`No row ${name} in the table of constants`);
  return row;
};

const valuesOf = ({ constants }: Steps) => constants.map(({ value }) => value).join();

/** A row that only points at the thermodynamic quantities is no determination of its own. */
function isPointer(row: TableRow, thermodynamic: Steps | undefined): boolean {
  if (!row.source.endsWith('see 03a')) return false;
  if (thermodynamic && row.pKa.join() === valuesOf(thermodynamic)) return true;
  throw new Error(`${row.name} differs from the thermodynamic quantities it points at`);
}

/** Numbers the steps by the system's own, whose first leaves the form of charge `from`. */
function determinationOf(steps: Steps, from: number, preferred: boolean): Determination {
  const before = from - steps.charge;
  if (before < 0) throw new Error(`${steps.listedAs} begins before the preferred constants`);
  const constants = steps.constants.map((one, i) => ({ step: before + i + 1, ...one }));
  return { preferred, listedAs: steps.listedAs, constants };
}

const slug = (name: string) =>
  name
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '');

function aliasesOf({ name, buffer, aliases = [] }: Substance): string[] {
  const named = new Set([name.toLowerCase()]);
  const all = buffer === undefined || buffer.includes('(') ? aliases : [buffer, ...aliases];
  return all.filter((alias) => {
    const isNew = !named.has(alias.toLowerCase());
    named.add(alias.toLowerCase());
    return isNew;
  });
}

function entryOf(substance: Substance): HandbookEntry {
  const { name, buffer, rows: names = [name], estimate = false } = substance;
  const rows = names.map(rowOf);
  const thermodynamic = buffer === undefined ? undefined : ofThermodynamics(buffer);
  const own = rows.filter((row) => !isPointer(row, thermodynamic));
  const found = [
    ...(thermodynamic ? [thermodynamic] : []),
    ...own.map((row) => ofTable(row, estimate)),
  ];
  const [preferred] = found;
  if (preferred === undefined) throw new Error(`No constants of ${name}`);
  const { charge, constants } = preferred;
  const formula = substance.formula ?? rows[0]?.formula ?? '';
  const written =
    substance.species ?? formsOf(rows[0]?.formula ?? formula, charge, constants.length);
  const cas = substance.cas ?? rows[0]?.CAS ?? null;
  if (cas !== null && !isCasNumber(cas)) throw new Error(`${name}: ${cas} is no CAS number`);
  return {
    id: substance.id ?? slug(name),
    name,
    aliases: aliasesOf(substance),
    formula: substance.formula ?? neutralFormula(formula, written),
    cas,
    note: substance.note ?? null,
    fullyProtonatedCharge: charge,
    pKa: constants.map(({ value }) => value),
    species: written.map((form, index) => ({
      index,
      charge: charge - index,
      protonsLost: index,
      formula: form,
    })),
    determinations: found.map((steps, i) => determinationOf(steps, charge, i === 0)),
  };
}

/** Throws where a row of the tables belongs to no substance, or to two. */
function requireEachRowOnce(): void {
  const used = [
    ...substances.flatMap(({ name, rows = [name] }) => rows),
    ...substances.flatMap(({ buffer }) =>
      buffer === undefined ? [] : [`thermodynamic ${buffer}`],
    ),
  ];
  const there = new Set([
    ...tableRows.map(({ name }) => name),
    ...thermodynamicRows.map(({ buffer }) => `thermodynamic ${buffer}`),
  ]);
  if (used.length !== there.size || used.some((name) => !there.delete(name))) {
    throw new Error(`Rows that no substance has, or two have: ${[...there].join('; ')}`);
  }
}

/**
 * The handbook from its sources and the reviewed list of substances: one entry a substance, its
 * preferred determination first. Thermodynamic quantities, where there are any, are preferred.
 * Throws where sources and list do not fit.
 */
export function handbook(): HandbookEntry[] {
  requireEachRowOnce();
  const entries = substances.map(entryOf);
  if (new Set(entries.map(({ id }) => id)).size < entries.length) throw new Error('An id twice');
  return entries;
}
