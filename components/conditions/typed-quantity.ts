import { Exact, isWithin, type DecimalRange } from '../../shared/decimal';
import { conversionOf, type Dimension } from '../../shared/units';
import { plainDecimal } from '../ui/plain-decimal';

/** A quantity that a field asks for. */
export interface AskedQuantity {
  readonly dimension: Dimension;
  /** Unit that stands in the field, and that a bare number is in. */
  readonly unit: string;
  /** In the dimension's own unit, as the contract has it. */
  readonly range: DecimalRange;
  /** What is said of text that is none, with the right form: `Write a temperature such as 37.` */
  readonly fault: string;
}

type TypedQuantity =
  { readonly ok: true; readonly value: string } | { readonly ok: false; readonly error: string };

/** Wide enough that no digit of what is typed is lost. */
const shownPlaces = 60;

/** A comma before three digits: thousands to some, the decimal sign to others. */
const ambiguous = /^[-\u2212]?[1-9]\d{0,2},\d{3}$/;

const signed = (text: string) => text.replace('-', '\u2212');

/** A value of the own unit, in the unit of the field. */
export function inUnit(value: string, { dimension, unit }: AskedQuantity): string {
  const toOwn = conversionOf(dimension, unit);
  if (!toOwn) return value;
  const one = new Exact(toOwn('1').toFixed());
  const zero = new Exact(toOwn('0').toFixed());
  return new Exact(value)
    .minus(zero)
    .dividedBy(one.minus(zero))
    .toDecimalPlaces(shownPlaces)
    .toFixed();
}

/**
 * Reads a quantity as somebody typed it: "37", "37,5", "310.15 K", "50mmol/L". A bare number is in
 * the field's unit.
 *
 * @returns the value in the dimension's own unit, exactly; or what to type instead.
 */
export function typedQuantity(text: string, asked: AskedQuantity): TypedQuantity {
  const { dimension, unit, range, fault } = asked;
  const [, number = '', typedUnit = ''] = /^([^\s\p{L}°]*)\s*(.*)$/u.exec(text.trim()) ?? [];
  if (ambiguous.test(number)) {
    const [whole = '', rest = ''] = number.split(',');
    const error = `Write ${signed(whole)}${rest} or ${signed(whole)}.${rest}: the comma could mean either.`;
    return { ok: false, error };
  }
  const plain = plainDecimal(number);
  const toOwn = conversionOf(dimension, typedUnit.trim() || unit);
  if (!/^-?(0|[1-9]\d*)(\.\d+)?$/.test(plain) || toOwn === undefined) {
    return { ok: false, error: fault };
  }
  const value = toOwn === null ? plain : toOwn(plain).toFixed();
  if (!isWithin(value, range)) {
    const ends = [range.from, range.to].map((end) => signed(inUnit(end, asked)));
    return { ok: false, error: `Write a value from ${ends.join(' to ')} ${unit}.` };
  }
  return { ok: true, value };
}
