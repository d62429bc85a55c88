import { pKRelation, stays } from '../constants/pk-at-temperature';
import { Exact } from '../decimals/contexts';
import { debyeHuckelRelations } from './debye-huckel';
import { densityRelation } from './density';
import { ionProductRelation } from './ion-product';
import { kelvinOf } from './kelvin';
import { permittivityRelation } from './permittivity';
import { toPlaces } from '../decimals/right-digits';

/**
 * What an answer prints of its solvent. The engine takes these very decimals as exact, so that a
 * reader who calculates with what is printed finds every digit again.
 */
export interface WaterProperties {
  /** −lg Kw, molal, I = 0. */
  readonly pKw: string;
  /** Debye–Hückel A, (kg/mol)^½, for lg γ. */
  readonly A: string;
  /** Debye–Hückel B, (kg/mol)^½/nm. */
  readonly B: string;
  /** Relative permittivity. */
  readonly permittivity: string;
  /** kg/m³. */
  readonly density: string;
}

/** Places after the point; all of them are right, and finer than the literature's uncertainty. */
const places = { pKw: 6, A: 6, B: 6, permittivity: 4, density: 4 };

/** Degrees Celsius that the properties of the liquid are given for. */
const range = { from: 0, to: 100 };

/** Liquid water at 0.1 MPa and 0–100 °C; beyond, a RangeError, because the edge has refused it. */
export function waterAt(celsius: string): WaterProperties {
  const t = new Exact(celsius);
  if (!t.greaterThanOrEqualTo(range.from) || !t.lessThanOrEqualTo(range.to)) {
    throw new RangeError(`Water at ${celsius} °C lies outside ${range.from} to ${range.to} °C.`);
  }
  const kelvin = kelvinOf(celsius);
  const { A, B } = debyeHuckelRelations(kelvin);
  return {
    pKw: toPlaces(ionProductRelation(kelvin), places.pKw),
    A: toPlaces(A, places.A),
    B: toPlaces(B, places.B),
    permittivity: toPlaces(permittivityRelation(kelvin), places.permittivity),
    density: toPlaces(densityRelation(kelvin), places.density),
  };
}

/** Places after the point that a constant is moved to; then it is taken as exact. */
export const pKPlaces = 10;

/** A constant at 25 °C as decimals are written: ΔH° in kJ/mol, ΔCp° in J/(mol K), 0 if left out. */
export interface WrittenConstant {
  readonly pK: string;
  readonly deltaH: string;
  readonly deltaCp?: string | undefined;
}

/**
 * pK at a temperature, rounded half-even to `pKPlaces` without trailing zeros; the constant just as
 * it was written where it stays: at 25 °C, or without enthalpy and heat capacity.
 */
export function pKAt(celsius: string, { pK, deltaH, deltaCp = '0' }: WrittenConstant): string {
  const constant = {
    pK: new Exact(pK),
    deltaH: new Exact(deltaH),
    deltaCp: new Exact(deltaCp),
  };
  const kelvin = kelvinOf(celsius);
  if (stays(constant, kelvin)) return pK;
  return new Exact(toPlaces(pKRelation(constant, kelvin), pKPlaces)).toFixed();
}
