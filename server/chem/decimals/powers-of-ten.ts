import type Decimal from 'decimal.js';
import { type Context, contextApart } from './contexts';

/** Digits beyond the context's own in which its constants are made, before one last rounding. */
const spare = 4;

/** 10^(d·10^−k) for d = 1…9 at one decimal place k, and the root they are powers of. */
interface Place {
  readonly root: Decimal;
  readonly constants: readonly Decimal[];
}

/**
 * The tenth root of a > 1 by Newton's iteration x ← x (9 + a/x¹⁰)/10 from x = (9 + a)/10. The start
 * lies above the root (Bernoulli's inequality) and f is convex, so x falls until rounding stops it.
 * A step's own rounding is at most 3u, because a/x¹⁰ enters with a tenth of its weight; where x no
 * longer falls, its relative error is below 4u.
 */
export function tenthRoot(a: Decimal): Decimal {
  let x = a.plus(9).times('0.1');
  for (;;) {
    const square = x.times(x);
    const fifth = square.times(square).times(x);
    const next = a.dividedBy(fifth.times(fifth)).plus(9).times(x).times('0.1');
    if (!next.lessThan(x)) return x;
    x = next;
  }
}

/** The table of a context, filled one decimal place after the other as exponents need them. */
class PowerTable {
  private readonly wide: Context;
  private readonly places: Place[] = [];

  constructor(private readonly context: Context) {
    this.wide = contextApart(context.precision + spare);
  }

  constant(place: number, digit: number): Decimal {
    while (this.places.length < place) this.places.push(this.nextPlace());
    const constant = this.places[place - 1]?.constants[digit - 1];
    if (constant === undefined) throw new RangeError(`No constant 10^(${digit}e-${place}).`);
    return constant;
  }

  private nextPlace(): Place {
    const root = tenthRoot(this.places.at(-1)?.root ?? new this.wide(10));
    const constants: Decimal[] = [];
    for (let digit = 1, power = root; digit <= 9; digit++, power = power.times(root)) {
      constants.push(
        new this.context(power.toSignificantDigits(this.context.precision).toString()),
      );
    }
    return { root, constants };
  }
}

const tables = new WeakMap<Context, PowerTable>();

function tableOf(context: Context): PowerTable {
  let table = tables.get(context);
  if (table === undefined) {
    table = new PowerTable(context);
    tables.set(context, table);
  }
  return table;
}

/**
 * 10^x for an exact decimal x: the integer part shifts the exponent, each further digit d at place
 * k is one factor 10^(d·10^−k). Relative error at most `powerOfTenError(decimals of x)` units u of
 * the context; exact for an integer x.
 */
export function powerOfTen(context: Context, x: Decimal): Decimal {
  const whole = x.floor();
  const decimals = x.minus(whole).toFixed().slice(2);
  let power = new context(`1e${whole.toFixed()}`);
  if (decimals === '') return power;
  const table = tableOf(context);
  for (let place = 1; place <= decimals.length; place++) {
    const digit = Number(decimals[place - 1]);
    if (digit !== 0) power = power.times(table.constant(place, digit));
  }
  return power;
}

/**
 * Bound on the relative error of `powerOfTen`, in units u: a root is good to 4 units of the wider
 * context and its ninth power to 44, so a constant is good to 1.01u after its last rounding; d
 * constants and d − 1 products that round make at most 2d (d ≤ 100; the shift does not round).
 */
export const powerOfTenError = (decimals: number) => 2 * decimals;
