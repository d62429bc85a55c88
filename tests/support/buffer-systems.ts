import thermodynamics from '../../server/database/handbook/sources/buffer-thermodynamics.json';
import { type Component, type Step, waterOf } from './solutions';

/** Charge of the fully protonated species, and names under which the tables know the ions. */
interface Protolyte {
  readonly z0: number;
  readonly names?: readonly string[];
}

/** Buffers as data/ files name them; the same words as in the table of constants. */
const protolytes: Readonly<Record<string, Protolyte>> = {
  oxalate: { z0: 0, names: ['H2C2O4', 'HC2O4^-', 'C2O4^2-'] },
  'L-tartrate': { z0: 0, names: ['H2Tar', 'HTar^-', 'Tar^2-'] },
  citrate: { z0: 0, names: ['H3Cit', 'H2Cit^-', 'HCit^2-', 'Cit^3-'] },
  phthalate: { z0: 0, names: ['H2Phth', 'HPhth^-', 'Phth^2-'] },
  phosphate: { z0: 0, names: ['H3PO4', 'H2PO4^-', 'HPO4^2-', 'PO4^3-'] },
  borate: { z0: 0, names: ['B(OH)3', 'B(OH)4^-'] },
  carbonate: { z0: 0, names: ['CO2', 'HCO3^-', 'CO3^2-'] },
  acetate: { z0: 0, names: ['CH3COOH', 'CH3COO^-'] },
  TRIS: { z0: 1, names: ['TrisH^+', 'Tris'] },
  glycine: { z0: 1, names: ['C2H6NO2^+', 'C2H5NO2', 'C2H4NO2^-'] },
  barbital: { z0: 0 },
  maleate: { z0: 0 },
};

/** Thermodynamic constants at 25 °C with ΔH° and ΔCp°: `source` of the handbook's table, recalled. */
const stepsOf = (buffer: string): Step[] =>
  thermodynamics.rows
    .filter((row) => row.buffer === buffer)
    .map(({ pK, dH_kJ, dCp_J }) => ({ pK, deltaH: dH_kJ, deltaCp: dCp_J }));

/** lg K of Ca²⁺ + OH⁻ = CaOH⁺ at 25 °C (R. M. Smith & A. E. Martell, recalled); ΔH° is left out. */
const pairing = 1.3;

/**
 * Ca²⁺ as the acid of its ion pair: Ca²⁺ + H₂O = CaOH⁺ + H⁺, pK = pKw − lg K.
 */
const calcium = (c: number, temperature: number): Component => ({
  pKa: [(Number(waterOf(String(temperature)).pKw) - pairing).toFixed(6)],
  z0: 2,
  c,
  names: ['Ca^2+', 'CaOH^+'],
});

/** A buffer's system by its name, at a total concentration. */
export function systemOf(buffer: string, c: number, temperature: number): Component {
  if (buffer === 'calcium') return calcium(c, temperature);
  const protolyte = protolytes[buffer];
  const pKa = stepsOf(buffer);
  if (protolyte === undefined || pKa.length === 0) throw new RangeError(`No system ${buffer}.`);
  return { ...protolyte, pKa, c };
}
