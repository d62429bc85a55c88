import type { FractionsRequestInput } from '../../../shared/fractions';
import { curveDigits, gridOf } from '../curve-grid';
import type { Choice } from '../curves-state';
import { givenConstants, systemAsked } from '../curves-state';
import type { WrittenRequest } from './request-code';

/** The keyed call that gives the curve on the screen. */
export function curveRequest(choice: Choice, origin: string): WrittenRequest {
  const body: FractionsRequestInput = {
    system: systemAsked(choice),
    pH: gridOf(givenConstants(choice)),
    digits: curveDigits,
  };
  return { url: `${origin}/v1/fractions`, body };
}
