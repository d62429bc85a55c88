import { z } from 'zod';
import { dryRunAnswer } from '../../shared/dry-run';
import { limits } from '../../shared/limits';
import { mixtureAnswer, mixtureRequest, publicMixtureRequest } from '../../shared/mixtures';
import { operation } from '../http/operation';
import { computeReply, computeTerms, exampleOf } from './compute';

const json = 'application/json';
const example = exampleOf('mixture', mixtureRequest);

const phosphate = example('The equimolal phosphate reference buffer', {
  components: [
    { system: { id: 'phosphoric-acid' }, concentration: '0.025', form: 1, counterIon: 'K+' },
    { system: { id: 'phosphoric-acid' }, concentration: '0.025', form: 2, counterIon: 'Na+' },
  ],
  conditions: { basis: 'mol/kg' },
  digits: 8,
});

const cautions =
  'A predicted pH is an estimate: calibrate the meter, measure, adjust. Follow the safety data ' +
  'sheets and the local chemical-hygiene plan when you make what was computed.';

export const mixtures = operation({
  method: 'post',
  path: '/v1/mixtures',
  operationId: 'mixture',
  summary: 'What pH a mixture will have',
  description:
    'The charge balance of everything in the flask, with activity coefficients by the model of ' +
    '`conditions` (Davies at the mixture’s own ionic strength where nothing is said): pH, ionic ' +
    'strength, buffer capacity, every species, dpH/dT, and which shortcut of the trade would have ' +
    'been off by how much. Components enter as the form weighed in, with their counter-ion, or are ' +
    `held by a gas phase. ${cautions}`,
  tag: 'Compute',
  access: { scope: 'compute' },
  callsPerMinute: limits.keyedCallsPerMinute,
  body: mixtureRequest,
  answer: z.union([mixtureAnswer, dryRunAnswer]),
  produces: [json],
  refuses: ['no-answer', 'over-limit'],
  examples: {
    phosphate,
    bySpecificInteraction: example('The same by specific ion interaction', {
      ...phosphate.body,
      conditions: { activityModel: 'specific-ion-interaction', basis: 'mol/kg' },
    }),
    rain: example('Water open to the air', {
      components: [{ system: { id: 'carbonic-acid' }, heldBy: { partialPressure: '0.00042 atm' } }],
      digits: 6,
    }),
    limeWater: example('Saturated calcium hydroxide with its ion pair', {
      ions: [{ charge: 2, concentration: '0.0203', ion: 'Ca2+' }],
      ionPairs: [{ ion: 'Ca2+' }],
      digits: 6,
    }),
  },
  handle: async ({ body, caller, services, ...asked }) => {
    const terms = computeTerms(caller.organizationId, limits.cost, asked);
    return computeReply(await services.compute.answer('mixture', body, terms), json);
  },
});

export const publicMixtures = operation({
  method: 'post',
  path: '/v1/public/mixtures',
  operationId: 'publicMixture',
  summary: 'The same, without a key',
  description:
    'What the public Mixture page calls: a lower bound on cost. Pipelines use /v1/mixtures.',
  tag: 'Compute',
  access: 'public',
  callsPerMinute: limits.publicCallsPerMinute,
  body: publicMixtureRequest,
  answer: mixtureAnswer,
  produces: [json],
  refuses: ['no-answer', 'over-limit'],
  examples: { phosphate },
  handle: async ({ body, services, ...asked }) => {
    const terms = computeTerms(undefined, limits.publicCost, asked);
    return computeReply(await services.compute.answer('mixture', body, terms), json);
  },
});
