import { useMemo } from 'react';
import { CurveNames, nameHeight, nameSize } from '../chart/curve-names';
import type { Rect } from '../chart/geometry';
import { bottom } from '../chart/geometry';
import { linePath } from '../chart/line-path';
import { PanelFrame } from '../chart/panel-frame';
import { placeNames } from '../chart/place-names';
import type { Scale } from '../chart/scale';
import { linearScale } from '../chart/scale';
import { SeriesLine } from '../chart/series-line';
import { alphaSign } from '../chart/symbols';
import { formulaWidth, numeralsWidth } from '../chart/text-width';
import { useTheme } from '../ui/theme';
import { BesideLines } from './beside-lines';
import type { DrawnCurve } from './drawn-curve';
import type { BesideCurve } from './figure-extras';

export const alphaScale = (rect: Rect) => linearScale([0, 1], [bottom(rect), rect.y]);

/** Below this the pen is lifted: no bundle of dashes on the zero line. */
const penDown = 0.003;
/** Room above the line α = 1 where names may stand, px. */
const headroom = 26;

/** A form that stays rarer than this has no curve to stand at. */
const worthNaming = 0.02;

/** Room of the numerals that stand inside a compact panel. */
const numerals = (rect: Rect): Rect[] =>
  [1, 0.5].map((value) => ({
    x: rect.x,
    y: alphaScale(rect)(value) - 16,
    width: numeralsWidth(String(value), 12) + 2,
    height: 14,
  }));

interface FractionLinesProps {
  readonly drawn: DrawnCurve;
  readonly beside: readonly BesideCurve[];
  readonly rect: Rect;
  readonly x: Scale;
  readonly strong: number;
  readonly cursor: number;
  /** Where the cursor stood when the curve came, px: names keep out of its way. */
  readonly placing: number;
  readonly compact: boolean;
}

/** The fraction of each form over pH, with its name at the curve. */
export function FractionLines(props: FractionLinesProps) {
  const { drawn, beside, rect, x, strong, cursor, placing, compact } = props;
  const { series } = useTheme();
  const lines = useMemo(() => {
    const y = alphaScale(rect);
    return drawn.shown.map((index) => {
      const alphas = drawn.curve.fractions[index] ?? [];
      const points = alphas.map((alpha, i) => ({
        x: x(drawn.curve.pH[i] ?? 0),
        y: y(alpha),
        drawn: alpha >= penDown,
      }));
      return { index, points, d: linePath(points), peak: Math.max(...alphas) };
    });
  }, [drawn, rect, x]);
  const names = useMemo(
    () =>
      placeNames(
        lines
          .filter(({ peak }) => peak >= worthNaming)
          .map(({ index, points }) => ({
            key: index,
            width: formulaWidth(drawn.formulas[index] ?? '', nameSize),
            height: nameHeight,
            points,
          })),
        {
          bounds: { ...rect, y: rect.y - headroom, height: rect.height + headroom },
          zero: bottom(rect),
          cursor: placing,
          taken: compact ? numerals(rect) : [],
        },
      ),
    [lines, drawn, rect, placing, compact],
  );
  // Drawn once, not at each move of the cursor: there may be dozens.
  const drawnLines = useMemo(
    () =>
      lines.map(({ index, d }) => (
        <SeriesLine key={index} d={d} style={series(index)} strong={index === strong} />
      )),
    [lines, series, strong],
  );
  return (
    <>
      <PanelFrame
        rect={rect}
        y={alphaScale(rect)}
        inside={compact}
        headRise={30}
        head={compact ? undefined : <>{alphaSign} fraction of each form</>}
        lines={(compact ? [0, 0.5, 1] : [0, 0.25, 0.5, 0.75, 1]).map((value) => ({
          value,
          label: compact && value === 0 ? '' : String(value),
          kind: value === 0 ? 'axis' : value === 1 ? 'bound' : 'grid',
        }))}
      />
      {drawnLines}
      <BesideLines
        drawn={drawn}
        beside={beside}
        rect={rect}
        x={x}
        placing={placing}
        taken={names}
      />
      <CurveNames names={names} formulas={drawn.formulas} strong={strong} cursor={cursor} />
    </>
  );
}
