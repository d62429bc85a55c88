import { move } from 'piscina';
import { Refusal } from '../../refusal';
import { type QuestionName, questionOf } from './questions';

/** One question for a worker. */
export interface Work {
  readonly name: QuestionName;
  /** Resolved, as the question of that name has it. */
  readonly request: unknown;
  readonly asCsv: boolean;
}

/** A finished body, or why there is none: an error would lose its parts between threads. */
export type Worked = Uint8Array | { readonly refusal: Pick<Refusal, 'code' | 'detail' | 'errors'> };

/**
 * Runs in a worker thread. The answer is made into bytes here and handed over without a copy, so
 * that the event loop meets neither the maths nor the text of a large answer.
 */
export default function work({ name, request, asCsv }: Work): unknown {
  const { answer, csv } = questionOf(name);
  try {
    const text = asCsv && csv ? csv(request) : JSON.stringify(answer(request));
    return move(new TextEncoder().encode(text));
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    const { code, detail, errors } = error;
    return { refusal: { code, detail, errors } };
  }
}
