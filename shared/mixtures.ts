import { z } from 'zod';
import { component, concentration } from './components';
import { conditions } from './conditions';
import { decimalWithin } from './decimal';
import { digits } from './digits';
import { dryRun } from './dry-run';
import { ionInput } from './ion';
import { limits } from './limits';
import { model } from './model';
import { written } from './written';

const ion = z
  .strictObject({
    charge: z.int().min(-6).max(6).meta({
      description: 'Charge number, not 0.',
      example: 1,
      'x-unit': 'e',
    }),
    concentration,
    ion: ionInput.optional().meta({
      description: 'Which ion it is, for ion-specific parameters and sizes.',
      example: 'Na+',
    }),
  })
  .meta({ id: 'MixtureIon', description: 'An ion that takes no part in proton transfer.' });

const ionPair = z
  .strictObject({
    ion: ionInput.meta({ description: 'Cation that pairs with hydroxide.', example: 'Ca2+' }),
    lgK: decimalWithin({ from: '-5', to: '10', decimals: 20 }).optional().meta({
      description: 'lg K of M + OH⁻ ⇌ MOH at I = 0; 1.3 for Ca²⁺ where left out.',
      example: '1.3',
      'x-unit': '1',
    }),
  })
  .meta({ id: 'IonPair', description: 'A cation that pairs with hydroxide.' });

const asked = {
  components: z
    .array(component)
    .max(limits.components)
    .default([])
    .meta({ description: 'Acids and bases as weighed in, or held by a gas.', example: [] }),
  strongAcid: concentration.optional().meta({
    description: 'Strong monoprotic acid, as HCl; name others under `ions`.',
    example: '0.01',
    'x-unit': 'mol/L',
  }),
  strongBase: concentration.optional().meta({
    description: 'Strong base with one hydroxide, as NaOH; name others under `ions`.',
    example: '0.01',
    'x-unit': 'mol/L',
  }),
  ions: z.array(ion).max(limits.ions).default([]).meta({
    description:
      'Ions beside them: an inert salt is two; a cation without an anion is that of a strong base.',
    example: [],
  }),
  ionPairs: z.array(ionPair).max(limits.ions).default([]).meta({
    description: 'Cations of `ions` or counter-ions that pair with hydroxide.',
    example: [],
  }),
  conditions: conditions.optional(),
  digits,
};

/** Body of POST /v1/mixtures. */
export const mixtureRequest = z
  .strictObject({ ...asked, dryRun })
  .meta({ id: 'MixtureRequest', description: 'Asks what pH a mixture will have.' });

/** Body of POST /v1/public/mixtures. */
export const publicMixtureRequest = z.strictObject(asked).meta({
  id: 'PublicMixtureRequest',
  description: 'Asks what pH a mixture will have, without a key.',
});

const amount = (description: string, example: string) => written(description, example, 'mol/L');
const coefficient = written('Activity coefficient γ.', '0.777');
const formula = z.string().nullable().optional().meta({
  description: 'Formula; null where it is not known, left out for a system given in full.',
  example: 'H2PO4^-',
});

const mixtureSpecies = z
  .strictObject({
    index: z.int().meta({ description: 'Protons lost.', example: 1 }),
    charge: z.int().meta({ description: 'Charge number.', example: -1, 'x-unit': 'e' }),
    formula,
    concentration: amount('Concentration.', '0.0251'),
    fraction: written('Fraction of the component’s total.', '0.502'),
    activityCoefficient: coefficient,
  })
  .meta({ id: 'MixtureSpecies', description: 'A species in the mixture.' });

const weighedAs = z
  .strictObject({
    index: z.int().meta({ description: 'Protons lost of the form weighed in.', example: 1 }),
    charge: z.int().meta({ description: 'Its charge number.', example: -1, 'x-unit': 'e' }),
    formula,
    counterIon: z
      .strictObject({
        ion: z.string().meta({ description: 'Which ion.', example: 'K^+' }),
        charge: z.int().meta({ description: 'Charge number.', example: 1, 'x-unit': 'e' }),
        concentration: amount('What was brought of it.', '0.025'),
      })
      .nullable()
      .meta({
        id: 'CounterIon',
        description: 'Ion weighed in with the form; null for a neutral form.',
      }),
  })
  .meta({ id: 'WeighedAs', description: 'What a component was weighed in as.' });

