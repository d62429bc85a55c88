import { z } from 'zod';
import { limits } from './limits';

/** How many digits of an answer are wanted. */
export const digits = z
  .int()
  .min(limits.digits.from)
  .max(limits.digits.to)
  .default(limits.digits.default)
  .meta({
    description:
      'Digits of the answer, all of them right: significant digits of pH, fractions, ratios and concentrations, places after the point of charges and slopes.',
    example: 16,
  });
