import { z } from 'zod';

/** Something a caller should know about an answer that was nevertheless computed. */
export const warning = z
  .strictObject({
    code: z.enum(['inverted-constants']).meta({
      description: 'Stable name of the warning.',
      example: 'inverted-constants',
    }),
    message: z.string().meta({
      description: 'The warning in words.',
      example: 'pKa 1 (9) is greater than pKa 2 (4): species 1 never predominates.',
    }),
    pointer: z.string().optional().meta({
      description: 'JSON Pointer to the part of the request it concerns.',
      example: '/system/pKa/0',
    }),
  })
  .meta({ id: 'Warning', description: 'A warning beside a computed answer.' });

export type Warning = z.infer<typeof warning>;

const constantsUsed = z
  .strictObject({
    name: z.string().optional().meta({ description: 'Name given.', example: 'phosphoric acid' }),
    kind: z.literal('thermodynamic').meta({
      description: 'Kind of constants.',
      example: 'thermodynamic',
    }),
    fullyProtonatedCharge: z.int().meta({
      description: 'Charge number of the fully protonated species.',
      example: 0,
      'x-unit': 'e',
    }),
    pKa: z.array(z.string()).meta({
      description: 'Constants taken as exact.',
      example: ['2.148', '7.198', '12.35'],
      'x-unit': '1',
    }),
  })
  .meta({ id: 'ConstantsUsed', description: 'One system as it was computed.' });

/** Where a figure came from, so that it can be defended a year later. */
export const model = z
  .strictObject({
    engineVersion: z.string().meta({ description: 'Version of the engine.', example: '1' }),
    digits: z.int().meta({ description: 'Digits asked for or defaulted.', example: 16 }),
    conditions: z
      .strictObject({
        temperature: z
          .string()
          .meta({ description: 'Temperature.', example: '25', 'x-unit': '°C' }),
        ionicStrength: z
          .string()
          .meta({ description: 'Ionic strength.', example: '0', 'x-unit': 'mol/L' }),
        activityModel: z
          .literal('ideal')
          .meta({ description: 'Activity model.', example: 'ideal' }),
        outOfRange: z.literal('refuse').meta({
          description: 'What happens outside a model’s range.',
          example: 'refuse',
        }),
      })
      .meta({ id: 'ConditionsUsed', description: 'Conditions with every default filled in.' }),
    constantsUsed: z.array(constantsUsed).meta({
      description: 'The systems as computed, in the order of the request.',
    }),
    pKw: z.null().meta({ description: 'Ion product of water; null where it takes no part.' }),
    activityConstants: z.null().meta({
      description: 'Constants of the activity model; null for the ideal model.',
    }),
    basis: z.literal('mol/L').meta({ description: 'Basis of amounts.', example: 'mol/L' }),
    warnings: z.array(warning).meta({ description: 'What to know about this answer.' }),
  })
  .meta({ id: 'Model', description: 'The model behind an answer: inputs, conditions, version.' });

export type Model = z.infer<typeof model>;
