const minus = '\u2212';

/** A number ready to be set: true minus, exponent apart. */
export interface NumberParts {
  readonly significand: string;
  /** Power of ten, with a true minus; absent where the number has no exponent. */
  readonly exponent?: string;
}

const number = /^(-?\d+(?:\.\d+)?(?:\(\d+\))?)(?:e([+-]?\d+))?$/i;

/**
 * Parts of a decimal as the API writes it, `-1.61`, `0.614(5)` or `2.16(6)e-6`; undefined for
 * anything else (a key, a date, a formula), which must keep its hyphens.
 */
export function numberParts(text: string): NumberParts | undefined {
  const found = number.exec(text);
  if (!found?.[1]) return undefined;
  const significand = withMinus(found[1]);
  const power = found[2];
  return power === undefined
    ? { significand }
    : { significand, exponent: withMinus(String(Number(power))) };
}

/** Replaces the hyphen that leads a number by U+2212. */
export const withMinus = (text: string) => text.replace(/^-(?=\d)/, minus);

/** The number as a screen reader should say it. */
export const spokenNumber = ({ significand, exponent }: NumberParts) =>
  [significand, exponent && `times 10 to the power ${exponent}`]
    .filter(Boolean)
    .join(' ')
    .replaceAll(minus, 'minus ');
