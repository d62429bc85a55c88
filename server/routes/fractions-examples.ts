import {
  fractionsQuery,
  fractionsRequest,
  type FractionsRequestInput,
} from '../../shared/fractions';
import type { z } from 'zod';
import { answerFractions } from '../services/fractions/answer-fractions';
import { resolved } from '../services/fractions/resolve';
import { exampleSystems } from './example-systems';

/** A body and the answer that the engine gave when the document was written. */
export const fractionsExample = (summary: string, body: FractionsRequestInput) => ({
  summary,
  body,
  answer: answerFractions(resolved(fractionsRequest.parse(body), exampleSystems)),
});

/** The one-line form of the same. */
export const oneLineExample = (
  summary: string,
  id: string,
  query: Record<keyof z.input<typeof fractionsQuery>, string>,
) => ({
  summary,
  params: { id },
  query,
  answer: fractionsExample(summary, { system: { id }, ...fractionsQuery.parse(query) }).answer,
});
