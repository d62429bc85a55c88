/**
 * What the tables do not say about a substance, reviewed by hand: its ordinary name, which rows are
 * about it, how its forms are written. What is left out follows from the tables.
 */
export interface Substance {
  /** The ordinary name: of the neutral compound where there is one. */
  readonly name: string;
  /** The lasting identifier; otherwise the name in lower case with hyphens. */
  readonly id?: string;
  /** Its rows in the table of constants, the best first; otherwise the one of the same name. */
  readonly rows?: readonly string[];
  /** Its name in the table of thermodynamic quantities; those constants are then the preferred. */
  readonly buffer?: string;
  readonly aliases?: readonly string[];
  /** Formula of the neutral compound, where the rows have none or write it otherwise. */
  readonly formula?: string;
  /** Formulas of the forms, fully protonated first, where they do not follow from the rows. */
  readonly species?: readonly (string | null)[];
  /** CAS number of the neutral compound, where the rows have none or another's. */
  readonly cas?: string;
  /** Strong acids: what is known of their constants are estimates. */
  readonly estimate?: true;
  /** What a reader must know to use the constants rightly. */
  readonly note?: string;
}
