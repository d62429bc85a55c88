import { z } from 'zod';
import {
  asString,
  decimalExponent,
  decimalLongest,
  decimalString,
  isWithin,
  type DecimalRange,
} from './decimal';
import { conversionOf, unitsOf, type Dimension } from './units';

const spellingsOf = (dimension: Dimension) =>
  unitsOf(dimension).units.flatMap(({ spellings }) => spellings);

/** "mol/L, mmol/L, µmol/L (or umol/L), …": what looks the same is told once. */
function unitsTold(dimension: Dimension): string {
  const { units } = unitsOf(dimension);
  return units
    .map(({ spellings: [first, plain] }) =>
      plain?.startsWith('u') ? `${first} (or ${plain})` : first,
    )
    .join(', ');
}

/** A decimal, and a unit after one space. */
function patternOf(dimension: Dimension): string {
  const escaped = spellingsOf(dimension).map((one) => one.replaceAll(/[()]/g, '\\$&'));
  return `^-?(0|[1-9]\\d*)(\\.\\d+)?([eE][+-]?\\d+)?( (${escaped.join('|')}))?$`;
}

/** Our codes for what may be wrong with a quantity, in words. */
function wordsOf(dimension: Dimension, { from, to, decimals }: DecimalRange) {
  const { own, note, units } = unitsOf(dimension);
  const [, other] = units;
  return {
    'not-a-quantity': `Write a decimal in ${own}, such as "25", or a decimal, one space and a unit, such as "25 ${other?.spellings[0] ?? own}": at most ${decimalLongest} characters of decimal, the exponent within ±${decimalExponent}.`,
    'unknown-unit': `The unit must be one of ${unitsTold(dimension)}, written just so.${note ? ` ${note}` : ''}`,
    'out-of-range': `Must lie between ${from} and ${to} ${own} and have, in ${own}, at most ${decimals} decimals and ${decimalLongest} characters.`,
  };
}

/** Two parts at the first space; the unit may have spaces within, but none around it. */
const parts = /^(\S+)(?: (\S|\S.*\S))?$/u;

/**
 * The value in the dimension's own unit, or the code of what is wrong with it. A value that is in
 * the own unit stays as it was written; another is multiplied out, exactly.
 */
function read(dimension: Dimension, range: DecimalRange, input: string) {
  const [, value = '', unit = unitsOf(dimension).own] = parts.exec(input) ?? [];
  if (!decimalString.safeParse(value).success) return { fault: 'not-a-quantity' } as const;
  const convert = conversionOf(dimension, unit);
  if (convert === undefined) return { fault: 'unknown-unit' } as const;
  const converted = convert?.(value);
  if (!isWithin(converted ?? value, range)) return { fault: 'out-of-range' } as const;
  const written = converted?.toFixed() ?? value;
  return written.length > decimalLongest ? ({ fault: 'out-of-range' } as const) : { written };
}

/**
 * A quantity as callers send it: a decimal string in the dimension's own unit, or with one of the
 * dimension's units after one space. Its output is the decimal string in the own unit, in which the
 * range is meant too. Codes: `decimal-must-be-string`, `not-a-quantity`, `unknown-unit`,
 * `out-of-range`.
 */
export function quantity(dimension: Dimension, range: DecimalRange) {
  const words = wordsOf(dimension, range);
  const { own } = unitsOf(dimension);
  const longestUnit = Math.max(...spellingsOf(dimension).map(({ length }) => length));
  return z
    .string({
      error: ({ input }) => (typeof input === 'number' ? asString : words['not-a-quantity']),
    })
    .transform((input, context) => {
      const { fault, written } = read(dimension, range, input);
      if (written !== undefined) return written;
      context.addIssue({ code: 'custom', params: { code: fault }, message: words[fault] });
      return z.NEVER;
    })
    .meta({
      description: `A ${dimension} in ${own}, or with a unit after one space: ${unitsTold(dimension)}.`,
      example: range.from,
      pattern: patternOf(dimension),
      maxLength: decimalLongest + 1 + longestUnit,
      'x-unit': own,
    });
}
