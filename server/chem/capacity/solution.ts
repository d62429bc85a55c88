import type { ActivityChoice } from '../activity/coefficients';
import { coefficientsOf } from '../activity/coefficients';
import { decimals } from '../decimals/arithmetic';
import { Exact } from '../decimals/contexts';
import { nth } from '../decimals/nth';
import { effectivePlaces } from '../forms/effective-system';
import type { AcidBaseSystem } from '../forms/system';

/** Water as a buffer: [H⁺] = 10^(hydrogen − pH), [OH⁻] = 10^(pH − hydroxide). */
export interface WaterExponents {
  readonly hydrogen: string;
  readonly hydroxide: string;
}

/** Systems with constants pK′ at their total concentrations, in water. */
export interface BufferSolution {
  readonly components: readonly {
    readonly system: AcidBaseSystem;
    /** mol/L. */
    readonly concentration: string;
  }[];
  readonly water: WaterExponents;
}

/** −lg γ(H⁺) and pKw + lg γ(OH⁻) at a given ionic strength, taken as exact from 150 places on. */
export function waterExponents(pKw: string, activity: ActivityChoice): WaterExponents {
  const ions = [
    { name: 'H^+', charge: 1 },
    { name: 'OH^-', charge: -1 },
  ];
  const { classOf, lgGamma } = coefficientsOf(ions, activity);
  const ofClass = lgGamma(decimals(effectivePlaces + 20), []);
  const lg = (ion: number) =>
    new Exact(nth(ofClass, nth(classOf, ion)).toDecimalPlaces(effectivePlaces));
  return { hydrogen: lg(0).negated().toFixed(), hydroxide: lg(1).plus(pKw).toFixed() };
}
