import { z } from 'zod';
import { concentration } from './components';
import { conditions } from './conditions';
import { digits } from './digits';
import { dryRun } from './dry-run';
import { model } from './model';
import { systemInput } from './system';
import { written } from './written';

const asked = {
  system: systemInput,
  concentration: concentration.optional().meta({
    description: 'Asks for the isoionic point too: the pure ampholyte in water at this total.',
    example: '0.1',
    'x-unit': 'mol/L',
  }),
  conditions: conditions.optional(),
  digits,
};

/** Body of POST /v1/isoelectric-point. */
export const isoelectricPointRequest = z
  .strictObject({ ...asked, dryRun })
  .meta({ id: 'IsoelectricPointRequest', description: 'Asks where a system carries no charge.' });

/** Body of POST /v1/public/isoelectric-point. */
export const publicIsoelectricPointRequest = z.strictObject(asked).meta({
  id: 'PublicIsoelectricPointRequest',
  description: 'Asks where a system carries no charge, without a key.',
});

const speciesThere = z
  .strictObject({
    index: z.int().meta({ description: 'Protons lost.', example: 1 }),
    charge: z.int().meta({ description: 'Charge number.', example: 0, 'x-unit': 'e' }),
    formula: z.string().nullable().optional().meta({
      description: 'Formula; null where it is not known, left out for a system given in full.',
      example: 'C2H5NO2',
    }),
    fraction: written('Fraction at the isoelectric point.', '0.99961'),
  })
  .meta({ id: 'SpeciesAtIsoelectricPoint', description: 'A species where the charge is none.' });

/** Answer of POST /v1/isoelectric-point. */
export const isoelectricPointAnswer = z
  .strictObject({
    isoelectricPoint: written('pH at which the mean charge is zero.', '6.064'),
    slope: written('dz̄/dpH there, `digits` places after the point.', '-0.000885', 'e'),
    species: z.array(speciesThere).meta({ description: 'The n + 1 species there.' }),
    isoionicPoint: z.string().nullable().meta({
      description: 'pH of the pure ampholyte in water; null where no concentration was given.',
      example: '6.0734',
      'x-unit': '1',
    }),
    isoionicConditions: z
      .strictObject({
        ionicStrength: written('Ionic strength of that solution.', '0.0000101', 'mol/L'),
        activityModel: z.string().meta({ description: 'Model used for it.', example: 'davies' }),
      })
      .nullable()
      .meta({
        id: 'IsoionicConditions',
        description: 'What the isoionic point holds for; null where there is none.',
      }),
    model,
  })
  .meta({ id: 'IsoelectricPointAnswer', description: 'Where a system carries no net charge.' });

export type IsoelectricPointRequest = z.infer<typeof isoelectricPointRequest>;
export type IsoelectricPointRequestInput = z.input<typeof isoelectricPointRequest>;
export type PublicIsoelectricPointRequestInput = z.input<typeof publicIsoelectricPointRequest>;
export type IsoelectricPointAnswer = z.infer<typeof isoelectricPointAnswer>;
