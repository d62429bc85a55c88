import { z } from 'zod';

/** One protonation form. */
export const species = z
  .strictObject({
    index: z.int().meta({ description: 'Position in `fractions`.', example: 0 }),
    charge: z.int().meta({ description: 'Charge number.', example: 0, 'x-unit': 'e' }),
    protonsLost: z.int().meta({
      description: 'Protons lost from the fully protonated species.',
      example: 0,
    }),
    formula: z.string().nullable().optional().meta({
      description:
        'Formula with its charge after `^`; null where it is not known, left out for a system given in full.',
      example: 'H2PO4^-',
    }),
  })
  .meta({ id: 'Species', description: 'One protonation form.' });

export type Species = z.infer<typeof species>;
