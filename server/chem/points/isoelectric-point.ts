import { afterPoint, settleAll, significant } from '../decimals/settle-all';
import { nth } from '../decimals/nth';
import { lostNearZero } from '../forms/doubles';
import { spreadOf } from '../forms/spread';
import type { AcidBaseSystem } from '../forms/system';
import type { Balance } from '../mixture/balance';
import { rootsOf } from '../mixture/solve';

/** Where a system carries no net charge, or why it never does. */
export type IsoelectricPoint =
  | {
      readonly ok: true;
      readonly pH: string;
      /** dz̄/dpH. */
      readonly slope: string;
      /** Fractions of the n + 1 species there. */
      readonly fractions: readonly string[];
    }
  | { readonly ok: false; readonly reason: 'charge-stays-positive' | 'charge-stays-negative' };

/** A system alone, without the water: its charge balance is its mean charge. */
const alone = ({ fullyProtonatedCharge, pKa }: AcidBaseSystem): Balance => ({
  acids: [
    {
      pKa,
      kinds: pKa.map(() => 'mixed'),
      species: Array.from({ length: pKa.length + 1 }, (_, lost) => ({
        name: undefined,
        charge: fullyProtonatedCharge - lost,
      })),
      reference: fullyProtonatedCharge,
      amount: '1',
      held: false,
    },
  ],
  inert: [],
  pKw: undefined,
  activity: { model: 'ideal', A: '0', B: '0', linear: '0', ionicStrength: '0' },
});

/**
 * The pH of z̄ = 0 for a system of constants pK′, to `digits` (1–60) significant digits, with
 * dz̄/dpH = −ln 10 v (`digits` places after the point) and the fractions there. There is none where
 * the charge keeps its sign at every pH: only the neutral form’s neighbours on both sides make one.
 */
export function isoelectricPoint(system: AcidBaseSystem, digits: number): IsoelectricPoint {
  const { fullyProtonatedCharge: highest, pKa } = system;
  if (highest <= 0) return { ok: false, reason: 'charge-stays-negative' };
  if (highest >= pKa.length) return { ok: false, reason: 'charge-stays-positive' };
  const found = rootsOf(alone(system));
  if (!found.ok) throw new RangeError('A mean charge that changes sign has no root.');
  const [root] = found.roots;
  const [point = '', slope = '', ...fractions] = settleAll({
    digits,
    loss: root.loss + 3 + lostNearZero(root.near.lnU),
    at: (precision) => {
      const { balance, u, at } = root.solvedTo(precision);
      const shares = nth(balance.acidsAt(u, at), 0).fractions;
      const ln10 = new balance.context(10).ln();
      return [
        { value: u.log(10), form: significant(digits) },
        { value: spreadOf(shares).times(ln10).negated(), form: afterPoint(digits) },
        ...shares.map((value) => ({ value, form: significant(digits) })),
      ];
    },
  });
  return { ok: true, pH: point, slope, fractions };
}
