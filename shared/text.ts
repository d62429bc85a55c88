import { z } from 'zod';

/**
 * Text a person typed: trimmed, bounded, and free of U+0000, which PostgreSQL cannot store.
 */
export const text = (longest: number) =>
  z
    .string()
    .trim()
    .min(1)
    .max(longest)
    .refine((value) => !value.includes('\u0000'), {
      params: { code: 'nul-character' },
      message: 'Text may not contain the character U+0000.',
    });
