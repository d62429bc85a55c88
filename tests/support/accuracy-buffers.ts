import { systemOf } from './buffer-systems';
import { markdownTable, signed } from './markdown';
import { type Recipe, recipeDepartures, recipes, spanOf } from './recipes-table';
import { pHOf } from './solutions';
import {
  departureAt25,
  departures,
  latest,
  propertiesOf,
  type StandardModel,
  standardModels,
  standards,
  worstOf,
} from './standards-table';

const titles: Readonly<Record<StandardModel, string>> = {
  ideal: 'ideal',
  davies: 'Davies',
  'specific-ion-interaction': 'SIT',
};
const withActivities = standardModels.filter((model) => model !== 'ideal');

/** "Davies −0.019 (Tris)", of rows that say what they are. */
const named = (title: string, rows: readonly { departure: number; what: string }[]) => {
  const { departure, what } = worstOf(rows);
  return `${title} ${signed(departure)} (${what})`;
};

function at25(): string {
  const rows = standards.map((standard) => ({
    standard,
    by: standardModels.map((model) => departureAt25(standard, model)),
  }));
  const worst = standardModels.map((model, i) =>
    named(
      titles[model],
      rows.map(({ standard, by }) => ({ departure: by[i] ?? NaN, what: standard.standard })),
    ),
  );
  const within = rows.filter(({ by }) => Math.abs(by.at(-1) ?? NaN) < 0.01).length;
  const table = markdownTable(
    ['Buffer', 'pH(S)', ...standardModels.map((model) => titles[model])],
    rows.map(({ standard, by }) => {
      const [, published = NaN] = latest(standard).pH.find(([celsius]) => celsius === 25) ?? [];
      return [standard.name, String(published), ...by.map((one) => signed(one))];
    }),
  );
  return `## Reference buffers, 25 °C

Calculated minus standard pH.

${table}

Worst: ${worst.join(', ')}.
By specific ion interaction ${within} of ${rows.length} lie within 0.010; Tris lacks a published
coefficient (TrisH⁺ with Cl⁻). Calcium hydroxide is calculated with CaOH⁺, lg K 1.3.`;
}

function overTemperature(): string {
  const rows = standards
    .filter((standard) => latest(standard).pH.length > 1)
    .map((standard) => ({
      standard,
      by: withActivities.map((model) => worstOf(departures(standard, model))),
    }));
  const worst = withActivities.map((model, i) =>
    named(
      titles[model],
      rows.map(({ standard, by }) => ({
        departure: by[i]?.departure ?? NaN,
        what: `${standard.standard}, ${by[i]?.celsius ?? NaN} °C`,
      })),
    ),
  );
  const table = markdownTable(
    ['Buffer', ...withActivities.flatMap((model) => [titles[model], 'at °C'])],
    rows.map(({ standard, by }) => [
      standard.name,
      ...by.flatMap(({ departure, celsius }) => [signed(departure), String(celsius)]),
    ]),
  );
  return `## Reference buffers, 0 to 50 °C

The largest departure of each, with constants moved by ΔH° and ΔCp°. Interaction coefficients stay those
of 25 °C. Above 60 °C a constant ΔCp° is not to be trusted.

${table}

Worst: ${worst.join(', ')}.`;
}

function properties(): string {
  const rows = standards.flatMap(({ properties: published, ...standard }) => {
    if (published === undefined) return [];
    const ours = propertiesOf(standard, 'specific-ion-interaction');
    const { dilution, capacity, perKelvin, doubt = '' } = published;
    const marked = (text: string, is: boolean) => (is ? `${text} (doubtful)` : text);
    return [
      [
        standard.standard,
        marked(signed(dilution), doubt.startsWith('dilution')),
        signed(ours.dilution),
        marked(capacity.toFixed(3), doubt.startsWith('buffer')),
        ours.capacity.toFixed(3),
        signed(perKelvin, 4),
        signed(ours.perKelvin, 4),
      ],
    ];
  });
  const head = ['Buffer', 'ΔpH½', 'SIT', 'β', 'SIT', 'dpH/dT', 'SIT'];
  return `## Dilution value, buffer value, temperature coefficient, 25 °C

Published (Bates 1973) beside calculated: ΔpH½ on dilution to half, β in mol/L per pH, dpH/dT per K.

${markdownTable(head, rows)}`;
}

