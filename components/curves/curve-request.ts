import type { FractionsRequestInput } from '../../shared/fractions';
import { curveDigits, gridOf } from './curve-grid';
import { systemAsked, type Choice } from '../constants/choice';
import type { WrittenRequest } from '../request/request-code';
import { givenConstants } from './curves-state';

/** The keyed call that gives the curve on the screen. */
export function curveRequest(choice: Choice, origin: string): WrittenRequest {
  const body: FractionsRequestInput = {
    system: systemAsked(choice),
    pH: gridOf(givenConstants(choice)),
    digits: curveDigits,
  };
  return { url: `${origin}/v1/fractions`, body, result: 'curve' };
}
