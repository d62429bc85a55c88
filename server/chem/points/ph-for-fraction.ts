import type Decimal from 'decimal.js';
import { contextOf, Exact } from '../decimals/contexts';
import { refineRoot } from '../decimals/refine-root';
import { settleAll, significant } from '../decimals/settle-all';
import { factorsOf } from '../forms/composition';
import { fallingRoot, lostNearZero } from '../forms/doubles';
import { type AcidBaseSystem, constantsOf } from '../forms/system';
import { doubleOdds, oddsAt } from './odds';

/** One pH at which a species has the fraction asked for. */
interface FractionReached {
  readonly pH: string;
  readonly side: 'rising' | 'falling' | 'maximum';
}

/** Where a species has a fraction, or the most that it reaches and where. */
export type PHForFraction =
  | { readonly ok: true; readonly solutions: readonly FractionReached[] }
  | { readonly ok: false; readonly most: string; readonly pH: string };

interface Question {
  readonly system: AcidBaseSystem;
  /** Index of the species. */
  readonly species: number;
  /** Greater than 0, below 1. */
  readonly fraction: string;
  readonly digits: number;
}

/** Digits by which the greatest fraction is told from the one asked for. */
const tieDigits = 80;
/** Natural logarithm of the farthest 1/a(H⁺) that a search goes to. */
const farthest = 5000;

/** f/(1 − f) with so many digits. */
function oddsAsked({ fraction }: Question, precision: number): Decimal {
  const context = contextOf(precision);
  return new context(fraction).dividedBy(new context(new Exact(1).minus(fraction)));
}

type Side = FractionReached['side'];

/** 1/a(H⁺) where the odds are those asked for, or greatest. */
function solvedTo(
  question: Question,
  side: Side,
  lnU: number,
  accuracy: number,
  precision: number,
) {
  const factors = factorsOf(constantsOf(question.system), precision);
  const { context } = factors;
  const asked = oddsAsked(question, precision);
  const at = (u: Decimal) => oddsAt(factors, question.species, u);
  const found = refineRoot({
    context,
    start: new context(lnU).exp(),
    residual: (u) => (side === 'maximum' ? at(u).slope : at(u).odds.dividedBy(asked).minus(1)),
    slope: (u) => (side === 'maximum' ? -at(u).variance : Number(at(u).slope)),
    accuracy: accuracy - context.precision,
  });
  if (!found.ok) throw new RangeError('A fraction between 0 and its maximum got lost.');
  return { u: found.value, odds: at(found.value).odds, asked };
}

function refined(question: Question, lnU: number, side: Side): FractionReached {
  const { system, species, digits } = question;
  const { slope, variance } = doubleOdds(system, species)(lnU);
  const steepness = Math.max(1e-30, side === 'maximum' ? variance : Math.abs(slope));
  const loss = 8 + Math.ceil(Math.max(0, -Math.log10(steepness))) + lostNearZero(lnU);
  const [pH = ''] = settleAll({
    digits,
    loss,
    at: (precision) => {
      const { u } = solvedTo(question, side, lnU, loss - 5, precision);
      return [{ value: u.log(10), form: significant(digits) }];
    },
  });
  return { pH, side };
}

/** ln u where the odds change from more to fewer than asked for, walked from a start. */
function walk(question: Question, start: number, direction: 1 | -1): number {
  const odds = doubleOdds(question.system, question.species);
  const asked = Number(oddsAsked(question, 40).ln());
  const at = (x: number) => {
    const { odds: here, slope } = odds(start + direction * x);
    return { value: here - asked, slope: slope * direction };
  };
  let reach = 1;
  while (at(reach).value > 0 && reach < 2 * farthest) reach *= 2;
  return start + direction * fallingRoot(at, 0, reach);
}

/**
 * The pH at which α_i is the fraction f, to `digits` (1–60) significant digits. ln α_i is concave in
 * pH, so there is one on each side of the maximum: rising with pH and falling; one at the maximum
 * itself; or none. The outermost species have one.
 */
export function pHForFraction(question: Question): PHForFraction {
  const { system, species } = question;
  if (species === 0) {
    const lnU = walk(question, -farthest, 1);
    return { ok: true, solutions: [refined(question, lnU, 'falling')] };
  }
  if (species === system.pKa.length) {
    const lnU = walk(question, farthest, -1);
    return { ok: true, solutions: [refined(question, lnU, 'rising')] };
  }
  const odds = doubleOdds(system, species);
  const top = fallingRoot(
    (lnU) => ({ value: odds(lnU).slope, slope: -odds(lnU).variance }),
    -farthest,
    farthest,
  );
  const best = solvedTo(question, 'maximum', top, 10, tieDigits + 60);
  const difference = best.odds.dividedBy(best.asked).minus(1);
  if (difference.abs().lessThan(`1e-${tieDigits}`)) {
    return { ok: true, solutions: [refined(question, top, 'maximum')] };
  }
  if (difference.isNegative()) {
    const most = best.odds.dividedBy(best.odds.plus(1));
    return { ok: false, most: significant(6).write(most), pH: (top / Math.LN10).toFixed(3) };
  }
  return {
    ok: true,
    solutions: [
      refined(question, walk(question, top, -1), 'rising'),
      refined(question, walk(question, top, 1), 'falling'),
    ],
  };
}
