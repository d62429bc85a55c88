import type { FractionsRequestInput } from '../../../shared/fractions';
import { curveDigits, gridOf } from '../curve-grid';
import type { Choice } from '../curves-state';
import { systemOf } from '../curves-state';
import type { WrittenRequest } from './request-code';

/** The keyed call that gives the curve on the screen. */
export function curveRequest(choice: Choice, origin: string): WrittenRequest {
  const { name, fullyProtonatedCharge, pKa } = systemOf(choice);
  const body: FractionsRequestInput = {
    system: { ...(name === undefined ? {} : { name }), fullyProtonatedCharge, pKa },
    pH: gridOf(pKa),
    digits: curveDigits,
  };
  return { url: `${origin}/v1/fractions`, body };
}
