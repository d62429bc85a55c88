const number = /^[-\u2212\u2013]?\d+(,\d+)?$/;

/**
 * Splits pasted text into constants: rows, cells, semicolons or blanks part them. Commas part them
 * too ("2.148, 7.198", "2,7,12"), except where each piece reads as one number with a decimal comma
 * ("2,148; 7,198").
 *
 * @returns the values as written; fewer than two mean that no list was pasted.
 */
export function pastedConstants(text: string): string[] {
  const pieces = text.split(/[\s;]+/).filter((piece) => piece !== '');
  const decimalCommas = !text.includes('.') && pieces.every((piece) => number.test(piece));
  return decimalCommas ? pieces : pieces.flatMap((piece) => piece.split(',').filter(Boolean));
}
