import type { BufferCapacityAnswer } from '../../shared/buffer-capacity';
import type { Reading } from './follow-curve';

/** Buffer capacity of one system at one total, as it is drawn: mmol/L per pH. */
export interface Capacity {
  readonly answer: BufferCapacityAnswer;
  /** mol/L. */
  readonly total: number;
  readonly pH: readonly number[];
  readonly values: readonly number[];
  readonly maxima: readonly { readonly pH: number; readonly value: number }[];
  /** Concentration of H⁺ at pH 0 and of OH⁻ at pH 0, mol/L: the lines of water are shifted by pH. */
  readonly water: { readonly hydrogen: number; readonly hydroxide: number };
}

const perMole = 1000;

/**
 * Reads an answer for one system over a grid that reaches from 0 to 14 at least. The part of water
 * is ln 10 · (c(H⁺) + c(OH⁻)); at either end of such a grid it is one of them alone, within the
 * digits of the answer, which gives their concentrations as the model has them.
 */
export function capacityOf(answer: BufferCapacityAnswer, total: string): Capacity {
  const { points, maxima } = answer;
  const first = points[0];
  const last = points[points.length - 1];
  const alone = (water: string | undefined) => Number(water) / Math.LN10;
  return {
    answer,
    total: Number(total),
    pH: points.map(({ pH }) => Number(pH)),
    values: points.map(({ total: value }) => Number(value) * perMole),
    maxima: maxima.map(({ pH, total: value }) => ({
      pH: Number(pH),
      value: Number(value) * perMole,
    })),
    water: {
      hydrogen: alone(first?.water) * 10 ** Number(first?.pH),
      hydroxide: alone(last?.water) * 10 ** -Number(last?.pH),
    },
  };
}

/** Concentration of H⁺, mol/L. */
export const hydrogenAt = ({ water }: Capacity, pH: number) => water.hydrogen * 10 ** -pH;
/** Concentration of OH⁻, mol/L. */
export const hydroxideAt = ({ water }: Capacity, pH: number) => water.hydroxide * 10 ** pH;

/**
 * Buffer capacity at the cursor, mmol/L per pH, from the fractions there: β = ln 10 · (c(H⁺) +
 * c(OH⁻) + c·v) with v = Σ(i<j) (j − i)² αᵢ αⱼ, the variance of the charge (Van Slyke, J. Biol.
 * Chem. 52, 525 (1922)). Written as a sum of products, it loses no digit where v is small.
 */
export function capacityAt(capacity: Capacity, { pH, fractions }: Reading): number {
  const alphas = fractions.map(Number);
  let variance = 0;
  for (const [i, lower] of alphas.entries()) {
    for (let j = i + 1; j < alphas.length; j++) {
      variance += (j - i) ** 2 * lower * (alphas[j] ?? 0);
    }
  }
  const at = Number(pH);
  const ions = hydrogenAt(capacity, at) + hydroxideAt(capacity, at);
  return Math.LN10 * (ions + capacity.total * variance) * perMole;
}

/** Round numbers that an axis may end at. */
const tops = [1, 1.5, 2, 3, 4, 5, 6, 8, 10];
/** A lone monoprotic system peaks at ln 10 / 4 of its total. */
const lonePeak = Math.LN10 / 4;

/**
 * Where the axis of capacity ends, mmol/L per pH: just above the highest maximum that is drawn.
 * Towards strong acid and strong base β grows without end; it is clipped there.
 */
export function capacityTop({ maxima, total, pH }: Capacity): number {
  const [from = 0, to = 14] = [pH[0], pH[pH.length - 1]];
  const drawn = maxima.filter((peak) => peak.pH >= from && peak.pH <= to);
  return topOver(Math.max(lonePeak * total * perMole, ...drawn.map(({ value }) => value)));
}

/** The same while only the total is known, mol/L. */
export const expectedTop = (total: number): number => topOver(lonePeak * total * perMole);

/** The next round number above. */
function topOver(highest: number): number {
  const power = 10 ** Math.floor(Math.log10(highest));
  return (tops.find((top) => top * power >= highest * 1.02) ?? 10) * power;
}
