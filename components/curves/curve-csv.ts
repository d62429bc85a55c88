import type { DrawnCurve } from './drawn-curve';

/** A cell as RFC 4180 has it. */
const cell = (text: string) => (/[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text);

/** The curve as fetched, digit for digit: pH, the fraction of each form, the mean charge. */
export function curveCsv({ answer, formulas }: DrawnCurve): string {
  const head = ['pH', ...formulas, 'mean charge'];
  const rows = answer.points.map(({ pH, fractions, meanCharge }) => [pH, ...fractions, meanCharge]);
  return [head, ...rows].map((row) => `${row.map(cell).join(',')}\r\n`).join('');
}
