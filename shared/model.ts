import { z } from 'zod';
import { constant } from './constant';

/** What an answer may warn of. */
const warningCodes = [
  'inverted-constants',
  'estimated-constant',
  'constants-at-their-medium',
  'pka-not-temperature-corrected',
] as const;

/** Something a caller should know about an answer that was nevertheless computed. */
export const warning = z
  .strictObject({
    code: z.enum(warningCodes).meta({
      description: 'Stable name of the warning.',
      example: 'inverted-constants',
    }),
    message: z.string().meta({
      description: 'The warning in words.',
      example:
        'pKa 1 (9) is greater than pKa 2 (4): species 1 never predominates, and others beside it may not either.',
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
    name: z
      .string()
      .optional()
      .meta({ description: 'Name given or stored.', example: 'phosphoric acid' }),
    note: z.string().nullable().optional().meta({
      description: 'What to know before using a stored system; null where there is nothing.',
      example: 'Two of its three steps.',
    }),
    system: z
      .strictObject({
        id: z.string().meta({ description: 'Identifier.', example: 'phosphoric-acid' }),
        revision: z.int().meta({ description: 'Revision computed with.', example: 1 }),
      })
      .optional()
      .meta({
        id: 'SystemUsed',
        description: 'The stored system; left out for one given in full.',
      }),
    kind: z.literal('thermodynamic').optional().meta({
      description: 'Kind of constants given in full; stored ones each have their own.',
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
    constants: z.array(constant).optional().meta({
      description: 'What is known of each stored constant; left out for those given in full.',
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
