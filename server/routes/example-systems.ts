import type { StoredSystem } from '../../shared/stored-system';
import { handbook } from '../database/handbook/handbook';

/** The handbook as a new database has it: what the examples of the API description are about. */
export const exampleSystems: ReadonlyMap<string, StoredSystem> = new Map(
  handbook().map((entry) => [entry.id, { ...entry, revision: 1, origin: 'handbook' }]),
);

/** An entry that an example is about. Throws where the handbook has none of that id. */
export function exampleSystem(id: string): StoredSystem {
  const system = exampleSystems.get(id);
  if (!system) throw new Error(`The handbook has no ${id}`);
  return system;
}
