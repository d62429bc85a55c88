import { chargeScale } from '../chart/charge-panel';
import { capacityScale } from '../chart/capacity-panel';
import { right, type Rect } from '../chart/geometry';
import { Marker } from '../chart/marker';
import { ValueDot } from '../chart/value-dot';
import { useTheme } from '../ui/theme';
import type { Capacity } from './capacity';
import { capacityAt, capacityTop } from './capacity';
import type { DrawnCurve } from './drawn-curve';
import { endCharges } from './drawn-curve';
import type { FigureExtras } from './figure-extras';
import type { FigureLayout } from './figure-layout';
import type { Reading } from './follow-curve';
import { alphaScale } from './fraction-lines';
import { lgConcentration, lgRange } from './lg-c';
import { lgScale } from './lg-c-lines';
import { dotCapacity, shownCharge, trueMinus } from './rounded';

/** Below this a marker on the line would only crowd the zero line. */
const worthMarking = 0.015;

interface CursorMarksProps {
  readonly layout: FigureLayout;
  readonly drawn: DrawnCurve;
  readonly extras: FigureExtras;
  /** mol/L. */
  readonly total: number;
  readonly reading: Reading;
  readonly cursor: number;
}

/** Where the cursor meets the lines. */
export function CursorMarks(props: CursorMarksProps) {
  const { layout, drawn, extras, total, reading, cursor } = props;
  const { colours, series } = useTheme();
  const alpha = layout.panels.fractions && alphaScale(layout.panels.fractions);
  const crossed = drawn.shown
    .map((index) => ({ index, value: Number(reading.fractions[index]) }))
    .filter(({ value }) => value > worthMarking)
    .sort((a, b) => a.value - b.value);
  const { charge, capacity: capacityRect, 'lg-c': lgRect } = layout.panels;
  const { capacity } = extras;
  return (
    <>
      {alpha &&
        crossed.map(({ index, value }) => (
          <Marker
            key={index}
            shape={series(index).marker}
            x={cursor}
            y={alpha(value)}
            colour={series(index).colour}
            ring={colours.page}
            scale={index === reading.predominant ? 1.25 : 1}
          />
        ))}
      {charge && (
        <ValueDot
          x={cursor}
          y={chargeScale(endCharges(drawn), charge)(Number(reading.meanCharge))}
          limit={right(charge)}
          text={trueMinus(shownCharge(reading.meanCharge))}
        />
      )}
      {capacityRect && capacity && (
        <CapacityDot capacity={capacity} rect={capacityRect} reading={reading} cursor={cursor} />
      )}
      {lgRect &&
        drawn.shown
          .map((index) => ({
            index,
            value: lgConcentration(reading.fractions[index] ?? '0', total),
          }))
          .filter(({ value }) => value > lgRange[0] && value <= lgRange[1])
          .map(({ index, value }) => (
            <Marker
              key={index}
              shape={series(index).marker}
              x={cursor}
              y={lgScale(lgRect)(value)}
              colour={series(index).colour}
              ring={colours.page}
            />
          ))}
    </>
  );
}

interface CapacityDotProps {
  readonly capacity: Capacity;
  readonly rect: Rect;
  readonly reading: Reading;
  readonly cursor: number;
}

/** The capacity at the cursor; where the line is clipped its figure stands at the top. */
function CapacityDot({ capacity, rect, reading, cursor }: CapacityDotProps) {
  const value = capacityAt(capacity, reading);
  const top = capacityTop(capacity);
  return (
    <ValueDot
      x={cursor}
      y={value > top ? undefined : capacityScale(rect, top)(value)}
      top={rect.y}
      limit={right(rect)}
      text={dotCapacity(value)}
    />
  );
}
