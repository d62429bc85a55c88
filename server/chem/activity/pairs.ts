import type { Arithmetic } from '../decimals/arithmetic';
import { type Ion, shownAs } from './ion';
import { canonicalIon } from './ion-names';

/** Activity coefficients by the interactions of a list of ions, looked up once for the list. */
export interface AmongIons<Used> {
  /** The rows of the tables that take part. */
  readonly used: readonly Used[];
  /** Cation and anion of every pair without a row, each pair once. It counts as 0. */
  readonly missing: readonly (readonly [cation: string, anion: string])[];
  /**
   * lg γ of every ion of the list, 0 or by a table for neutral ones; A in (kg/mol)^½ for lg,
   * molalities in mol/kg in the order of the list.
   */
  readonly lgGamma: <N>(arithmetic: Arithmetic<N>, A: N, molalities: readonly N[]) => N[];
}

/** A row of a table about one cation and one anion. */
interface PairRow {
  readonly cation: string;
  readonly anion: string;
}

/** Two places in a list of ions, and what is known of that pair. */
interface Pair<Row> {
  readonly cation: number;
  readonly anion: number;
  readonly row: Row;
}

const key = (cation: string, anion: string) => `${cation} ${anion}`;

/** A table by pairs, to look up in. */
export const byPair = <Row extends PairRow>(rows: readonly Row[]): ReadonlyMap<string, Row> =>
  new Map(rows.map((row) => [key(row.cation, row.anion), row]));

const tableName = ({ name }: Ion) => canonicalIon(name ?? '');

/** Where the ions of a name stand in a list: one may come from several components. */
export const placesOf = (ions: readonly Ion[], name: string): number[] =>
  ions.flatMap((ion, i) => (tableName(ion) === name ? [i] : []));

/** Every cation with every anion of a list: those of which a table knows, and those it misses. */
export function pairsAmong<Row extends PairRow>(
  ions: readonly Ion[],
  table: ReadonlyMap<string, Row>,
) {
  const pairs: Pair<Row>[] = [];
  const missing = new Map<string, [cation: string, anion: string]>();
  ions.forEach((positive, cation) => {
    ions.forEach((negative, anion) => {
      if (positive.charge <= 0 || negative.charge >= 0) return;
      const row = table.get(key(tableName(positive), tableName(negative)));
      const shown: [string, string] = [shownAs(positive), shownAs(negative)];
      if (row === undefined) missing.set(key(...shown), shown);
      else pairs.push({ cation, anion, row });
    });
  });
  return { pairs, used: [...new Set(pairs.map(({ row }) => row))], missing: [...missing.values()] };
}
