import { z } from 'zod';
import { conditions } from './conditions';
import { digits } from './digits';
import { dryRun } from './dry-run';
import { limits } from './limits';
import { model } from './model';
import { pHInput, pHValue } from './ph';
import { species } from './species';
import { queryInteger } from './query-integer';
import { systemInput } from './system';

/** Query of GET /v1/systems/{id}/fractions: the one-line form of the same question. */
export const fractionsQuery = z.strictObject({
  pH: pHValue,
  digits: queryInteger(limits.digits.from, limits.digits.to)
    .default(limits.digits.default)
    .meta({ description: 'Digits of the answer, all of them right.', example: 16 }),
});

const pH = pHInput.meta({
  description: 'Where to answer: one pH, a list, or an even grid.',
  'x-unit': '1',
});

/** Body of POST /v1/fractions: one system or up to 100, never both. */
export const fractionsRequest = z
  .strictObject({
    system: systemInput.optional(),
    systems: z.array(systemInput).min(1).max(limits.systems).optional().meta({
      description: 'Up to 100 systems, answered in this order.',
    }),
    pH,
    conditions: conditions.optional(),
    digits,
    dryRun,
  })
  .superRefine((body, context) => {
    if ((body.system === undefined) === (body.systems === undefined)) {
      context.addIssue({
        code: 'custom',
        path: [body.system === undefined ? 'system' : 'systems'],
        params: { code: 'one-of' },
        message: 'Give either `system` or `systems`.',
      });
    }
  })
  .meta({ id: 'FractionsRequest', description: 'Asks for species fractions.' });

/** Body of POST /v1/public/fractions: one system, at a lower cost bound, no key. */
export const publicFractionsRequest = z
  .strictObject({ system: systemInput, pH, conditions: conditions.optional(), digits })
  .meta({ id: 'PublicFractionsRequest', description: 'Asks for one system’s species fractions.' });

const point = z
  .strictObject({
    pH: z.string().meta({ description: 'pH, as asked.', example: '7.4', 'x-unit': '1' }),
    fractions: z.array(z.string()).meta({
      description: 'Fraction α of each species; their sum is 1.',
      example: ['0.000002159', '0.3858', '0.6142', '0.000006892'],
      'x-unit': '1',
    }),
    neighbourRatios: z.array(z.string()).meta({
      description: 'Amount of species i + 1 over species i.',
      example: ['1.786e+5', '1.592', '0.00001122'],
      'x-unit': '1',
    }),
    meanCharge: z.string().meta({
      description: 'Mean charge number z̄, `digits` places after the point.',
      example: '-1.6142',
      'x-unit': 'e',
    }),
    predominant: z.int().meta({
      description: 'Index of the species with the largest fraction; a tie goes to the lower.',
      example: 2,
    }),
  })
  .meta({ id: 'FractionPoint', description: 'The species at one pH.' });

const end = z.string().nullable();
const predominance = z
  .strictObject({
    species: z.int().meta({ description: 'Index of the species.', example: 2 }),
    from: end.meta({
      description: 'Lower end, null where unbounded.',
      example: '7.198',
      'x-unit': '1',
    }),
    to: end.meta({
      description: 'Upper end, null where unbounded.',
      example: '12.35',
      'x-unit': '1',
    }),
  })
  .meta({ id: 'PredominanceRange', description: 'Where a species is the most abundant.' });

const ofOneSystem = {
  name: z
    .string()
    .optional()
    .meta({ description: 'Name given or stored.', example: 'phosphoric acid' }),
  species: z.array(species).meta({ description: 'The n + 1 species.' }),
  effectivePKa: z.array(z.string()).meta({
    description: 'Constants pK′ that the fractions use on the pH scale.',
    example: ['2.148', '7.198', '12.35'],
    'x-unit': '1',
  }),
  points: z.array(point).meta({ description: 'One entry a pH, in the order asked.' }),
  predominance: z.array(predominance).meta({
    description: 'Ranges in order of pH; a species that never predominates has none.',
  }),
};

/** One system's part of an answer for several. */
export const systemFractions = z
  .strictObject(ofOneSystem)
  .meta({ id: 'SystemFractions', description: 'One system’s species fractions.' });

/** Answer to a call with `system`. */
export const fractionsAnswer = z
  .strictObject({ ...ofOneSystem, model })
  .meta({ id: 'FractionsAnswer', description: 'Species fractions of one system.' });

/** Answer to a call with `systems`. */
export const manyFractionsAnswer = z
  .strictObject({
    items: z.array(systemFractions).meta({ description: 'One entry a system, in order.' }),
    model,
  })
  .meta({ id: 'ManyFractionsAnswer', description: 'Species fractions of several systems.' });

export type FractionsRequest = z.infer<typeof fractionsRequest>;
export type FractionsRequestInput = z.input<typeof fractionsRequest>;
export type PublicFractionsRequestInput = z.input<typeof publicFractionsRequest>;
export type FractionPoint = z.infer<typeof point>;
export type SystemFractions = z.infer<typeof systemFractions>;
export type FractionsAnswer = z.infer<typeof fractionsAnswer>;
export type ManyFractionsAnswer = z.infer<typeof manyFractionsAnswer>;
