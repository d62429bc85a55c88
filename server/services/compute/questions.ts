import type { Question } from './question';
import { answerFractions } from '../fractions/answer-fractions';
import { fractionsCost } from '../fractions/cost';
import { fractionsCsv } from '../fractions/fractions-csv';
import { resolved, systemsAsked } from '../fractions/resolve';
import { bufferCapacityQuestion } from '../capacity/question';
import { isoelectricPointQuestion } from '../isoelectric-point/question';
import { mixtureQuestion } from '../mixtures/question';
import { pHForFractionQuestion } from '../ph-for-fraction/question';

/** Everything that can be asked of the engine. */
export const questions = {
  fractions: {
    systemsOf: systemsAsked,
    resolved,
    cost: fractionsCost,
    answer: answerFractions,
    csv: fractionsCsv,
  },
  bufferCapacity: bufferCapacityQuestion,
  isoelectricPoint: isoelectricPointQuestion,
  pHForFraction: pHForFractionQuestion,
  mixture: mixtureQuestion,
} as const;

export type QuestionName = keyof typeof questions;
export type RequestOf<Name extends QuestionName> = Parameters<
  (typeof questions)[Name]['systemsOf']
>[0];

/**
 * A question by its name. A name and its request travel apart, to a worker and back; where they meet
 * again the compiler knows neither’s type.
 */
export const questionOf = (name: QuestionName): Question<unknown, unknown> =>
  questions[name] as unknown as Question<unknown, unknown>;
