import { z } from 'zod';
import { dryRunAnswer } from '../../shared/dry-run';
import { limits } from '../../shared/limits';
import { pHForFractionAnswer, pHForFractionRequest } from '../../shared/ph-for-fraction';
import { operation } from '../http/operation';
import { computeReply, computeTerms, exampleOf } from './compute';

const json = 'application/json';
const example = exampleOf('pHForFraction', pHForFractionRequest);

export const pHForFraction = operation({
  method: 'post',
  path: '/v1/ph-for-fraction',
  operationId: 'pHForFraction',
  summary: 'At which pH a species reaches a fraction',
  description:
    'One pH on each side of the species’ maximum, rising and falling; one for the outermost species. ' +
    '422 where the species never reaches the fraction, with the most that it reaches and where.',
  tag: 'Compute',
  access: { scope: 'compute' },
  callsPerMinute: limits.keyedCallsPerMinute,
  body: pHForFractionRequest,
  answer: z.union([pHForFractionAnswer, dryRunAnswer]),
  produces: [json],
  refuses: ['no-answer', 'over-limit'],
  examples: {
    dihydrogenPhosphate: example('Where 99 % of phosphate is H2PO4⁻', {
      system: { id: 'phosphoric-acid' },
      species: 1,
      fraction: '0.99',
      digits: 8,
    }),
  },
  handle: async ({ body, caller, services, ...asked }) => {
    const terms = computeTerms(caller.organizationId, limits.cost, asked);
    return computeReply(await services.compute.answer('pHForFraction', body, terms), json);
  },
});
