import { answerFractions } from '../fractions/answer-fractions';
import { fractionsCsv } from '../fractions/fractions-csv';
import type { ResolvedRequest } from '../fractions/resolve';

/** What the workers can do: a request in, the finished body of the answer out. */
export const tasks = {
  fractions: (request: ResolvedRequest) => JSON.stringify(answerFractions(request)),
  fractionsCsv,
};

export type TaskName = keyof typeof tasks;
export type TaskRequest<Name extends TaskName> = Parameters<(typeof tasks)[Name]>[0];
