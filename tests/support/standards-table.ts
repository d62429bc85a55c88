import table from '../reference/data/ph-standards.json';
import { systemOf } from './buffer-systems';
import { type Description, pHOf, solved } from './solutions';

/** Models that the standards are compared by. */
export const standardModels = ['ideal', 'davies', 'specific-ion-interaction'] as const;

export type StandardModel = (typeof standardModels)[number];

/** A published table of one standard: pH(S) at °C. */
interface PublishedTable {
  table: string;
  provenance: string;
  pH: (readonly [celsius: number, pH: number])[];
}

/** A reference buffer, its composition in mol/kg and what is published of it. */
export interface Standard {
  standard: string;
  name: string;
  acids: { buffer: string; c: number }[];
  ions: Record<string, number>;
  tables: PublishedTable[];
  properties?: { dilution: number; capacity: number; perKelvin: number; doubt?: string };
}

/** Sources and provenance: data/ph-standards.json. */
export const standards = table.rows as unknown as readonly Standard[];

export function standardOf(name: string): Standard {
  const found = standards.find(({ standard }) => standard === name);
  if (found === undefined) throw new RangeError(`There is no standard ${name}.`);
  return found;
}

/** A standard from its composition, or diluted: molalities go into the models as they are. */
export const solutionOf = (
  { acids, ions }: Standard,
  model: StandardModel,
  temperature = 25,
  share = 1,
): Description => ({
  acids: acids.map(({ buffer, c }) => systemOf(buffer, c * share, temperature)),
  ions: Object.fromEntries(Object.entries(ions).map(([name, m]) => [name, m * share])),
  model,
  temperature,
});

/** The latest table of a standard: the one of 2002, where it has the buffer. */
export const latest = ({ tables }: Standard): PublishedTable => {
  const found = tables.at(-1);
  if (found === undefined) throw new RangeError('A standard has no table.');
  return found;
};

/** Calculated minus published. */
export interface Departure {
  celsius: number;
  published: number;
  departure: number;
}

/** Calculated minus published pH at every temperature of a table from 0 to 50 °C, or at 25 °C alone. */
export const departures = (
  standard: Standard,
  model: StandardModel,
  { pH }: PublishedTable = latest(standard),
  within: readonly [from: number, to: number] = [0, 50],
): Departure[] =>
  pH
    .filter(([celsius]) => celsius >= within[0] && celsius <= within[1])
    .map(([celsius, published]) => ({
      celsius,
      published,
      departure: pHOf(solutionOf(standard, model, celsius)) - published,
    }));

/** The departure of a standard at 25 °C. */
export function departureAt25(standard: Standard, model: StandardModel): number {
  const [found] = departures(standard, model, latest(standard), [25, 25]);
  if (found === undefined) throw new RangeError(`${standard.name} has no value at 25 °C.`);
  return found.departure;
}

/** The departure that is largest, of either sign; the first of several. */
export function worstOf<T extends { departure: number }>(found: readonly T[]): T {
  const [first, ...others] = found;
  if (first === undefined) throw new RangeError('Nothing was compared.');
  return others.reduce(
    (worst, one) => (Math.abs(one.departure) > Math.abs(worst.departure) ? one : worst),
    first,
  );
}

/** Dilution value, buffer value and temperature coefficient at 25 °C as a model has them. */
export function propertiesOf(standard: Standard, model: StandardModel) {
  const at = (temperature: number, share = 1) =>
    pHOf(solutionOf(standard, model, temperature, share));
  return {
    dilution: at(25, 0.5) - at(25),
    capacity: Number(solved(solutionOf(standard, model)).bufferCapacity),
    perKelvin: (at(30) - at(20)) / 10,
  };
}
