import { Exact } from '../../shared/decimal';
import { chargeOf } from './salt-formula';

/** The ion that a form is weighed in with where nothing is said, as the contract has it. */
export const usualCounterIon = (charge: number) => (charge < 0 ? 'Na^+' : 'Cl^-');

/** The counter-ion that a form of this charge has: the one chosen, where it is of the other sign. */
export const counterIonOf = (charge: number, chosen: string | undefined) =>
  chosen !== undefined && chargeOf(chosen) * charge < 0 ? chosen : usualCounterIon(charge);

/**
 * Ammonium gives up protons itself. A salt of it is asked for as what it is made of, ammonia and
 * the uncharged acid: the composition is the same, and nothing of it is left out.
 */
export const ammonium = 'NH4^+';

const cations = ['Na^+', 'K^+', 'Li^+', ammonium, 'Mg^2+', 'Ca^2+'] as const;
const anions = ['Cl^-', 'Br^-', 'NO3^-', 'ClO4^-'] as const;

/** Ions that a form of this charge may be weighed in with. */
export function counterIonsFor(charge: number, hasUncharged: boolean): readonly string[] {
  if (charge > 0) return anions;
  return hasUncharged ? cations : cations.filter((ion) => ion !== ammonium);
}

const digits = 6;

/** What a form brings of its counter-ion, mol/L, with the places its own concentration has. */
export function broughtOf(charge: number, counterIon: string, concentration: string): string {
  const given = new Exact(concentration);
  const amount = given.times(Math.abs(charge)).dividedBy(Math.abs(chargeOf(counterIon)));
  const places = Math.max(given.decimalPlaces(), placesOf(concentration));
  return amount.decimalPlaces() <= places
    ? amount.toFixed(places)
    : amount.toSignificantDigits(digits).toFixed();
}

/** Places after the point as written, trailing zeros counted. */
const placesOf = (text: string) => /\.(\d+)$/.exec(text)?.[1]?.length ?? 0;
