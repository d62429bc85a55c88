import type Decimal from 'decimal.js';
import type { Context } from '../decimals/contexts';
import { gasConstant } from '../water/physical-constants';
import { type Relation, toDigits } from '../decimals/right-digits';

/** θ in K: the temperature that constants and enthalpies are tabulated at. */
export const referenceKelvin = '298.15';

/** A constant at 25 °C, and how it moves: ΔH° in kJ/mol, ΔCp° in J/(mol K). */
export interface MovingConstant {
  readonly pK: Decimal;
  readonly deltaH: Decimal;
  readonly deltaCp: Decimal;
}

/** Whether the constant is the same at this temperature, to every digit. */
export const stays = ({ deltaH, deltaCp }: MovingConstant, kelvin: Decimal) =>
  kelvin.equals(referenceKelvin) || (deltaH.isZero() && deltaCp.isZero());

/** pK(T) evaluated in a context; T − θ is taken before it can cancel. */
function pKIn(context: Context, { pK, deltaH, deltaCp }: MovingConstant, kelvin: Decimal): Decimal {
  const T = new context(kelvin);
  const away = T.minus(referenceKelvin);
  const perReference = T.dividedBy(referenceKelvin);
  const enthalpy = away.dividedBy(T).dividedBy(referenceKelvin).times(deltaH).times(1000);
  const capacity = perReference.ln().minus(away.dividedBy(T)).times(deltaCp);
  const lnRise = enthalpy.plus(capacity).dividedBy(gasConstant);
  return new context(pK).minus(lnRise.dividedBy(context.ln(10)));
}

/**
 * Loss: each part of pK(T) is good to 12u of its absolute value, but ln(T/θ) to 12u of 1, because
 * T/θ was rounded. The parts are estimated in doubles, and one digit is added for that.
 */
function lossOf({ pK, deltaH, deltaCp }: MovingConstant, kelvin: Decimal): number {
  const [T, theta] = [kelvin.toNumber(), Number(referenceKelvin)];
  const away = Math.abs(T - theta);
  const enthalpy = (Math.abs(deltaH.toNumber()) * 1000 * away) / (T * theta);
  const capacity = Math.abs(deltaCp.toNumber()) * (1 + Math.abs(Math.log(T / theta)) + away / T);
  const moved = (enthalpy + capacity) / (Number(gasConstant) * Math.LN10);
  return Math.ceil(Math.log10(60 * (1 + Math.abs(pK.toNumber()) + moved))) + 1;
}

/**
 * The relation of pK(T). A tie is impossible where the constant moves: ln 10 and ln(T/θ) would have
 * to be linked by rational numbers (Baker's theorem), and T is no power of ten times θ.
 */
export const pKRelation = (constant: MovingConstant, kelvin: Decimal): Relation =>
  stays(constant, kelvin)
    ? {
        in: (context) => new context(constant.pK),
        // Nothing is rounded: the error is nought, and any bound on it holds.
        loss: 0,
        is: (tie) => tie.equals(constant.pK),
      }
    : {
        in: (context) => pKIn(context, constant, kelvin),
        loss: lossOf(constant, kelvin),
      };

/**
 * pK at a temperature, to `precision` right digits:
 * ln K(T) = ln K(θ) − (ΔH°/R)(1/T − 1/θ) + (ΔCp°/R)(θ/T − 1 + ln(T/θ)), θ = 298.15 K,
 * R = 8.314462618 J/(K mol); ΔCp° constant. E. C. W. Clarke, D. N. Glew, Trans. Faraday Soc. 62, 539
 * (1966); used so by R. N. Goldberg, N. Kishore, R. M. Lennen, J. Phys. Chem. Ref. Data 31, 231
 * (2002). To be trusted to about 60 °C.
 */
export const pKAtTemperature = (
  precision: number,
  constant: MovingConstant,
  kelvin: Decimal,
): Decimal => toDigits(pKRelation(constant, kelvin), precision);
