import { costOf } from '../../../shared/limits';
import { pointCount } from '../../../shared/ph';
import type { ResolvedSystem } from '../chemistry/resolved-system';
import type { ResolvedRequest } from './resolve';

/** The systems of a request, one or many. */
export const systemsOf = (request: ResolvedRequest): readonly ResolvedSystem[] =>
  request.system === undefined ? (request.systems ?? []) : [request.system];

/** The work of a call, summed over its systems. */
export const fractionsCost = (request: ResolvedRequest): number =>
  systemsOf(request)
    .map(({ pKa }) => costOf(pointCount(request.pH), pKa.length + 1, request.digits))
    .reduce((sum, cost) => sum + cost, 0);
