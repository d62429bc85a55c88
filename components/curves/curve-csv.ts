import { csvOf } from '../chart/export/csv';
import { conditionsOf } from './conditions-of';
import type { Layer } from './curves-state';
import type { DrawnCurve } from './drawn-curve';
import type { FigureExtras } from './figure-extras';

/** The figure's curves: the first one, then those beside it. */
interface CurvesInCsv {
  readonly drawn: DrawnCurve;
  readonly shown: readonly Layer[];
  readonly extras: FigureExtras;
}

/**
 * The curve as fetched, digit for digit: pH, the fraction of each form, the mean charge, buffer
 * capacity where it is shown, and what the row holds for. Curves of the same system beside it
 * follow, row by row.
 */
export function curveCsv({ drawn, shown, extras }: CurvesInCsv): string {
  const { formulas } = drawn;
  const capacity = shown.includes('capacity') ? extras.capacity : undefined;
  const same = extras.beside.filter((other) => other.drawn.formulas.join() === formulas.join());
  const head = [
    'pH',
    ...formulas,
    'mean charge',
    ...(capacity ? ['total/(mol/L)', 'buffer capacity/(mol/L per pH)'] : []),
    'temperature/°C',
    'ionic strength/(mol/L)',
    'activity model',
  ];
  const rows = [{ drawn, capacity }, ...same].flatMap((curve) => {
    const { temperature, ionicStrength = '', model } = conditionsOf(curve.drawn);
    return curve.drawn.answer.points.map(({ pH, fractions, meanCharge }, i) => [
      pH,
      ...fractions,
      meanCharge,
      ...(capacity ? [String(capacity.total), curve.capacity?.answer.points[i]?.total ?? ''] : []),
      temperature,
      ionicStrength,
      model,
    ]);
  });
  return csvOf([head, ...rows]);
}
