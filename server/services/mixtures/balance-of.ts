import {
  type Acid,
  type ActivityChoice,
  type Balance,
  decimals,
  henryExponent,
  kelvinOf,
  type SystemInMedium,
} from '../../chem';
import type { Content, Contents, HeldContent } from './contents';
import { differenceOf, quotient, times } from './exact';

/** What the temperature gives a balance. */
export interface AtTemperature {
  readonly pKw: string;
  readonly activity: ActivityChoice;
  /** The systems of the components, constants moved. */
  readonly systems: readonly SystemInMedium[];
  /** Solubility of what a gas holds, mol/(kg atm). */
  readonly henry: (held: HeldContent) => string;
}

/** Pascal in an atmosphere. */
const atmosphere = '101325';

/** 10^x to so many significant digits. */
export const decimalPower = (x: ReturnType<typeof kelvinOf>, digits: number): string =>
  decimals(digits + 10)
    .powerOfTen(x)
    .toPrecision(digits);

/** Solubility of carbon dioxide, to six significant digits: taken as exact from there on. */
export const henryConstantAt = (celsius: string): string =>
  decimalPower(henryExponent(20, kelvinOf(celsius)).negated(), 6);

function acidOf(content: Content, system: SystemInMedium, henry: AtTemperature['henry']): Acid {
  const { pKa, kinds, species } = system;
  const amount =
    content.kind === 'weighed'
      ? content.isHeld
        ? '0'
        : content.concentration
      : quotient(times(henry(content), content.partialPressure), atmosphere);
  return {
    pKa,
    kinds,
    species,
    reference: content.form,
    amount,
    held: content.kind === 'held',
  };
}

/** "Ca^2+" with a hydroxide: "CaOH^+". */
export function pairName(ion: string, charge: number): string {
  const body = ion.slice(0, ion.indexOf('^'));
  const left = charge - 1;
  return left === 0 ? `${body}OH` : `${body}OH^${left === 1 ? '' : left}+`;
}

/** The charge balance of a flask. A cation that pairs with hydroxide is an acid: pK = pKw − lg K. */
export function balanceOf(contents: Contents, at: AtTemperature): Balance {
  const acids = contents.components.map((content, i) => {
    const system = at.systems[i];
    if (!system) throw new RangeError(`No system of component ${i}.`);
    return acidOf(content, system, at.henry);
  });
  const pairs = contents.pairs.map(({ ion, charge, lgK, concentration }): Acid => ({
    pKa: [differenceOf(at.pKw, lgK)],
    kinds: ['thermodynamic'],
    species: [
      { name: ion, charge },
      { name: pairName(ion, charge), charge: charge - 1 },
    ],
    reference: 0,
    amount: concentration,
    held: false,
  }));
  return {
    acids: [...acids, ...pairs],
    inert: contents.inert.map(({ name, charge, concentration }) => ({
      ion: { name, charge },
      concentration,
    })),
    pKw: at.pKw,
    activity: at.activity,
  };
}
