import { z } from 'zod';
import { activityModel, basis, outOfRange } from './conditions';
import { constant, constantKind } from './constant';
import { written } from './written';

/** What an answer may warn of. */
const warningCodes = [
  'inverted-constants',
  'estimated-constant',
  'constants-at-their-medium',
  'constants-outside-medium',
  'pka-not-temperature-corrected',
  'temperature-beyond-trust',
  'outside-model-range',
  'charge-beyond-model',
  'missing-interaction',
  'unnamed-ion',
  'no-ionic-strength-given',
  'ion-takes-part',
  'held-by-gas',
  'note-of-system',
  'ion-size-assumed',
  'several-ionic-strengths',
  'ionic-strength-differs',
  'parameters-of-another-temperature',
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
    kind: constantKind.optional().meta({
      description: 'Kind of constants given in full; stored ones each have their own.',
      example: 'thermodynamic',
    }),
    givenFor: z
      .strictObject({
        ionicStrength: written(
          'Ionic strength; null for thermodynamic ones.',
          '0.1',
          'mol/L',
        ).nullable(),
        temperature: written('Temperature.', '25', '°C'),
      })
      .optional()
      .meta({ id: 'GivenFor', description: 'Where constants given in full hold.' }),
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
    pKaAtTemperature: z
      .array(z.string())
      .optional()
      .meta({
        description:
          'Constants at the temperature asked, taken as exact; left out where none is moved.',
        example: ['2.1797', '7.1788', '12.1846'],
        'x-unit': '1',
      }),
    thermo: z
      .array(
        z
          .strictObject({
            deltaH: written('ΔH°.', '3.6', 'kJ/mol'),
            deltaCp: written('ΔCp°.', '-230', 'J/(mol K)'),
          })
          .nullable()
          .meta({ id: 'ThermoUsed', description: 'How a constant was moved.' }),
      )
      .optional()
      .meta({
        description: 'What moved them, null where nothing is known; left out where none is moved.',
      }),
    constants: z.array(constant).optional().meta({
      description: 'What is known of each stored constant; left out for those given in full.',
    }),
  })
  .meta({ id: 'ConstantsUsed', description: 'One system as it was computed.' });

const activityConstants = z
  .strictObject({
    A: written('Debye–Hückel A for lg γ.', '0.510074', '(kg/mol)^½'),
    B: written(
      'Debye–Hückel B; null where ion sizes take no part.',
      '3.285',
      '(kg/mol)^½/nm',
    ).nullable(),
    linear: written(
      'Coefficient of the linear term; null where there is none.',
      '0.3',
      'kg/mol',
    ).nullable(),
    source: z.string().meta({
      description: 'Where they come from.',
      example: 'Permittivity IAPWS R8-97, density Kell 1975, 0.1 MPa.',
    }),
  })
  .meta({
    id: 'ActivityConstants',
    description: 'Constants of the activity model, taken as exact; null for the ideal model.',
  });

const interaction = z
  .strictObject({
    ions: z.array(z.string()).meta({ description: 'Which ions.', example: ['Na^+', 'HPO4^2-'] }),
    parameters: z.record(z.string(), z.string()).meta({
      description: 'Parameters by name.',
      example: { epsilon: '-0.15' },
      'x-unit': 'kg/mol',
    }),
    source: z.string().meta({ description: 'Where published.', example: 'NEA-TDB 1, 1992' }),
    provenance: z.string().meta({
      description: 'Read in a copy of the source, or recalled and how surely.',
      example: 'memory (very sure)',
    }),
  })
  .meta({ id: 'Interaction', description: 'Parameters of ions for each other.' });

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
        ionicStrength: written('Ionic strength, or "self-consistent".', '0', 'mol/L'),
        activityModel,
        outOfRange,
      })
      .meta({ id: 'ConditionsUsed', description: 'Conditions with every default filled in.' }),
    constantsUsed: z.array(constantsUsed).meta({
      description: 'The systems as computed, in the order of the request.',
    }),
    pKw: written('Ion product of water; null where it takes no part.', '13.994507').nullable(),
    activityConstants: activityConstants.nullable(),
    interactions: z.array(interaction).optional().meta({
      description: 'Ion-specific parameters used; left out where the model has none.',
    }),
    basis,
    warnings: z.array(warning).meta({ description: 'What to know about this answer.' }),
  })
  .meta({ id: 'Model', description: 'The model behind an answer: inputs, conditions, version.' });

export type WarningCode = (typeof warningCodes)[number];
export type Model = z.infer<typeof model>;
