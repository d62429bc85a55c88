import { z } from 'zod';
import { constant } from './constant';
import { pageQuery } from './page';
import { species } from './species';
import { systemId } from './system';
import { text } from './text';

const described = {
  id: systemId,
  revision: z.int().meta({
    description: 'Counts up whenever anything about the system changes.',
    example: 1,
  }),
  origin: z.enum(['handbook', 'organization']).meta({
    description: 'The handbook, which everybody reads, or the organization’s own.',
    example: 'handbook',
  }),
  name: z.string().meta({ description: 'Ordinary name.', example: 'phosphoric acid' }),
  aliases: z.array(z.string()).meta({
    description: 'Other names it is found by.',
    example: ['phosphate', 'orthophosphoric acid'],
  }),
  formula: z.string().nullable().meta({
    description: 'Formula of the neutral compound; null where unknown.',
    example: 'H3PO4',
  }),
  cas: z.string().nullable().meta({
    description: 'CAS number of the neutral compound; null where unknown.',
    example: '7664-38-2',
  }),
  fullyProtonatedCharge: z.int().meta({
    description: 'Charge number of the fully protonated species.',
    example: 0,
    'x-unit': 'e',
  }),
  pKa: z.array(z.string()).meta({
    description: 'The preferred constants, in the order in which protons leave.',
    example: ['2.148', '7.198', '12.35'],
    'x-unit': '1',
  }),
};

/** A system in a list. */
export const systemSummary = z
  .strictObject(described)
  .meta({ id: 'SystemSummary', description: 'A stored system, in short.' });

/** Constants that belong together: one source, one row. */
export const determination = z
  .strictObject({
    preferred: z.boolean().meta({
      description: 'Whether a call by id computes with these.',
      example: true,
    }),
    listedAs: z.string().nullable().meta({
      description: 'The name under which the source’s table has them.',
      example: 'phosphate',
    }),
    constants: z.array(constant).meta({
      description: 'In the order in which protons leave; the preferred one has them all.',
    }),
  })
  .meta({ id: 'Determination', description: 'Constants from one row of one source.' });

/** Answer of GET /v1/systems/{id}. */
export const storedSystem = z
  .strictObject({
    ...described,
    note: z.string().nullable().meta({
      description: 'What to know before using the constants; null where there is nothing.',
      example: 'H2CO3 stands for dissolved carbon dioxide and carbonic acid together.',
    }),
    species: z.array(species).meta({ description: 'The n + 1 species.' }),
    determinations: z.array(determination).meta({
      description: 'The preferred determination, then the others.',
    }),
  })
  .meta({ id: 'StoredSystem', description: 'A stored system with every determination.' });

/** Answer of GET /v1/systems. */
export const systemList = z
  .strictObject({ items: z.array(systemSummary).meta({ description: 'Best matches first.' }) })
  .meta({ id: 'SystemList', description: 'Stored systems, best matches first.' });

/** Query of GET /v1/systems. */
export const systemsQuery = z.strictObject({
  query: text(100).optional().meta({
    description: 'Part of a name or alias, or the beginning of a formula or CAS number.',
    example: '77-92-9',
  }),
  ...pageQuery,
});

export type Determination = z.infer<typeof determination>;
export type StoredSystem = z.infer<typeof storedSystem>;
export type SystemSummary = z.infer<typeof systemSummary>;
export type SystemList = z.infer<typeof systemList>;
export type SystemsQuery = z.infer<typeof systemsQuery>;
