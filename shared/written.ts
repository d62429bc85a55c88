import { z } from 'zod';

/** A decimal of an answer, with its unit. */
export const written = (description: string, example: string, unit = '1') =>
  z.string().meta({ description, example, 'x-unit': unit });