const mixtureComponent = z
  .strictObject({
    name: z
      .string()
      .optional()
      .meta({ description: 'Name given or stored.', example: 'phosphoric acid' }),
    weighedAs: weighedAs.nullable().meta({
      description: 'As what it was weighed in; null where a gas holds it.',
    }),
    heldBy: z
      .strictObject({
        partialPressure: written('Partial pressure in the gas.', '40.53', 'Pa'),
        henryConstant: written('Solubility, taken as exact.', '0.0340408', 'mol/(kg atm)'),
      })
      .nullable()
      .meta({ id: 'HeldByUsed', description: 'What holds it; null where it was weighed in.' }),
    total: amount('Sum of its species.', '0.05'),
    species: z.array(mixtureSpecies).meta({ description: 'Its n + 1 species.' }),
  })
  .meta({ id: 'MixtureComponent', description: 'A component in the mixture.' });

const mixtureIon = z
  .strictObject({
    ion: z.string().nullable().meta({
      description: 'Which ion; null where it was not named.',
      example: 'Na^+',
    }),
    charge: z.int().meta({ description: 'Charge number.', example: 1, 'x-unit': 'e' }),
    concentration: amount('Concentration.', '0.1'),
    activityCoefficient: coefficient,
  })
  .meta({ id: 'IonInMixture', description: 'An ion that takes no part in proton transfer.' });

const otherState = z
  .strictObject({
    ionicStrength: amount('Ionic strength.', '0.082'),
    pH: written('pH there.', '3.41'),
  })
  .meta({ id: 'OtherIonicStrength', description: 'Another ionic strength that fits.' });

const shortcut = z
  .strictObject({
    name: z
      .enum(['mean-of-two-pKa', 'logarithmic-buffer-equation', 'weak-acid-root', 'weak-base-root'])
      .meta({ description: 'Which shortcut.', example: 'logarithmic-buffer-equation' }),
    concerns: z.int().meta({ description: 'Index of the component it is about.', example: 0 }),
    pH: written('pH it would have given, to 3 decimals.', '7.198'),
    error: written('That pH minus the pH of the mixture, to 3 decimals.', '0.321'),
    why: z.string().meta({
      description: 'Why it differs, in words.',
      example: 'It leaves out activity coefficients, which move the pKa by −0.32 here.',
    }),
  })
  .meta({ id: 'Shortcut', description: 'What a shortcut of the trade would have given.' });

/** Answer of POST /v1/mixtures. */
export const mixtureAnswer = z
  .strictObject({
    pH: written('pH = −lg a(H⁺).', '6.877'),
    pHOfConcentration: written('−lg of the concentration of H⁺.', '6.767'),
    hydrogen: amount('Concentration of H⁺, not its activity.', '0.000000171'),
    hydroxide: amount('Concentration of OH⁻, not its activity.', '0.0000000983'),
    hydrogenActivityCoefficient: coefficient,
    hydroxideActivityCoefficient: coefficient,
    ionicStrengthUsed: amount('Ionic strength of the activity coefficients.', '0.1000'),
    ionicStrengthOfComposition: amount('That of the ions present.', '0.1000'),
    otherIonicStrengths: z.array(otherState).meta({
      description: 'Other ionic strengths that fit; the smallest is the answer.',
    }),
    bufferCapacity: written('Buffer capacity β.', '0.0294', 'mol/L per pH'),
    components: z.array(mixtureComponent).meta({
      description: 'The components, in the order asked; ion pairs behind them.',
    }),
    ions: z.array(mixtureIon).meta({
      description: 'The other ions: counter-ions, those of strong acid and base, those named.',
    }),
    temperatureCoefficient: z.string().nullable().meta({
      description:
        'dpH/dT at this temperature, at most 8 significant digits; null where a constant’s enthalpy is not known.',
      example: '-0.0028',
      'x-unit': '1/K',
    }),
    shortcuts: z.array(shortcut).meta({ description: 'Shortcuts that apply, and how far off.' }),
    solver: z
      .strictObject({
        iterations: z.int().meta({ description: 'Times the balance was evaluated.', example: 9 }),
        residual: amount('What the charge balance is off by, at most.', '1e-30'),
      })
      .meta({ id: 'Solver', description: 'How the answer was reached.' }),
    model,
  })
  .meta({ id: 'MixtureAnswer', description: 'The pH of a mixture and what is in it.' });

export type MixtureRequest = z.infer<typeof mixtureRequest>;
export type MixtureRequestInput = z.input<typeof mixtureRequest>;
export type PublicMixtureRequestInput = z.input<typeof publicMixtureRequest>;
export type MixtureAnswer = z.infer<typeof mixtureAnswer>;
export type Shortcut = z.infer<typeof shortcut>;
