import { z } from 'zod';
import {
  bufferCapacityAnswer,
  bufferCapacityRequest,
  publicBufferCapacityRequest,
} from '../../shared/buffer-capacity';
import { dryRunAnswer } from '../../shared/dry-run';
import { limits } from '../../shared/limits';
import { operation } from '../http/operation';
import { computeReply, computeTerms, curveForms, exampleOf } from './compute';

const example = exampleOf('bufferCapacity', bufferCapacityRequest);

const phosphate = example('50 mmol/L phosphate at I = 0.15 mol/L', {
  components: [{ system: { id: 'phosphoric-acid' }, concentration: '50 mmol/L' }],
  pH: ['6.8', '7.4'],
  conditions: { ionicStrength: '0.15' },
  digits: 8,
});

export const bufferCapacity = operation({
  method: 'post',
  path: '/v1/buffer-capacity',
  operationId: 'bufferCapacity',
  summary: 'How strongly a mixture buffers',
  description:
    'Buffer capacity β = dQ/dpH at constant ionic strength: ln 10 ([H⁺] + [OH⁻] + Σ c v), v the ' +
    'variance of the protons lost (Van Slyke 1922), of the whole and of each part, with its local ' +
    'maxima. Ideal at I = 0 unless `conditions` say otherwise. `Accept: text/csv` gives a line a pH.',
  tag: 'Compute',
  access: { scope: 'compute' },
  callsPerMinute: limits.keyedCallsPerMinute,
  body: bufferCapacityRequest,
  answer: z.union([bufferCapacityAnswer, dryRunAnswer]),
  produces: curveForms,
  refuses: ['no-answer', 'over-limit'],
  examples: {
    phosphate,
    water: example('Water alone', { components: [], pH: '7', digits: 10 }),
  },
  handle: async ({ body, caller, services, ...asked }) => {
    const terms = computeTerms(caller.organizationId, limits.cost, asked);
    const answer = await services.compute.answer('bufferCapacity', body, terms);
    return computeReply(answer, asked.accepted, body.dryRun);
  },
});

export const publicBufferCapacity = operation({
  method: 'post',
  path: '/v1/public/buffer-capacity',
  operationId: 'publicBufferCapacity',
  summary: 'The same, without a key',
  description:
    'What the public pages call: a lower bound on cost. Pipelines use /v1/buffer-capacity.',
  tag: 'Compute',
  access: 'public',
  callsPerMinute: limits.publicCallsPerMinute,
  body: publicBufferCapacityRequest,
  answer: bufferCapacityAnswer,
  produces: curveForms,
  refuses: ['no-answer', 'over-limit'],
  examples: { phosphate },
  handle: async ({ body, services, ...asked }) => {
    const terms = computeTerms(undefined, limits.publicCost, asked);
    const answer = await services.compute.answer('bufferCapacity', body, terms);
    return computeReply(answer, asked.accepted);
  },
});
