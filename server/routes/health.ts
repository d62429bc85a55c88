import { z } from 'zod';
import { operation } from '../http/operation';
import { Refusal } from '../refusal';

const state = z
  .strictObject({
    status: z.literal('ok').meta({ description: 'All is well.', example: 'ok' }),
  })
  .meta({ id: 'Health', description: 'State of the service.' });

const json = 'application/json';
const ok = { type: json, body: JSON.stringify({ status: 'ok' }) };
const examples = { ok: { summary: 'All is well', answer: { status: 'ok' } } };

export const livez = operation({
  method: 'get',
  path: '/livez',
  operationId: 'livez',
  summary: 'Whether the process runs',
  description: 'Answers as long as the process can answer at all.',
  tag: 'Service',
  access: 'public',
  anyHost: true,
  answer: state,
  produces: [json],
  examples,
  handle: () => ok,
});

export const readyz = operation({
  method: 'get',
  path: '/readyz',
  operationId: 'readyz',
  summary: 'Whether calls can be answered',
  description: 'Asks the database; a 503 while it is away.',
  tag: 'Service',
  access: 'public',
  anyHost: true,
  answer: state,
  produces: [json],
  refuses: ['unavailable'],
  examples,
  handle: async ({ services }) => {
    await services.database.query('SELECT 1').catch(() => {
      throw new Refusal('unavailable', 'The database does not answer.');
    });
    return ok;
  },
});
