const minus = '\u2212';

/** A run of a formula's characters that share a place. */
export interface FormulaPart {
  readonly text: string;
  readonly place: 'base' | 'sub' | 'sup';
}

/**
 * Splits a formula in plain notation, charge after `^` as number then sign (`HPO4^2-`, `H6Y^2+`,
 * `CH3COOH`), into runs. Digits after a letter or a closing bracket are subscripts; a digit that
 * leads (`2H2O`) is a count and stays. The charge's `-` becomes U+2212.
 */
export function parseFormula(formula: string): FormulaPart[] {
  const [body = '', charge] = formula.split('^', 2);
  const parts: FormulaPart[] = [];
  for (const [index, text] of body.split(/((?<=[A-Za-z)\]])\d+)/).entries()) {
    if (text) parts.push({ text, place: index % 2 === 1 ? 'sub' : 'base' });
  }
  if (charge) parts.push({ text: charge.replace('-', minus), place: 'sup' });
  return parts;
}

/** The formula as a screen reader should say it: atom by atom, then the charge in words. */
export function spokenFormula(formula: string): string {
  const [body = '', charge] = formula.split('^', 2);
  const atoms = body.replace(/(?<=[a-z\d)\]A-Z])(?=[A-Z([])/g, ' ');
  if (!charge) return atoms;
  const sign = charge.endsWith('-') ? 'minus' : 'plus';
  return `${atoms}, charge ${sign} ${charge.replace(/[+-]$/, '') || '1'}`;
}
