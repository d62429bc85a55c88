import { waterAt } from '../../server/chem';
import inSalt from '../reference/data/ion-product-in-salt.json';
import ionProduct from '../reference/data/ion-product.json';
import { bufferSections } from './accuracy-buffers';
import { markdownTable, signed } from './markdown';
import { comparedModels, departure, holdsTo, meanActivityTable } from './mean-activity-table';
import { solved } from './solutions';

/** How the page is written anew: named at its foot, and in what the test says when it is stale. */
export const rewriting = 'UPDATE_ACCURACY=1 npm test -- tests/reference/accuracy-page';

function ofWater(): string {
  const rows = ionProduct.handbook.rows.flatMap(({ t_C, pKw }) => {
    if (t_C > 100) return [];
    const ours = waterAt(String(t_C));
    return [
      [
        String(t_C),
        ours.pKw,
        signed(Number(ours.pKw) - pKw, 4),
        ours.A,
        ours.B,
        ours.permittivity,
        ours.density,
      ],
    ];
  });
  const head = ['°C', 'pKw', '− handbook', 'A', 'B', 'ε', 'ρ'];
  return `## Water, 0.1 MPa

pKw by IAPWS R11-07(2019), standard uncertainty about 0.016, beside a handbook table of the same equation;
ε by IAPWS R8-97, ρ by Kell 1975 (kg/m³), A in (kg/mol)^½ and B in (kg/mol)^½/nm from both.

${markdownTable(head, rows)}`;
}

/** Ionic strengths at which both models are within their range. */
const saltsTo = 1;

function ofSalts(): string {
  const rows = inSalt.rows
    .filter(({ I }) => Number(I) > 0 && Number(I) <= saltsTo)
    .map(({ I, pKw_c, medium }) => {
      const off = (['davies', 'specific-ion-interaction'] as const).map((model) => {
        const { hydrogen, hydroxide } = solved({ ions: { 'Na^+': I, 'Cl^-': I }, model });
        return -Math.log10(Number(hydrogen) * Number(hydroxide)) - Number(pKw_c);
      });
      return [I, pKw_c, ...off.map((one) => signed(one)), medium];
    });
  return `## Ion product of water in salt, 25 °C

−lg [H⁺][OH⁻] in NaCl, calculated minus published (recalled, ±0.02); Davies’s range ends at 0.5.

${markdownTable(['I', 'published', 'Davies', 'SIT', 'Medium'], rows, ['Medium'])}`;
}

function ofActivities(): string {
  const table = meanActivityTable();
  const electrolytes = [...new Set(table.map(({ electrolyte }) => electrolyte))];
  const rows = electrolytes.map((electrolyte) => {
    const found = table.filter((row) => row.electrolyte === electrolyte);
    return [
      electrolyte,
      ...comparedModels.map((model) => String(holdsTo(found, model, 0.02) ?? '')),
    ];
  });
  const moderate = table.filter(({ ionicStrength }) => ionicStrength <= 1);
  const [worst] = moderate
    .map((row) => ({ ...row, off: departure(row, 'specific-ion-interaction') ?? 0 }))
    .sort((one, other) => Math.abs(other.off) - Math.abs(one.off));
  const said = worst
    ? `${signed(100 * worst.off, 1)} % (${worst.electrolyte}, ${worst.molality} mol/kg)`
    : '';
  return `## Mean activity coefficients, 25 °C

The highest published molality (mol/kg) up to which a model is within 2 % of Hamer and Wu (1972, mostly
recalled). Empty where it has no parameters.

${markdownTable(['', ...comparedModels], rows)}

Worst by specific ion interaction up to I = 1: ${said}.`;
}

/**
 * docs/accuracy.md: what the model’s numbers are worth, from the computations that the tests in
 * tests/reference judge. Nothing is fitted to a standard.
 */
export const accuracyPage = (): string =>
  `${[
    `# What the numbers are worth

Every digit of an answer is right for the constants that it prints. This page says how far the model
with these constants is from what was measured. SIT is specific ion interaction. Constants: Goldberg,
Kishore and Lennen 2002 (recalled). Nothing is fitted to a pH standard. Sources and how each value was
obtained stand in \`tests/reference/data\`.`,
    ...bufferSections(),
    ofWater(),
    ofSalts(),
    ofActivities(),
    `---

Generated, and compared by \`tests/reference/accuracy-page.test.ts\`. To write it anew: \`${rewriting}\`.`,
  ].join('\n\n')}\n`;
