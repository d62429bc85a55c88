/** Length as Prettier counts it: code points, none of ours is wide or combining. */
const widthOf = (text: string) => [...text].length;

/**
 * A Markdown table as Prettier writes it: the first column to the left, the others to the right, or
 * all to the left where they hold words.
 */
export function markdownTable(
  head: readonly string[],
  rows: readonly (readonly string[])[],
  words: readonly string[] = [],
): string {
  const lines = [head, ...rows];
  const widths = head.map((_, i) => Math.max(3, ...lines.map((line) => widthOf(line[i] ?? ''))));
  const isLeft = head.map((title, i) => i === 0 || words.includes(title));
  const line = (cells: readonly string[]) => `| ${cells.join(' | ')} |`;
  const padded = (row: readonly string[]) =>
    line(
      widths.map((width, i) => {
        const cell = row[i] ?? '';
        const space = ' '.repeat(width - widthOf(cell));
        return isLeft[i] ? cell + space : space + cell;
      }),
    );
  const rule = line(
    widths.map((width, i) => (isLeft[i] ? '-'.repeat(width) : `${'-'.repeat(width - 1)}:`)),
  );
  return [padded(head), rule, ...rows.map(padded)].join('\n');
}

/** A difference with its sign, a true minus; never −0. */
export function signed(value: number, places = 3): string {
  const size = Math.abs(value).toFixed(places);
  if (Number(size) === 0) return size;
  return `${value < 0 ? '−' : '+'}${size}`;
}
