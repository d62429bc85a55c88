import { z } from 'zod';

/** Control characters, halves of surrogate pairs, and signs that turn the direction of writing. */
const unfit = /[\p{Cc}\p{Cs}\p{Bidi_Control}]/u;

/** Text a person typed: trimmed, bounded, and free of characters that show as nothing or mislead. */
export const text = (longest: number) =>
  z
    .string()
    .trim()
    .min(1)
    .max(longest)
    .refine((value) => !unfit.test(value), {
      params: { code: 'unfit-character' },
      message: 'Leave out control characters and signs that turn the direction of writing.',
    });
