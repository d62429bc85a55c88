import type { PublicBufferCapacityRequestInput } from '../../shared/buffer-capacity';
import type { PublicIsoelectricPointRequestInput } from '../../shared/isoelectric-point';
import { systemAsked } from '../constants/choice';
import type { CurveAsked } from './curve-asked';
import { conditionsAsked } from './curve-conditions';
import { curveDigits, type CurveGrid } from './curve-grid';

/** The body of the call for the capacity of one curve's system at a total, mol/L. */
export const capacityBody = (
  { choice, conditions }: CurveAsked,
  total: string,
  pH: CurveGrid,
): PublicBufferCapacityRequestInput => ({
  components: [{ system: systemAsked(choice), concentration: total }],
  pH,
  ...conditionsAsked(conditions),
  digits: curveDigits,
});

/** The body of the call for the isoelectric point of one curve's system. */
export const pointBody = ({
  choice,
  conditions,
}: CurveAsked): PublicIsoelectricPointRequestInput => ({
  system: systemAsked(choice),
  ...conditionsAsked(conditions),
  digits: curveDigits,
});
