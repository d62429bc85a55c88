import { z } from 'zod';
import { dryRunAnswer } from '../../shared/dry-run';
import {
  fractionsAnswer,
  fractionsRequest,
  manyFractionsAnswer,
  publicFractionsRequest,
} from '../../shared/fractions';
import { limits } from '../../shared/limits';
import { operation } from '../http/operation';
import { computeReply, computeTerms, curveForms, exampleOf } from './compute';

const answers = z.union([fractionsAnswer, manyFractionsAnswer, dryRunAnswer]);

const example = exampleOf('fractions', fractionsRequest);

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
    'given, rounded half to even. A system is given in full, or by the id of a stored one, whose ' +
    'constants are then in `model`. `conditions` move thermodynamic constants to a temperature and an ' +
    'ionic strength (`effectivePKa`). `Accept: text/csv` gives a line a system and pH, numbers ' +
    'alone: ask for JSON, or a dry run, for the constants, their sources and the warnings.',
  tag: 'Compute',
  access: { scope: 'compute' },
  callsPerMinute: limits.keyedCallsPerMinute,
  body: fractionsRequest,
  answer: answers,
  produces: curveForms,
  refuses: ['no-answer', 'over-limit'],
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
    byId: example('A stored system by its id', {
      system: { id: 'carbonic-acid' },
      pH: '8.1',
      digits: 6,
    }),
    conditions: example('At 37 °C and I = 0.15 mol/L by Davies', {
      system: { id: 'phosphoric-acid' },
      pH: '7.4',
      conditions: { temperature: '37 °C', ionicStrength: '0.15', activityModel: 'davies' },
      digits: 8,
    }),
    dryRun: example('What a curve would cost', {
      system: phosphoric,
      pH: { from: '0', to: '14', step: '0.01' },
      digits: 34,
      dryRun: true,
    }),
  },
  handle: async ({ body, caller, services, ...asked }) => {
    const terms = computeTerms(caller.organizationId, limits.cost, asked);
    const answer = await services.compute.answer('fractions', body, terms);
    return computeReply(answer, asked.accepted, body.dryRun);
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
  produces: curveForms,
  refuses: ['no-answer', 'over-limit'],
  examples: {
    phosphoricAcid: example('Phosphoric acid at pH 7.4', {
      system: phosphoric,
      pH: '7.4',
      digits: 10,
    }),
  },
  handle: async ({ body, services, ...asked }) => {
    const terms = computeTerms(undefined, limits.publicCost, asked);
    const answer = await services.compute.answer('fractions', { ...body, dryRun: false }, terms);
    return computeReply(answer, asked.accepted);
  },
});
