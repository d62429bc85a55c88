import { useMemo } from 'react';
import { differenceName } from './comparison';
import type { CurvesState, Layer } from './curves-state';
import type { DrawnCurve } from './drawn-curve';
import type { BesideCurve, FigureExtras } from './figure-extras';
import { whyNoPoint } from './isoelectric';
import { useBesideCurves, useCapacity, useIsoelectricPoint } from './layer-queries';

/** What the shown layers need beside the fractions, and what went wrong with it. */
export function useExtras(
  { total, beside }: Pick<CurvesState, 'total' | 'beside'>,
  drawn: DrawnCurve | undefined,
  shown: readonly Layer[],
) {
  // lg c takes the lines of H⁺ and OH⁻ from the part of water.
  const withCapacity = shown.includes('capacity') || shown.includes('lg-c');
  const capacity = useCapacity(drawn, total, withCapacity);
  const hasPoint = drawn !== undefined && whyNoPoint(drawn) === undefined;
  const point = useIsoelectricPoint(drawn, hasPoint && shown.includes('isoelectric-point'));
  const others = useBesideCurves(beside, drawn?.grid, {
    total,
    withCapacity: shown.includes('capacity'),
  });

  const [first, second] = others;
  const extras = useMemo((): FigureExtras => {
    const drawnBeside = [
      { drawn: first?.drawn, capacity: first?.capacity },
      { drawn: second?.drawn, capacity: second?.capacity },
    ].flatMap((other): BesideCurve[] =>
      drawn && other.drawn
        ? [
            {
              drawn: other.drawn,
              capacity: other.capacity,
              name: differenceName(drawn, other.drawn),
            },
          ]
        : [],
    );
    return {
      capacity: capacity.data ?? undefined,
      isoelectricPoint: point.data ?? undefined,
      beside: drawnBeside,
    };
  }, [
    drawn,
    capacity.data,
    point.data,
    first?.drawn,
    first?.capacity,
    second?.drawn,
    second?.capacity,
  ]);

  return {
    extras,
    others,
    /** The first layer whose call failed. */
    failed: [capacity, point].find(({ error }) => error !== null),
  };
}
