/** A stored system as callers name it: at its present revision, or at a named one. */
export interface Reference {
  readonly id: string;
  readonly revision?: number;
}

/** Reads "phosphoric-acid" or "phosphoric-acid@2", as the contract has checked it. */
export function readReference(written: string): Reference {
  const [id = '', revision] = written.split('@');
  return revision === undefined ? { id } : { id, revision: Number(revision) };
}
