import table from '../reference/data/buffer-recipes.json';
import { systemOf } from './buffer-systems';
import type { Departure } from './standards-table';
import { type Description, solved } from './solutions';

/** Amounts in a stock solution, mol/L: systems by their acid, ions by name. */
type Stock = Readonly<Record<string, number>>;

/** One published recipe: volumes of two stocks that make up a pH. */
export interface Recipe {
  table: string;
  name: string;
  columns: string[];
  data: number[][];
  /** mL in all; of stock A too, where it is the same at every pH. */
  model: { V: number; A_mL?: number; A: Stock; B: Stock };
  source: string;
  provenance: string;
  note?: string;
  temperature_C?: number;
}

/** Sources and provenance: data/buffer-recipes.json. */
export const recipes = table.rows as unknown as readonly Recipe[];

/** Acids as the recipes name them, and as the table of constants does. */
const buffers: Readonly<Record<string, string>> = {
  acetic: 'acetate',
  phosphoric: 'phosphate',
  glycine: 'glycine',
  phthalic: 'phthalate',
  tris: 'TRIS',
  boric: 'borate',
  barbital: 'barbital',
  maleic: 'maleate',
  citric: 'citrate',
  carbonic: 'carbonate',
};

/** Where a recipe gives no temperature: "room temperature", which is taken as that of the constants. */
const roomTemperature = 25;

/** Volumes of the two stocks in a row of a recipe, mL. */
function volumesOf({ columns, model }: Recipe, row: readonly number[]): [A: number, B: number] {
  const column = (name: string) => row[columns.indexOf(name)];
  const [x, y] = [column('x_mL'), column('y_mL')];
  const second = y ?? x;
  const first = model.A_mL ?? x;
  if (first === undefined || second === undefined) throw new RangeError('A volume is missing.');
  return [first, second];
}

/** What a row of a recipe makes, by a model. */
function solutionOf(recipe: Recipe, row: readonly number[], model: Description['model']) {
  const { model: stocks, temperature_C: temperature = roomTemperature } = recipe;
  const volumes = volumesOf(recipe, row);
  const totals = new Map<string, number>();
  [stocks.A, stocks.B].forEach((stock, i) => {
    for (const [name, c] of Object.entries(stock)) {
      totals.set(name, (totals.get(name) ?? 0) + (c * (volumes[i] ?? NaN)) / stocks.V);
    }
  });
  const parts = [...totals];
  return {
    acids: parts.flatMap(([name, c]) => {
      const buffer = buffers[name];
      return buffer === undefined ? [] : [systemOf(buffer, c, temperature)];
    }),
    ions: Object.fromEntries(
      parts
        .filter(([name]) => !(name in buffers))
        .map(([name, c]) => [name.replace(/[+-]$/, '^$&'), c]),
    ),
    temperature,
    ...(model ? { model } : {}),
  };
}

/** Calculated minus printed pH of every row of a recipe, and the ionic strength there. */
export const recipeDepartures = (
  recipe: Recipe,
  model: NonNullable<Description['model']>,
): (Departure & { ionicStrength: number; pHOfConcentration: number })[] =>
  recipe.data.map((row) => {
    const [published = NaN] = row;
    const numbers = solved(solutionOf(recipe, row, model), 8);
    return {
      celsius: recipe.temperature_C ?? roomTemperature,
      published,
      departure: Number(numbers.pH) - published,
      ionicStrength: Number(numbers.ionicStrengthOfComposition),
      pHOfConcentration: Number(numbers.pHOfConcentration),
    };
  });

/** The smallest and the largest departure. */
export const spanOf = (found: readonly { departure: number }[]): [low: number, high: number] => [
  Math.min(...found.map(({ departure }) => departure)),
  Math.max(...found.map(({ departure }) => departure)),
];
