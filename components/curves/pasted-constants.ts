/**
 * Splits pasted text into constants: rows, cells, semicolons or blanks part them, and commas do
 * wherever they cannot be decimal commas ("2.148, 7.198" or "2, 7"). A value that keeps its comma is
 * left for the field to point out: nothing is altered silently.
 *
 * @returns the values as written; fewer than two mean that no list was pasted.
 */
export function pastedConstants(text: string): string[] {
  const commaSeparates = text.includes('.') || /,\s|,[^,]*,/.test(text);
  const rows = text.split(/[\s;]+/);
  const values = commaSeparates ? rows.flatMap((row) => row.split(',')) : rows;
  return values.filter((value) => value !== '');
}
