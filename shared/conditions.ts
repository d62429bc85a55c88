import { z } from 'zod';
import { decimalWithin } from './decimal';
import { limits } from './limits';
import { quantity } from './quantity';

/** How activity coefficients are found; each has a range, told in the answer. */
export const activityModels = [
  'ideal',
  'debye-huckel',
  'extended-debye-huckel',
  'guntelberg',
  'davies',
  'specific-ion-interaction',
  'pitzer',
] as const;

export const activityModel = z.enum(activityModels).meta({
  description:
    'ideal: γ = 1; debye-huckel: limiting law (I ≤ 0.005); extended-debye-huckel: with ion sizes (I ≤ 0.1); guntelberg (I ≤ 0.1); davies (I ≤ 0.5); specific-ion-interaction (to about 1 mol/kg); pitzer: where every major pair has parameters.',
  example: 'davies',
});

export const bases = ['mol/L', 'mol/kg'] as const;

export const basis = z.enum(bases).meta({
  description:
    'What amounts are given per: a litre of solution, taken numerically as molality, or a kilogram of water.',
  example: 'mol/L',
});

export const outOfRange = z.enum(['refuse', 'compute']).meta({
  description:
    'What happens beyond twice a model’s range, and with constants outside their medium: refuse, or compute and warn.',
  example: 'refuse',
});

const constant = (description: string, example: string, unit: string, from: string, to: string) =>
  decimalWithin({ from, to, decimals: 40 }).meta({ description, example, 'x-unit': unit });

const temperature = quantity('temperature', limits.temperature).meta({
  description: 'Temperature, 0 to 100 °C: "37", "37 °C" or "310.15 K".',
  example: '25',
  'x-unit': '°C',
});

export const ionicStrengthValue = quantity('concentration', limits.ionicStrength);

const conditionsShape = {
  temperature: temperature.optional(),
  ionicStrength: z
    .union([ionicStrengthValue, z.literal('self-consistent')])
    .optional()
    .meta({
      description:
        'Ionic strength that fixes the activity coefficients, or "self-consistent": that of the composition itself.',
      example: '0.1',
      'x-unit': 'mol/L',
    }),
  activityModel: activityModel.optional(),
  basis: basis.optional(),
  outOfRange: outOfRange.optional(),
  pKw: constant(
    'Ion product of water, in place of that of the temperature.',
    '14',
    '1',
    '5',
    '25',
  ).optional(),
  activityConstants: z
    .strictObject({
      A: constant('Debye–Hückel A.', '0.509', '(kg/mol)^½', '0', '2'),
      B: constant('Debye–Hückel B.', '3.29', '(kg/mol)^½/nm', '0', '10').optional(),
      linear: constant('Coefficient of the linear term.', '0.3', 'kg/mol', '0', '1').optional(),
    })
    .optional()
    .meta({
      id: 'ActivityConstantsGiven',
      description: 'Constants of a printed source, in place of those of the temperature.',
    }),
};

/** What the solution is like: all optional, every default is told in the answer’s `model`. */
export const conditions = z.strictObject(conditionsShape).meta({
  id: 'Conditions',
  description:
    'What the solution is like. An ionic strength without a model means Davies. Without them fractions, capacity and the isoelectric point are ideal at I = 0 and 25 °C; mixtures and the isoionic point are by Davies, self-consistent, at 25 °C.',
  example: { temperature: '37', ionicStrength: '0.15', activityModel: 'davies' },
});

export type Conditions = z.infer<typeof conditions>;
export type ActivityModel = z.infer<typeof activityModel>;
export type OutOfRange = z.infer<typeof outOfRange>;
