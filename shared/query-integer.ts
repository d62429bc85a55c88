import { z } from 'zod';

/** A whole number as a query parameter has it: plain digits, no sign, no other notation. */
export const queryInteger = (from: number, to: number) =>
  z.preprocess(
    (value) => (typeof value === 'string' && /^\d{1,9}$/.test(value) ? Number(value) : value),
    z
      .int({ error: `Write a whole number from ${from} to ${to}.` })
      .min(from)
      .max(to),
  );
