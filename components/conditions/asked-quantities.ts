import { limits } from '../../shared/limits';
import type { AskedQuantity } from './typed-quantity';

/** The quantities that fields of conditions ask for. */
export const temperatureAsked: AskedQuantity = {
  dimension: 'temperature',
  unit: '°C',
  range: limits.temperature,
  fault: 'Write 37 or 310.15 K.',
};

export const ionicStrengthAsked: AskedQuantity = {
  dimension: 'concentration',
  unit: 'mol/L',
  range: limits.ionicStrength,
  fault: 'Write 0.15 or 150 mmol/L.',
};

/** A total above nothing, so that its logarithm exists. */
export const totalAsked: AskedQuantity = {
  dimension: 'concentration',
  unit: 'mmol/L',
  range: { ...limits.concentration, from: '1e-12' },
  fault: 'Write 50 mmol/L or 0.05 mol/L.',
};
