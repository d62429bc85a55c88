import { z } from 'zod';

/** What activities and concentrations a constant is written in. */
export const constantKinds = ['thermodynamic', 'mixed', 'concentration'] as const;

export const constantKind = z.enum(constantKinds).meta({
  description:
    'thermodynamic: I = 0; mixed: activity of H⁺, concentrations of the rest; concentration: all concentrations.',
  example: 'thermodynamic',
});

/** How a value came here. */
export const provenances = ['read', 'recalled', 'stated'] as const;

const decimal = (description: string, example: string, unit: string) =>
  z.string().meta({ description, example, 'x-unit': unit });

/** A stepwise constant as somebody determined it, with all that is known of it. */
export const constant = z
  .strictObject({
    step: z.int().meta({ description: 'Which proton: 1 is the first to leave.', example: 2 }),
    value: decimal('The constant pKₐ, digit for digit as published.', '7.198', '1'),
    kind: constantKind,
    temperature: decimal('Temperature of the determination.', '25', '°C'),
    ionicStrength: decimal(
      'Ionic strength of its medium, null where unstated.',
      '0',
      'mol/L',
    ).nullable(),
    uncertainty: decimal('Standard uncertainty, null where unknown.', '0.01', '1').nullable(),
    deltaH: decimal('ΔH° of the step, null where unknown.', '3.6', 'kJ/mol').nullable(),
    deltaCp: decimal('ΔCp° of the step, null where unknown.', '-230.0', 'J/(mol K)').nullable(),
    approximate: z.boolean().meta({
      description: 'The source gives the value as approximate.',
      example: false,
    }),
    estimate: z.boolean().meta({
      description: 'An estimate, as of strong acids: not a measurement.',
      example: false,
    }),
    source: z.string().meta({
      description: 'Where it is published.',
      example: 'J. Phys. Chem. Ref. Data 31, 231 (2002)',
    }),
    provenance: z.enum(provenances).meta({
      description:
        'read: seen in a copy of the source; recalled: from memory, to be checked before it is relied on; stated: entered by its owner.',
      example: 'recalled',
    }),
    provenanceNote: z.string().nullable().meta({
      description: 'Which copy was read, or how surely it is recalled; null where nothing is said.',
      example: 'sure',
    }),
  })
  .meta({ id: 'Constant', description: 'One determined constant.' });

export type Constant = z.infer<typeof constant>;
