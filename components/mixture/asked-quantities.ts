import { limits } from '../../shared/limits';
import type { AskedQuantity } from '../conditions/typed-quantity';

/** The quantities that the flask's fields ask for. */
export const concentrationAsked: AskedQuantity = {
  dimension: 'concentration',
  unit: 'mol/L',
  range: limits.concentration,
  fault: 'Write 0.025 or 25 mmol/L.',
};

export const pressureAsked: AskedQuantity = {
  dimension: 'pressure',
  unit: 'Pa',
  range: limits.pressure,
  fault: 'Write 42.6 or 420 µatm.',
};
