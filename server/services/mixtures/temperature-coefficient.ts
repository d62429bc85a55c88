import {
  debyeHuckel,
  equilibrium,
  henryExponent,
  ionProductExponent,
  kelvinOf,
  pKAtTemperature,
  significant,
  type Balance,
  type SystemInMedium,
} from '../../chem';
import { Exact } from '../../../shared/decimal';
import type { ConditionsUsed } from '../chemistry/conditions-used';
import type { SystemUsed } from '../chemistry/system-used';
import { type AtTemperature, balanceOf, decimalPower } from './balance-of';
import type { Contents, HeldContent } from './contents';
import { sumOf } from './exact';

/** Digits of the constants and of pH behind a difference. */
const precision = 30;
/** Steps of the difference, K: with both, what is left out is of the fourth order in them. */
const near = 0.1;
const far = 0.2;
/** Significant digits that the difference is good to. */
const mostDigits = 8;

type Number30 = ReturnType<typeof kelvinOf>;

/** How much a relation moves between two temperatures. */
const moved = (relation: (kelvin: Number30) => Number30, from: Number30, to: Number30): string =>
  relation(to).minus(relation(from)).toString();

/** Whether everything in the flask is known to move with temperature. */
function isKnown({ pairs, components }: Contents, used: readonly SystemUsed[]): boolean {
  const gases = components.filter((one): one is HeldContent => one.kind === 'held');
  return (
    pairs.length === 0 &&
    gases.every(({ henryConstant }) => henryConstant === undefined) &&
    used.every(({ system }) => system.steps.every(({ thermo }) => thermo !== null))
  );
}

interface Asked {
  readonly contents: Contents;
  readonly conditions: ConditionsUsed;
  readonly systems: readonly SystemUsed[];
  readonly at: AtTemperature;
  readonly digits: number;
}

/** The flask at a temperature beside its own: constants moved, what was weighed in the same. */
function balanceAt({ contents, conditions, systems, at }: Asked, by: number): Balance {
  const here = kelvinOf(conditions.temperature);
  const there = kelvinOf(new Exact(conditions.temperature).plus(by).toString());
  const shifted = ({ system, inMedium }: SystemUsed): SystemInMedium => ({
    ...inMedium,
    pKa: inMedium.pKa.map((pKa, i) => {
      const thermo = system.steps[i]?.thermo;
      if (!thermo) return pKa;
      const constant = {
        pK: new Exact(0),
        deltaH: new Exact(thermo.deltaH),
        deltaCp: new Exact(thermo.deltaCp),
      };
      return sumOf(
        pKa,
        moved((kelvin) => pKAtTemperature(precision, constant, kelvin), here, there),
      );
    }),
  });
  const [constantsHere, constantsThere] = [
    debyeHuckel(precision, here),
    debyeHuckel(precision, there),
  ];
  return balanceOf(contents, {
    pKw: sumOf(
      at.pKw,
      moved((kelvin) => ionProductExponent(precision, kelvin), here, there),
    ),
    activity: {
      ...at.activity,
      A: sumOf(at.activity.A, constantsThere.A.minus(constantsHere.A).toString()),
      B: sumOf(at.activity.B, constantsThere.B.minus(constantsHere.B).toString()),
    },
    systems: systems.map(shifted),
    henry: () => decimalPower(henryExponent(precision, there).negated(), precision),
  });
}

/**
 * dpH/dT of a mixture, 1/K, to at most 8 significant digits, by central differences of exact
 * solutions: (8 (pH₊₁ − pH₋₁) − (pH₊₂ − pH₋₂))/12h. Null where something in the flask is not known to
 * move with temperature, or where the caller gave constants of a printed source.
 */
export function temperatureCoefficient(asked: Asked): string | null {
  const { contents, conditions, systems, digits } = asked;
  const { pKw, activityConstants } = conditions.given;
  if (pKw !== undefined || activityConstants !== undefined || !isKnown(contents, systems)) {
    return null;
  }
  const pH = (by: number): Number30 | undefined => {
    const found = equilibrium(balanceAt(asked, by));
    const made = found.ok ? found.inDigits(precision - 4) : found;
    return made.ok ? new Exact(made.numbers.pH) : undefined;
  };
  const [ahead, behind, farAhead, farBehind] = [near, -near, far, -far].map(pH);
  if (!ahead || !behind || !farAhead || !farBehind) return null;
  const slope = ahead
    .minus(behind)
    .times(8)
    .minus(farAhead.minus(farBehind))
    .dividedBy(12 * near);
  return significant(Math.min(digits, mostDigits)).write(slope);
}
