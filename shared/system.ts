import { z } from 'zod';
import { ionicStrengthValue } from './conditions';
import { constantKind } from './constant';
import { decimalWithin } from './decimal';
import { limits } from './limits';
import { quantity } from './quantity';
import { text } from './text';

/** A stepwise acid dissociation constant. */
export const pKaValue = decimalWithin(limits.pKa).brand<'PKa'>().meta({
  id: 'PKa',
  description: 'Stepwise constant pKₐ, from −50 to 70, as a decimal string.',
  example: '7.198',
  'x-unit': '1',
});

const constants = z
  .strictObject({
    kind: constantKind,
    ionicStrength: ionicStrengthValue.optional().meta({
      description: 'Ionic strength they hold at; needed for mixed and concentration constants.',
      example: '0.1',
      'x-unit': 'mol/L',
    }),
    temperature: quantity('temperature', limits.temperature).optional().meta({
      description: 'Temperature they hold at; 25 °C where left out.',
      example: '25',
      'x-unit': '°C',
    }),
  })
  .superRefine(({ kind, ionicStrength }, context) => {
    if (kind !== 'thermodynamic' && ionicStrength === undefined) {
      context.addIssue({
        code: 'custom',
        path: ['ionicStrength'],
        params: { code: 'missing' },
        message: `Say at which ionic strength these ${kind} constants hold.`,
      });
    }
  })
  .meta({
    id: 'ConstantsGiven',
    description: 'What kind of constants these are, and where they hold.',
    example: { kind: 'thermodynamic' },
  });

const thermo = z
  .strictObject({
    deltaH: quantity('molar energy', limits.deltaH).meta({
      description: 'ΔH° of the step at 25 °C.',
      example: '3.6',
      'x-unit': 'kJ/mol',
    }),
    deltaCp: quantity('molar heat capacity', limits.deltaCp).optional().meta({
      description: 'ΔCp° of the step; 0 where left out.',
      example: '-230',
      'x-unit': 'J/(mol K)',
    }),
  })
  .meta({ id: 'Thermo', description: 'How a constant moves with temperature.' });

const size = quantity('length', limits.ionSize).meta({
  id: 'IonSize',
  description: 'Size of an ion in the extended Debye–Hückel model.',
  example: '450',
  'x-unit': 'pm',
});

/** A list of which there is one an element. */
const asMany = (
  list: readonly unknown[] | undefined,
  count: number,
  path: string,
  of: string,
  context: z.RefinementCtx,
) => {
  if (list !== undefined && list.length !== count) {
    context.addIssue({
      code: 'custom',
      path: [path],
      params: { code: 'wrong-length' },
      message: `Give ${count}, one for each ${of}; there are ${list.length}.`,
    });
  }
};

/**
 * A polyprotic system given in full: n constants, n + 1 species, charge z₀ − j after j protons.
 * Equal and inverted neighbours are allowed; inversion is answered with a warning.
 */
export const systemInFull = z
  .strictObject({
    name: text(200).optional().meta({
      description: 'A name for the system, repeated in the answer.',
      example: 'phosphoric acid',
    }),
    fullyProtonatedCharge: z
      .int()
      .min(limits.fullyProtonatedCharge.from)
      .max(limits.fullyProtonatedCharge.to)
      .meta({
        description: 'Charge number of the fully protonated species.',
        example: 0,
        'x-unit': 'e',
      }),
    pKa: z
      .array(pKaValue)
      .min(1)
      .max(limits.protons)
      .meta({
        description: 'Stepwise constants in the order in which protons leave.',
        example: ['2.148', '7.198', '12.35'],
        'x-unit': '1',
      }),
    constants: constants.optional(),
    thermo: z.array(thermo.nullable()).optional().meta({
      description: 'One entry a constant, null where nothing is known.',
    }),
    ionSizes: z
      .array(size)
      .optional()
      .meta({
        description: 'One a species, for the extended Debye–Hückel model.',
        example: ['450', '450', '400', '400'],
        'x-unit': 'pm',
      }),
    formulas: z
      .array(text(60))
      .optional()
      .meta({
        description:
          'One a species, the charge after `^`: how the answer names them, and by which ion-specific parameters and sizes are found.',
        example: ['H3PO4', 'H2PO4^-', 'HPO4^2-', 'PO4^3-'],
      }),
  })
  .superRefine(({ pKa, thermo: heats, ionSizes, formulas }, context) => {
    asMany(heats, pKa.length, 'thermo', 'constant', context);
    asMany(ionSizes, pKa.length + 1, 'ionSizes', 'species', context);
    asMany(formulas, pKa.length + 1, 'formulas', 'species', context);
  })
  .meta({
    id: 'System',
    description: 'A polyprotic acid–base system given by its stepwise constants.',
    example: {
      name: 'phosphoric acid',
      fullyProtonatedCharge: 0,
      pKa: ['2.148', '7.198', '12.35'],
    },
  });

const slug = '[a-z0-9]+(-[a-z0-9]+)*';

/** Identifier of a stored system. */
export const systemId = z
  .string()
  .max(80)
  .regex(new RegExp(`^${slug}$`))
  .meta({ description: 'Lasting identifier of a stored system.', example: 'phosphoric-acid' });

const notAReference = 'Write the id of a system, such as "phosphoric-acid" or "phosphoric-acid@1".';

/** A stored system, the handbook's or the organization's own, at its present or a named revision. */
export const systemReference = z
  .string()
  .max(90, { error: notAReference })
  .regex(new RegExp(`^${slug}(@[1-9]\\d{0,8})?$`), { error: notAReference })
  .meta({
    description:
      'Identifier of a stored system; with `@` and a number, that revision of it for good.',
    example: 'phosphoric-acid',
  });

/** A system by its reference. */
export const systemById = z.strictObject({ id: systemReference }).meta({
  id: 'SystemById',
  description: 'A stored system by its identifier.',
  example: { id: 'phosphoric-acid' },
});

/** A system in full or by id. */
export const systemInput = z
  .union([systemInFull, systemById], {
    error: 'Write { "id": "acetic-acid" }, or the system in full with its charge and constants.',
  })
  .meta({ id: 'SystemInput', description: 'A system: in full, or by the id of a stored one.' });

export type SystemInFull = z.infer<typeof systemInFull>;
export type SystemInput = z.infer<typeof systemInput>;
