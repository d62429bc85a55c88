import type { FractionsRequest } from '../../../shared/fractions';
import { costOf } from '../../../shared/limits';
import { pointCount } from '../../../shared/ph';
import type { SystemInFull } from '../../../shared/system';

/** The systems of a request, one or many. */
export const systemsOf = (request: FractionsRequest): readonly SystemInFull[] =>
  request.system === undefined ? (request.systems ?? []) : [request.system];

/** Digits to be made right: points × species × digits, summed over the systems. */
export const fractionsCost = (request: FractionsRequest): number =>
  systemsOf(request)
    .map(({ pKa }) => costOf(pointCount(request.pH), pKa.length + 1, request.digits))
    .reduce((sum, cost) => sum + cost, 0);
