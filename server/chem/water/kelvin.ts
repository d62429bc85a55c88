import type Decimal from 'decimal.js';
import { contextOf, Exact } from '../decimals/contexts';

/** 0 °C in K, by definition of the Celsius scale. */
export const zeroCelsius = '273.15';

/** T/K = t/°C + 273.15, exactly. */
export function kelvinOf(celsius: string): Decimal {
  const sum = new Exact(celsius).plus(zeroCelsius);
  // Quotients of an `Exact` would have all its digits; a context that just holds the sum is safe.
  return new (contextOf(sum.precision()))(sum);
}
