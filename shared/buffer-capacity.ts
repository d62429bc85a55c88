import { z } from 'zod';
import { concentration } from './components';
import { conditions } from './conditions';
import { digits } from './digits';
import { dryRun } from './dry-run';
import { limits } from './limits';
import { model } from './model';
import { pHInput } from './ph';
import { systemInput } from './system';
import { written } from './written';

const components = z
  .array(
    z
      .strictObject({ system: systemInput, concentration })
      .meta({ id: 'BufferComponent', description: 'A system at a total concentration.' }),
  )
  .max(limits.components)
  .meta({ description: 'What buffers beside the water; none for water alone.' });

const pH = pHInput.meta({
  description: 'Where to answer: one pH, a list, or an even grid.',
  'x-unit': '1',
});

const asked = { components, pH, conditions: conditions.optional(), digits };

/** Body of POST /v1/buffer-capacity. */
export const bufferCapacityRequest = z
  .strictObject({ ...asked, dryRun })
  .meta({ id: 'BufferCapacityRequest', description: 'Asks how strongly a mixture buffers.' });

/** Body of POST /v1/public/buffer-capacity. */
export const publicBufferCapacityRequest = z.strictObject(asked).meta({
  id: 'PublicBufferCapacityRequest',
  description: 'Asks how strongly a mixture buffers, without a key.',
});

const capacity = (description: string, example: string) =>
  written(description, example, 'mol/L per pH');

const point = z
  .strictObject({
    pH: written('pH, as asked.', '7.4'),
    total: capacity('Buffer capacity β of all together.', '0.02796'),
    water: capacity('Part of H⁺ and OH⁻.', '0.000000671'),
    components: z.array(z.string()).meta({
      description: 'Part of each component, in the order asked.',
      example: ['0.02796'],
      'x-unit': 'mol/L per pH',
    }),
  })
  .meta({ id: 'BufferCapacityPoint', description: 'Buffer capacity at one pH.' });

const maximum = z
  .strictObject({
    pH: written('pH of the maximum.', '7.198'),
    total: capacity('Buffer capacity there.', '0.0288'),
  })
  .meta({ id: 'BufferCapacityMaximum', description: 'A local maximum of buffer capacity.' });

/** Answer of POST /v1/buffer-capacity. */
export const bufferCapacityAnswer = z
  .strictObject({
    points: z.array(point).meta({ description: 'One entry a pH, in the order asked.' }),
    maxima: z.array(maximum).meta({
      description: 'Local maxima of the total from pH −20 to 40, whatever pH was asked.',
    }),
    model,
  })
  .meta({ id: 'BufferCapacityAnswer', description: 'How strongly a mixture buffers.' });

export type BufferCapacityRequest = z.infer<typeof bufferCapacityRequest>;
export type BufferCapacityRequestInput = z.input<typeof bufferCapacityRequest>;
export type PublicBufferCapacityRequestInput = z.input<typeof publicBufferCapacityRequest>;
export type BufferCapacityAnswer = z.infer<typeof bufferCapacityAnswer>;
