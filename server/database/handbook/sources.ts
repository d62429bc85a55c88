import buffers from './sources/buffer-thermodynamics.json';
import table from './sources/pka-table.json';

/** A row of the table of constants; numbers as they are printed. */
export interface TableRow {
  readonly name: string;
  readonly formula: string;
  readonly charge_fully_protonated: number;
  readonly pKa: readonly string[];
  readonly CAS: string | null;
  readonly source: string;
  readonly provenance: string;
}

/** A row of the table of thermodynamic quantities: one step, at 25 °C and I = 0. */
export interface ThermodynamicRow {
  readonly buffer: string;
  readonly charge_acid: number;
  readonly pK: string;
  readonly dH_kJ: string | null;
  readonly dCp_J: string | null;
  readonly provenance: string;
  readonly approximate?: boolean;
}

export const tableRows: readonly TableRow[] = table.rows;
export const thermodynamicRows: readonly ThermodynamicRow[] = buffers.rows;
export const thermodynamicSource: string = buffers.source;
