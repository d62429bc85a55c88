import Decimal from 'decimal.js';
import { z } from 'zod';

/**
 * Wide enough that sums and differences of contract decimals are exact (80 characters, at most
 * 60 decimals where arithmetic is done).
 */
export const Exact = Decimal.clone({ precision: 200 });

/** How a decimal is written in JSON: a string, so that no digit is lost to a binary float. */
export const decimalPattern = /^-?(0|[1-9]\d*)(\.\d+)?([eE][+-]?\d+)?$/;
export const decimalLongest = 80;
export const decimalExponent = 400;

const exponentWithin = (value: string) => {
  const exponent = /[eE]([+-]?\d+)$/.exec(value)?.[1];
  return exponent === undefined || Math.abs(Number(exponent)) <= decimalExponent;
};

const form = `Write a decimal string such as "7.40" or "1.5e-3": at most ${decimalLongest} characters, the exponent within ±${decimalExponent}.`;
/** What a JSON number in place of a decimal is told. */
export const asString = 'Write this decimal as a string: a JSON number would lose digits silently.';

/** Our codes for what zod finds wrong with a decimal, by its message. */
export const decimalFaults: ReadonlyMap<string, string> = new Map([
  [form, 'not-a-decimal'],
  [asString, 'decimal-must-be-string'],
]);

/** A decimal as callers send it. Codes: `decimal-must-be-string`, `not-a-decimal`. */
export const decimalString = z
  .string({ error: ({ input }) => (typeof input === 'number' ? asString : form) })
  .max(decimalLongest, { error: form, abort: true })
  .regex(decimalPattern, { error: form, abort: true })
  .refine(exponentWithin, { error: form, abort: true });

export interface DecimalRange {
  readonly from: string;
  readonly to: string;
  readonly decimals: number;
}

/** Whether a decimal lies within a closed range and has no more places than it may. */
export function isWithin(value: Decimal.Value, { from, to, decimals }: DecimalRange): boolean {
  const number = new Exact(value);
  return !number.lessThan(from) && !number.greaterThan(to) && number.decimalPlaces() <= decimals;
}

/** A decimal within a closed range and with a bounded number of places. Code: `out-of-range`. */
export const decimalWithin = (range: DecimalRange) =>
  decimalString.superRefine((value, context) => {
    if (!isWithin(value, range)) {
      context.addIssue({
        code: 'custom',
        params: { code: 'out-of-range' },
        message: `Must lie between ${range.from} and ${range.to} and have at most ${range.decimals} decimals.`,
      });
    }
  });
