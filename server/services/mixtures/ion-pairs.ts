import type { MixtureRequest } from '../../../shared/mixtures';
import { misfit } from '../chemistry/refuse';
import type { InertContent } from './inert-content';

/** A cation that pairs with hydroxide. */
export interface PairContent {
  readonly ion: string;
  readonly charge: number;
  readonly lgK: string;
  /** Whether it is ours, of 25 °C, and not the caller’s. */
  readonly isRecalled: boolean;
  readonly concentration: string;
}

/** lg K of CaOH⁺ at 25 °C and I = 0: common practice, recalled from critical tables. */
const knownPairs: ReadonlyMap<string, string> = new Map([['Ca^2+', '1.3']]);

/** The pairs of a mixture. Refused where their ions are not in it, or are no cations. */
export function pairsOf(
  ionPairs: MixtureRequest['ionPairs'],
  inert: readonly InertContent[],
): PairContent[] {
  return ionPairs.map(({ ion, lgK }, i) => {
    const pointer = `/ionPairs/${i}`;
    const present = inert.find(({ name }) => name === ion);
    if (!present) {
      throw misfit('no-such-ion', `${pointer}/ion`, `There is no ${ion} in the mixture.`);
    }
    if (present.charge < 0) {
      throw misfit('ion-charge', `${pointer}/ion`, 'An anion does not pair with hydroxide.');
    }
    if (ionPairs.findIndex((other) => other.ion === ion) !== i) {
      throw misfit('given-twice', `${pointer}/ion`, `The pair of ${ion} is given twice.`);
    }
    const constant = lgK ?? knownPairs.get(ion);
    if (constant === undefined) {
      const detail = 'Give lg K: it is known here of Ca^2+ alone.';
      throw misfit('missing', `${pointer}/lgK`, detail);
    }
    const { charge, concentration } = present;
    return { ion, charge, lgK: constant, isRecalled: lgK === undefined, concentration };
  });
}
