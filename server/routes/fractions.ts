import { z } from 'zod';
import {
  dryRunAnswer,
  fractionsAnswer,
  fractionsRequest,
  manyFractionsAnswer,
  publicFractionsRequest,
  type FractionsRequestInput,
  type FractionsRequest,
} from '../../shared/fractions';
import { limits } from '../../shared/limits';
import { operation, type Reply } from '../http/operation';
import { Refusal } from '../refusal';
import type { Services } from '../services';
import { answerFractions } from '../services/fractions/answer-fractions';
import { fractionsCost } from '../services/fractions/cost';

const json = 'application/json';
const csv = 'text/csv';

const answers = z.union([fractionsAnswer, manyFractionsAnswer, dryRunAnswer]);

function withinCost(request: FractionsRequest, most: number): void {
  const cost = fractionsCost(request);
  if (cost <= most) return;
  const detail = `Points × species × digits is ${cost}; one call may ask for ${most}.`;
  throw new Refusal('over-limit', detail, [{ pointer: '', code: 'cost-over-limit', detail }]);
}

async function reply(request: FractionsRequest, accepted: string, services: Services) {
  const asCsv = accepted === csv && !request.dryRun;
  const body = await services.compute.run(asCsv ? 'fractionsCsv' : 'fractions', request);
  const type = asCsv ? `${csv}; charset=utf-8; header=present` : json;
  return { type, body } satisfies Reply;
}

const example = (summary: string, body: FractionsRequestInput) => ({
  summary,
  body,
  answer: answerFractions(fractionsRequest.parse(body)),
});

const phosphoric = {
  name: 'phosphoric acid',
  fullyProtonatedCharge: 0,
  pKa: ['2.148', '7.198', '12.35'],
};
const tris = { name: 'tris', fullyProtonatedCharge: 1, pKa: ['8.072'] };

export const fractions = operation({
  method: 'post',
  path: '/v1/fractions',
  operationId: 'fractions',
  summary: 'Which protonation forms are present at a pH',
  description:
    'Fractions, neighbour ratios, mean charge and predominance of one system, or of up to 100, ' +
    'at one pH, a list, or a grid. Every digit is right: the exact value for the constants as ' +
    'given, rounded half to even. `Accept: text/csv` gives a line a system and pH.',
  tag: 'Compute',
  access: { scope: 'compute' },
  callsPerMinute: limits.keyedCallsPerMinute,
  body: fractionsRequest,
  answer: answers,
  produces: [json, csv],
  refuses: ['over-limit'],
  examples: {
    phosphoricAcid: example('Phosphoric acid at pH 7.4', {
      system: phosphoric,
      pH: '7.4',
      digits: 10,
    }),
    twoSystems: example('Two systems at two pH', {
      systems: [phosphoric, tris],
      pH: ['7.0', '7.4'],
      digits: 6,
    }),
    dryRun: example('What a curve would cost', {
      system: phosphoric,
      pH: { from: '0', to: '14', step: '0.01' },
      digits: 34,
      dryRun: true,
    }),
  },
  handle: ({ body, accepted, services }) => {
    withinCost(body, limits.cost);
    return reply(body, accepted, services);
  },
});

export const publicFractions = operation({
  method: 'post',
  path: '/v1/public/fractions',
  operationId: 'publicFractions',
  summary: 'The same for one system, without a key',
  description:
    'What the public Curves page calls: one system, a lower bound on cost, a limit on calls from ' +
    'each address. Pipelines use /v1/fractions.',
  tag: 'Compute',
  access: 'public',
  callsPerMinute: limits.publicCallsPerMinute,
  body: publicFractionsRequest,
  answer: fractionsAnswer,
  produces: [json, csv],
  refuses: ['over-limit'],
  examples: {
    phosphoricAcid: example('Phosphoric acid at pH 7.4', {
      system: phosphoric,
      pH: '7.4',
      digits: 10,
    }),
  },
  handle: ({ body, accepted, services }) => {
    const request = { ...body, dryRun: false };
    withinCost(request, limits.publicCost);
    return reply(request, accepted, services);
  },
});
