/**
 * A number as the contract writes it: papers print a true minus, and many keyboards have only a
 * comma for the point.
 */
export const plainDecimal = (text: string) =>
  text
    .trim()
    .replace(/[\u2212\u2013]/g, '-')
    .replace(/^(-?\d+),(\d+)$/, '$1.$2');
