import { z } from 'zod';
import { conditions } from './conditions';
import { decimalWithin } from './decimal';
import { digits } from './digits';
import { dryRun } from './dry-run';
import { limits } from './limits';
import { model } from './model';
import { systemInput } from './system';
import { written } from './written';

/** Body of POST /v1/ph-for-fraction. */
export const pHForFractionRequest = z
  .strictObject({
    system: systemInput,
    species: z.int().min(0).max(limits.protons).meta({
      description: 'Index of the species: protons lost from the fully protonated one.',
      example: 1,
    }),
    fraction: decimalWithin({ from: '1e-60', to: '1', decimals: 70 }).meta({
      description: 'Fraction to be reached, greater than 0 and below 1.',
      example: '0.99',
      'x-unit': '1',
    }),
    conditions: conditions.optional(),
    digits,
    dryRun,
  })
  .meta({ id: 'PHForFractionRequest', description: 'Asks where a species has a fraction.' });

const solution = z
  .strictObject({
    pH: written('pH at which the species has the fraction.', '4.144'),
    side: z.enum(['rising', 'falling', 'maximum']).meta({
      description: 'Whether the fraction rises or falls there with pH, or is at its greatest.',
      example: 'rising',
    }),
  })
  .meta({ id: 'PHForFraction', description: 'One pH at which a species has a fraction.' });

/** Answer of POST /v1/ph-for-fraction. */
export const pHForFractionAnswer = z
  .strictObject({
    solutions: z.array(solution).meta({ description: 'One or two, in order of pH.' }),
    model,
  })
  .meta({ id: 'PHForFractionAnswer', description: 'Where a species has a fraction.' });

export type PHForFractionRequest = z.infer<typeof pHForFractionRequest>;
export type PHForFractionRequestInput = z.input<typeof pHForFractionRequest>;
export type PHForFractionAnswer = z.infer<typeof pHForFractionAnswer>;
