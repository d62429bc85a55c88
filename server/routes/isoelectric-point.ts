import { z } from 'zod';
import { dryRunAnswer } from '../../shared/dry-run';
import {
  isoelectricPointAnswer,
  isoelectricPointRequest,
  publicIsoelectricPointRequest,
} from '../../shared/isoelectric-point';
import { limits } from '../../shared/limits';
import { operation } from '../http/operation';
import { computeReply, computeTerms, exampleOf } from './compute';

const json = 'application/json';
const example = exampleOf('isoelectricPoint', isoelectricPointRequest);

const lysine = example('Lysine', {
  system: { name: 'lysine', fullyProtonatedCharge: 2, pKa: ['2.16', '9.06', '10.54'] },
  digits: 10,
});

export const isoelectricPoint = operation({
  method: 'post',
  path: '/v1/isoelectric-point',
  operationId: 'isoelectricPoint',
  summary: 'Where a system carries no net charge',
  description:
    'The pH at which the mean charge is zero, its slope and the species there; with a ' +
    'concentration also the isoionic point, the pH of the pure ampholyte in water (by Davies and ' +
    'self-consistent unless `conditions` say otherwise). 422 where the charge never changes sign.',
  tag: 'Compute',
  access: { scope: 'compute' },
  callsPerMinute: limits.keyedCallsPerMinute,
  body: isoelectricPointRequest,
  answer: z.union([isoelectricPointAnswer, dryRunAnswer]),
  produces: [json],
  refuses: ['no-answer', 'over-limit'],
  examples: {
    lysine,
    isoionic: example('Glycine at 0.1 mol/L', {
      system: { id: 'glycine' },
      concentration: '0.1',
      digits: 10,
    }),
  },
  handle: async ({ body, caller, services, ...asked }) => {
    const terms = computeTerms(caller.organizationId, limits.cost, asked);
    const answer = await services.compute.answer('isoelectricPoint', body, terms);
    return computeReply(answer, asked.accepted);
  },
});

export const publicIsoelectricPoint = operation({
  method: 'post',
  path: '/v1/public/isoelectric-point',
  operationId: 'publicIsoelectricPoint',
  summary: 'The same, without a key',
  description:
    'What the public pages call: a lower bound on cost. Pipelines use /v1/isoelectric-point.',
  tag: 'Compute',
  access: 'public',
  callsPerMinute: limits.publicCallsPerMinute,
  body: publicIsoelectricPointRequest,
  answer: isoelectricPointAnswer,
  produces: [json],
  refuses: ['no-answer', 'over-limit'],
  examples: { lysine },
  handle: async ({ body, services, ...asked }) => {
    const terms = computeTerms(undefined, limits.publicCost, asked);
    return computeReply(await services.compute.answer('isoelectricPoint', body, terms), json);
  },
});
