import type { Shortcut } from '../../../shared/mixtures';
import { equilibrium } from '../../chem';
import type { SettledMixture } from './settled';
import type { WeighedContent } from './contents';

/** One system alone in a flask, however many components brought it. */
interface Alone {
  /** Index of the first component that brought it. */
  readonly concerns: number;
  readonly pKa: readonly number[];
  readonly total: number;
  /** Protons lost on the average, if every strong acid and base has reacted with it. */
  readonly lost: number;
}

/** The one system of a flask; undefined where there are several, or none. */
function alone({ contents, balance, systems }: SettledMixture): Alone | undefined {
  const { components, pairs } = contents;
  const [first] = components;
  if (!first || pairs.length > 0) return undefined;
  const weighed = components.filter((one): one is WeighedContent => one.kind === 'weighed');
  const same = (one: WeighedContent) =>
    one.system.fullyProtonatedCharge === first.system.fullyProtonatedCharge &&
    one.system.pKa.join() === first.system.pKa.join();
  if (weighed.length < components.length || !weighed.every(same)) return undefined;
  const total = weighed.reduce((sum, one) => sum + Number(one.concentration), 0);
  if (total === 0) return undefined;
  const charge =
    balance.inert.reduce((sum, one) => sum + Number(one.concentration) * one.ion.charge, 0) +
    weighed.reduce(
      (sum, one) => sum + Number(one.concentration) * (one.system.fullyProtonatedCharge - one.form),
      0,
    );
  const asWeighed = weighed.reduce((sum, one) => sum + Number(one.concentration) * one.form, 0);
  return {
    concerns: 0,
    pKa: systems[0]?.inMedium.pKa.map(Number) ?? [],
    total,
    lost: (asWeighed + charge) / total,
  };
}

/** The shortcut that the trade would take, and the pH it gives. */
function shortcutFor(
  { pKa, total, lost }: Alone,
  pKw: number,
): (Pick<Shortcut, 'name'> & { pH: number }) | undefined {
  const whole = Math.round(lost);
  const at = (i: number) => pKa[i] ?? Number.NaN;
  if (Math.abs(lost - whole) < 1e-9) {
    if (whole < 0 || whole > pKa.length) return undefined;
    if (whole === 0) return { name: 'weak-acid-root', pH: (at(0) - Math.log10(total)) / 2 };
    if (whole === pKa.length) {
      return { name: 'weak-base-root', pH: (pKw + at(whole - 1) + Math.log10(total)) / 2 };
    }
    return { name: 'mean-of-two-pKa', pH: (at(whole - 1) + at(whole)) / 2 };
  }
  if (lost < 0 || lost > pKa.length) return undefined;
  const step = Math.floor(lost);
  const part = lost - step;
  return { name: 'logarithmic-buffer-equation', pH: at(step) + Math.log10(part / (1 - part)) };
}

const signed = (value: number) => `${value < 0 ? '−' : '+'}${Math.abs(value).toFixed(3)}`;

/** What is left out and what it is worth: activity coefficients, then water and other steps. */
function why(simple: number, ideal: number, real: number): string {
  const activity = ideal - real;
  const amounts = simple - ideal;
  const parts = [
    Math.abs(activity) >= 0.0005 ? `it leaves out activity coefficients (${signed(activity)})` : '',
    Math.abs(amounts) >= 0.0005
      ? `it takes what was weighed in for what is there, without what dissociates further or reacts with water (${signed(amounts)})`
      : '',
  ].filter((part) => part !== '');
  if (parts.length === 0) return 'It holds here to 0.001.';
  const text = parts.join(', and ');
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}.`;
}

/** Which shortcut of the trade applies to a mixture, and how far off it would have been. */
export function shortcutsOf(mixture: SettledMixture, pH: number): Shortcut[] {
  const one = alone(mixture);
  if (!one) return [];
  const found = shortcutFor(one, Number(mixture.conditions.pKw));
  if (!found || !Number.isFinite(found.pH)) return [];
  const ideal = equilibrium({
    ...mixture.balance,
    activity: { ...mixture.balance.activity, model: 'ideal' },
  });
  if (!ideal.ok) return [];
  return [
    {
      name: found.name,
      concerns: one.concerns,
      pH: found.pH.toFixed(3),
      error: (found.pH - pH).toFixed(3).replace(/^-(0\.0+)$/, '$1'),
      why: why(found.pH, ideal.pH, pH),
    },
  ];
}
