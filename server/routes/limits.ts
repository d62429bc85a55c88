import { limitsAnswer, limitsInForce } from '../../shared/limits-answer';
import { operation } from '../http/operation';

const body = JSON.stringify(limitsInForce);

export const limits = operation({
  method: 'get',
  path: '/v1/limits',
  operationId: 'limits',
  summary: 'What one call may ask for',
  description: 'The limits in force, and how cost and compute units are counted.',
  tag: 'Service',
  access: 'public',
  answer: limitsAnswer,
  produces: ['application/json'],
  examples: { limits: { summary: 'The limits in force', answer: limitsInForce } },
  handle: () => ({
    type: 'application/json',
    body,
    headers: { 'Cache-Control': 'public, max-age=300' },
  }),
});
