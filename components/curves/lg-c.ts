/** Where a logarithmic diagram ends: lg(c/(mol/L)) from −14 to 0. */
export const lgRange = [-14, 0] as const;

/**
 * Decimal logarithm of a decimal as the API writes it; also of one far below what a double holds
 * (1e-400), since the exponent is read by itself. −∞ for zero.
 */
export function lg(decimal: string): number {
  const [significand = '0', exponent = '0'] = decimal.toLowerCase().split('e');
  return Math.log10(Number(significand)) + Number(exponent);
}

/** lg(c/(mol/L)) of a form from its fraction and the total, mol/L. */
export const lgConcentration = (fraction: string, total: number): number =>
  lg(fraction) + Math.log10(total);

/** As it is read on a screen: two decimals, as a pH. */
export const shownLg = (value: number): string =>
  Number.isFinite(value) ? value.toFixed(2).replace(/^-0\.00$/, '0.00') : 'none';
