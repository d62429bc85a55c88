import type Decimal from 'decimal.js';
import { contextOf } from '../decimals/contexts';
import { nth } from '../decimals/nth';
import { refineRoot } from '../decimals/refine-root';
import { settleAll, significant } from '../decimals/settle-all';
import { allTermsOf } from '../forms/composition';
import {
  doubleFractions,
  doubleSystem,
  fallingRoot,
  lnOfTen,
  lostNearZero,
  moments,
} from '../forms/doubles';
import { capacityAt, capacityLoss, preparedAt } from './capacity-at';
import type { BufferSolution } from './solution';

/** A local maximum of the buffer capacity. */
export interface CapacityMaximum {
  pH: string;
  /** mol/L per pH. */
  total: string;
}

/** Steps of the search, pH: a sixth of the width of the narrowest peak that 64 protons can make. */
const searchStep = 0.01;
/** Where the derivative is this small a part of what it is made of, two peaks may be about to part. */
const nearlyLevel = 3e-3;
const finerSteps = 25;
/** Beyond the constants by this much, pH, the capacity of a system only falls. */
const beyond = 3;
const searched = { from: -20, to: 40 };

/** Third central moment from moments about any number. */
const thirdCentral = ([first, second, third]: readonly [number, number, number]) =>
  third - 3 * first * second + 2 * first ** 3;

/** d(β/ln 10)/d ln u in doubles, and the sum of its absolute parts. */
function doubleDerivative({ components, water }: BufferSolution) {
  const parts = components.map(({ system, concentration }) => ({
    system: doubleSystem(system.pKa.map(Number)),
    concentration: Number(concentration),
  }));
  return (lnU: number) => {
    const hydrogen = Math.exp(Number(water.hydrogen) * lnOfTen - lnU);
    const hydroxide = Math.exp(lnU - Number(water.hydroxide) * lnOfTen);
    let value = hydroxide - hydrogen;
    let scale = hydroxide + hydrogen;
    for (const { system, concentration } of parts) {
      const fractions = doubleFractions(system, lnU);
      const mode = fractions.indexOf(Math.max(...fractions));
      const about = moments(fractions, mode);
      value += concentration * thirdCentral(about);
      scale += concentration * about.reduce((sum, one) => sum + Math.abs(one), 0);
    }
    return { value, scale };
  };
}

/** The same in decimals. */
function derivative(solution: BufferSolution, precision: number) {
  const { context, hydrogen, hydroxide, parts } = preparedAt(solution, precision);
  return (u: Decimal): Decimal =>
    parts.reduce(
      (all, { factors, concentration }) => {
        const terms = allTermsOf(factors, u);
        const sum = terms.reduce((total, term) => total.plus(term));
        const mode = terms.reduce(
          (most, one, j) => (one.greaterThan(nth(terms, most)) ? j : most),
          0,
        );
        const moment = (power: number) =>
          terms
            .reduce((total, term, j) => total.plus(term.times((j - mode) ** power)), new context(0))
            .dividedBy(sum);
        const [first, second, third] = [moment(1), moment(2), moment(3)];
        const central = third
          .minus(first.times(second).times(3))
          .plus(first.times(first).times(first).times(2));
        return all.plus(central.times(concentration));
      },
      hydroxide.times(u).minus(hydrogen.dividedBy(u)),
    );
}

/** Where the capacity turns from rising to falling, ln u in doubles. */
function turns(solution: BufferSolution): number[] {
  const constants = solution.components.flatMap(({ system }) => system.pKa.map(Number));
  if (constants.length === 0) return [];
  const from = Math.max(searched.from, Math.min(...constants) - beyond);
  const to = Math.min(searched.to, Math.max(...constants) + beyond);
  const at = doubleDerivative(solution);
  const h = 1e-5;
  const slope = (x: number) => (at(x + h).value - at(x - h).value) / (2 * h);
  const falling = (x: number) => ({ value: at(x).value, slope: slope(x) });
  const pointAt = (pH: number) => ({ pH, ...at(pH * lnOfTen) });
  const level = ({ value, scale }: { value: number; scale: number }) =>
    Math.abs(value) < nearlyLevel * scale;
  const found: number[] = [];
  let last = pointAt(from);
  for (let i = 1; from + i * searchStep <= to; i++) {
    const end = pointAt(from + i * searchStep);
    const start = last.pH;
    const pieces = level(last) || level(end) ? finerSteps : 1;
    for (let k = 1; k <= pieces; k++) {
      const here = k === pieces ? end : pointAt(start + (k / pieces) * searchStep);
      if (last.value > 0 && here.value <= 0) {
        found.push(fallingRoot(falling, last.pH * lnOfTen, here.pH * lnOfTen));
      }
      last = here;
    }
  }
  return found;
}

/**
 * Local maxima of the total buffer capacity from pH −20 to 40, in order: pH and capacity to `digits`
 * (1–60) significant digits. A lone monoprotic system peaks at pK′, at 0.576 c (Van Slyke 1922).
 */
export function capacityMaxima(solution: BufferSolution, digits: number): CapacityMaximum[] {
  const at = doubleDerivative(solution);
  const form = significant(digits);
  return turns(solution).flatMap((lnU) => {
    const h = 1e-4;
    const slope = (at(lnU + h).value - at(lnU - h).value) / (2 * h);
    const cancelling = Math.log10(at(lnU).scale / Math.abs(slope));
    // Where the capacity is as good as level, its greatest value has no place of its own.
    if (!(slope < 0) || cancelling > 40) return [];
    const loss = capacityLoss(solution) + Math.max(0, Math.ceil(cancelling)) + lostNearZero(lnU);
    const [pH = '', total = ''] = settleAll({
      digits,
      loss,
      at: (precision) => {
        const context = contextOf(precision);
        const refined = refineRoot({
          context,
          start: new context(lnU).exp(),
          residual: derivative(solution, precision),
          slope: () => slope,
          accuracy: loss - 4 - context.precision,
        });
        if (!refined.ok) throw new RangeError('A maximum of the capacity got lost.');
        const { total: capacity } = capacityAt(solution, precision)(refined.value);
        return [refined.value.log(10), capacity].map((value) => ({ value, form }));
      },
    });
    return [{ pH, total }];
  });
}
