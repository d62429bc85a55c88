import type { FractionsRequestInput } from '../../shared/fractions';
import { systemAsked } from '../constants/choice';
import type { WrittenRequest } from '../request/request-code';
import { givenConstants, type CurveAsked } from './curve-asked';
import { conditionsAsked } from './curve-conditions';
import { curveDigits, gridOf, type CurveGrid } from './curve-grid';

/** The body of the call for one curve. */
export const curveBody = ({ choice, conditions }: CurveAsked, grid: CurveGrid) =>
  ({
    system: systemAsked(choice),
    pH: grid,
    ...conditionsAsked(conditions),
    digits: curveDigits,
  }) satisfies FractionsRequestInput;

/** The keyed call that gives a curve, over the grid that it is drawn over once that is known. */
export function curveRequest(
  asked: CurveAsked,
  origin: string,
  grid = gridOf(givenConstants(asked.choice)),
): WrittenRequest {
  return { url: `${origin}/v1/fractions`, body: curveBody(asked, grid), result: 'curve' };
}
