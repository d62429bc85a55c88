import { z } from 'zod';
import { decimalWithin } from './decimal';
import { limits } from './limits';
import { text } from './text';

/** A stepwise acid dissociation constant. */
export const pKaValue = decimalWithin(limits.pKa).brand<'PKa'>().meta({
  id: 'PKa',
  description: 'Stepwise constant pKₐ, from −50 to 70, as a decimal string.',
  example: '7.198',
  'x-unit': '1',
});

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
  .union([systemInFull, systemById])
  .meta({ id: 'SystemInput', description: 'A system: in full, or by the id of a stored one.' });

export type SystemInput = z.infer<typeof systemInput>;
