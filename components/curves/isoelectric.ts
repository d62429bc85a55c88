import { endCharges, type DrawnCurve } from './drawn-curve';

/**
 * Why a system has no isoelectric point: its charge keeps one sign, as its forms alone show.
 * Undefined where the mean charge passes zero.
 */
export function whyNoPoint(drawn: DrawnCurve): string | undefined {
  const [first, last] = endCharges(drawn);
  if (first <= 0) return 'charge ≤ 0';
  if (last >= 0) return 'charge ≥ 0';
  return undefined;
}
