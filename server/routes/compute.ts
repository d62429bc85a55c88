import type { ZodType } from 'zod';
import type { Reply } from '../http/operation';
import type { Terms } from '../services/compute/compute-service';
import { type QuestionName, questionOf } from '../services/compute/questions';
import { exampleSystems } from './example-systems';

const json = 'application/json';
const csv = 'text/csv';

/** Media types of an answer that is a curve. */
export const curveForms = [json, csv];

interface Asked {
  readonly accepted: string;
  readonly signal: AbortSignal;
}

/** Where a call stands: who asks, how much it may cost, in which form the answer goes. */
export const computeTerms = (
  reader: string | undefined,
  mostCost: number,
  { accepted, signal }: Asked,
): Terms => ({ reader, mostCost, asCsv: accepted === csv, signal });

/** A finished body in the form agreed upon; a dry run is JSON always. */
export const computeReply = (body: Uint8Array, accepted: string, dryRun = false): Reply => ({
  type: accepted === csv && !dryRun ? `${csv}; charset=utf-8; header=present` : json,
  body,
});

/** Makes examples of a question: a body, and the answer that the engine gave to it. */
export const exampleOf =
  (name: QuestionName, schema: ZodType) => (summary: string, body: object) => {
    const { resolved, answer } = questionOf(name);
    return { summary, body, answer: answer(resolved(schema.parse(body), exampleSystems)) };
  };
