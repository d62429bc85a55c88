import { z } from 'zod';
import { warning } from './model';

export const dryRun = z.boolean().default(false).meta({
  description: 'Answer cost and warnings only.',
  example: false,
});

/** Answer to a call with `dryRun`. */
export const dryRunAnswer = z
  .strictObject({
    dryRun: z.literal(true).meta({ description: 'Nothing was computed.', example: true }),
    cost: z.int().meta({
      description: 'Work of the call, as GET /v1/limits has the formula.',
      example: 302616,
    }),
    computeUnits: z.int().meta({ description: 'What the call would count.', example: 1 }),
    warnings: z.array(warning).meta({ description: 'What the answer would warn of.' }),
  })
  .meta({ id: 'DryRunAnswer', description: 'Cost and warnings of a call that was not made.' });

export type DryRunAnswer = z.infer<typeof dryRunAnswer>;
