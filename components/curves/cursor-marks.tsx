import { chargeScale } from '../chart/charge-panel';
import { right } from '../chart/geometry';
import { Marker } from '../chart/marker';
import { ValueDot } from '../chart/value-dot';
import { useTheme } from '../ui/theme';
import type { DrawnCurve } from './drawn-curve';
import { endCharges } from './drawn-curve';
import type { FigureLayout } from './figure-layout';
import type { Reading } from './follow-curve';
import { alphaScale } from './fraction-lines';
import { shownCharge, trueMinus } from './rounded';

/** Below this a marker on the line would only crowd the zero line. */
const worthMarking = 0.015;

interface CursorMarksProps {
  readonly layout: FigureLayout;
  readonly drawn: DrawnCurve;
  readonly reading: Reading;
  readonly cursor: number;
}

/** Where the cursor meets the lines. */
export function CursorMarks({ layout, drawn, reading, cursor }: CursorMarksProps) {
  const { colours, series } = useTheme();
  const alpha = layout.fractions && alphaScale(layout.fractions);
  const crossed = drawn.shown
    .map((index) => ({ index, value: Number(reading.fractions[index]) }))
    .filter(({ value }) => value > worthMarking)
    .sort((a, b) => a.value - b.value);
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
      {layout.charge && (
        <ValueDot
          x={cursor}
          y={chargeScale(endCharges(drawn), layout.charge)(Number(reading.meanCharge))}
          limit={right(layout.charge)}
          text={trueMinus(shownCharge(reading.meanCharge))}
        />
      )}
    </>
  );
}
