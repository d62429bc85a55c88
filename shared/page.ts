import { z } from 'zod';
import { queryInteger } from './query-integer';

/** Query parameters of every list: how many rows, and where the last page ended. */
export const pageQuery = {
  limit: queryInteger(1, 100)
    .default(50)
    .meta({ description: 'Rows of a page, 1 to 100.', example: 50 }),
  cursor: z
    .string()
    .max(2_000)
    .optional()
    .meta({ description: 'Opaque: the one that `Link: rel="next"` of the last page carries.' }),
};
