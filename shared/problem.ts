import { z } from 'zod';

/** RFC 9457 problem types: the last part of `type`, its status, its title. */
export const problemTypes = {
  'malformed-json': [400, 'The body is not valid JSON'],
  'invalid-request': [400, 'The request does not fit the contract'],
  'credential-missing': [401, 'A key is needed'],
  'credential-malformed': [401, 'The key is not written as one of ours'],
  'credential-invalid': [401, 'The key is not valid'],
  'sign-in-needed': [401, 'Nobody is signed in'],
  'sign-in-refused': [401, 'Signing in did not work'],
  'origin-refused': [403, 'The request did not come from our own pages'],
  'role-insufficient': [403, 'Your role may not do this'],
  'scope-insufficient': [403, 'The key may not do this'],
  'not-found': [404, 'There is nothing at this address'],
  'method-not-allowed': [405, 'This address does not take that method'],
  'not-acceptable': [406, 'The answer cannot be given in that form'],
  'body-too-large': [413, 'The body is too large'],
  'unsupported-media-type': [415, 'The body is not JSON'],
  'misdirected-request': [421, 'The service is not at that host'],
  'no-answer': [422, 'The chemistry has no such answer'],
  'over-limit': [422, 'The call asks for more than one call may'],
  'too-many-requests': [429, 'Too many calls'],
  internal: [500, 'Something went wrong here'],
  unavailable: [503, 'The service cannot answer at the moment'],
} as const satisfies Record<string, readonly [status: number, title: string]>;

export type ProblemName = keyof typeof problemTypes;

/** One fault in a request. */
export const fault = z
  .strictObject({
    pointer: z.string().meta({
      description:
        'JSON Pointer to the fault in the body, empty for the whole of it; `?name` for a query parameter.',
      example: '/system/pKa/1',
    }),
    code: z.string().meta({ description: 'Stable name.', example: 'decimal-must-be-string' }),
    detail: z.string().meta({
      description: 'What to do.',
      example: 'Write this decimal as a string: a JSON number would lose digits silently.',
    }),
  })
  .meta({ id: 'Fault', description: 'One fault in a request.' });

export const problem = z
  .strictObject({
    type: z.string().meta({
      description: 'Absolute URI that opens a page about this kind of problem.',
      example: 'http://localhost:8080/problems/invalid-request',
    }),
    title: z.string().meta({
      description: 'The kind in words.',
      example: 'The request does not fit the contract',
    }),
    status: z.int().meta({ description: 'HTTP status.', example: 400 }),
    detail: z.string().optional().meta({
      description: 'This occurrence in words.',
      example: '1 field is not as the contract has it.',
    }),
    requestId: z.string().meta({
      description: 'Identifies the call in our logs.',
      example: '0b7c1a52-8f0e-4c57-9f0f-5f7a4a1f2c11',
    }),
    errors: z.array(fault).optional().meta({ description: 'Faults, field by field.' }),
  })
  .meta({ id: 'Problem', description: 'A problem after RFC 9457.' });

export type Fault = z.infer<typeof fault>;
export type Problem = z.infer<typeof problem>;