const remarks: Readonly<Record<string, string>> = {
  'Bower and Bates: borax-HCl': 'polyborates are left out',
  'Bower and Bates: bicarbonate-NaOH': 'departs from the carbonate standard too',
  'Gomori: acetate (Walpole)': 'Sørensen’s scale, 0.04 lower; slips at 4.4 and 5.4',
  'Gomori: phthalate-HCl': 'Sørensen’s scale, 0.04 lower',
  'Gomori: KCl-HCl': 'prints −lg [H⁺]',
  'Gomori: glycine-HCl': 'not explained',
  'Gomori: Tris-HCl': 'not explained',
  'Gomori: barbital': 'not explained',
  'McIlvaine: McIlvaine': 'ionic strength beyond Davies’s range',
};

/** A recipe that its own row calls no check. */
const isNoCheck = ({ note }: Recipe) => note?.startsWith('DO NOT USE') === true;

function ofRecipes(): string {
  const rows = recipes
    .filter((recipe) => !isNoCheck(recipe))
    .map((recipe) => {
      const what = `${recipe.table}: ${recipe.name}`;
      const by = withActivities.map((model) => recipeDepartures(recipe, model));
      const strength = Math.max(...(by[0] ?? []).map(({ ionicStrength }) => ionicStrength));
      return { what, by, strength, worst: by.map(worstOf) };
    });
  const worst = withActivities.map((model, i) =>
    named(
      titles[model],
      rows.map(({ what, worst: each }) => ({ departure: each[i]?.departure ?? NaN, what })),
    ),
  );
  const table = markdownTable(
    ['Recipe', 'I up to', ...withActivities.map((model) => titles[model]), 'Remark'],
    rows.map(({ what, by, strength }) => [
      what,
      strength.toFixed(2),
      ...by.map((found) =>
        spanOf(found)
          .map((one) => signed(one))
          .join(' to '),
      ),
      remarks[what] ?? '',
    ]),
    ['Remark'],
  );
  const left = recipes.filter(isNoCheck).map(({ table: of, name }) => `${of}: ${name}`);
  return `## Published recipes

Calculated minus printed pH, from the least to the most.

${table}

Worst: ${worst.join(', ')}.
Not compared: ${left.join(', ')}, whose volumes exceed its stoichiometry.`;
}

function withoutValue(): string {
  const models = ['davies', 'specific-ion-interaction', 'pitzer', 'extended-debye-huckel'] as const;
  const values = models.map((model) =>
    pHOf({
      acids: [systemOf('phosphate', 0.01, 25)],
      ions: { 'Na^+': 0.165, 'Cl^-': 0.15 },
      model,
    }),
  );
  const [davies = NaN, sit = NaN, pitzer = NaN, extended = NaN] = values;
  const spread = Math.max(...values) - Math.min(...values);
  return `## Where no standard exists

Equimolal sodium phosphates, 10 mmol/kg, in 0.15 mol/kg NaCl at 25 °C: Davies ${davies.toFixed(3)},
SIT ${sit.toFixed(3)}, Pitzer ${pitzer.toFixed(3)}, extended Debye–Hückel ${extended.toFixed(3)}. They differ by
${spread.toFixed(3)}, and no primary value decides between them: ±0.03.`;
}

/** What is calculated of buffers beside what is published. */
export const bufferSections = (): string[] => [
  at25(),
  overTemperature(),
  properties(),
  ofRecipes(),
  withoutValue(),
];
