import { type Arithmetic, sum } from '../decimals/arithmetic';
import { nth } from '../decimals/nth';
import type { Ion } from './ion';

/** I = ½ Σ z² m over a list of ions and their molalities (or concentrations) in the same order. */
export function ionicStrength<N>(
  arithmetic: Arithmetic<N>,
  ions: readonly Ion[],
  molalities: readonly N[],
): N {
  const { of, times } = arithmetic;
  const terms = ions.map(({ charge }, i) => times(of(charge ** 2), nth(molalities, i)));
  return times(of('0.5'), sum(arithmetic, terms));
}
