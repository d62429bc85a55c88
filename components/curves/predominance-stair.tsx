import { useMemo } from 'react';
import type { Rect } from '../chart/geometry';
import { bottom, right } from '../chart/geometry';
import type { Scale } from '../chart/scale';
import { stairOf } from '../chart/stair';
import { StairStone } from '../chart/stair-stone';
import { StairText } from '../chart/stair-text';
import { meanChargeSign, pKPrimeSign } from '../chart/symbols';
import { numeralsWidth } from '../chart/text-width';
import { WaterLabel } from '../chart/water-label';
import type { DrawnCurve } from './drawn-curve';
import { endCharges } from './drawn-curve';
import type { Reading } from './follow-curve';
import { shownCharge, trueMinus } from './rounded';

interface PredominanceStairProps {
  readonly drawn: DrawnCurve;
  readonly reading: Reading;
  readonly rect: Rect;
  readonly x: Scale;
  /** The stone lies under the cursor's line, the text over it. */
  readonly part: 'stone' | 'text';
}

/** Where each form predominates, as a stair, with the water at the mean charge. */
export function PredominanceStair({ drawn, reading, rect, x, part }: PredominanceStairProps) {
  const stair = useMemo(
    () =>
      stairOf(drawn.stair, {
        x,
        left: rect.x,
        right: right(rect),
        top: rect.y,
        base: bottom(rect),
        charges: endCharges(drawn),
      }),
    [drawn, rect, x],
  );
  if (part === 'stone') {
    return (
      <StairStone
        stair={stair}
        meanCharge={Number(reading.meanCharge)}
        strong={reading.predominant}
      />
    );
  }
  const marks = drawn.meetings.map(({ pH, text }) => ({ x: x(pH), text: trueMinus(text) }));
  const cursor = x(Number(reading.pH));
  const water = ` ${trueMinus(shownCharge(reading.meanCharge))}`;
  return (
    <>
      <StairText
        stair={stair}
        formulas={drawn.formulas}
        marks={marks}
        // Where a form never predominates its neighbours meet between two constants.
        {...(drawn.stair.length === drawn.formulas.length
          ? { caption: pKPrimeSign, captionWidth: 20 }
          : { caption: 'equal at', captionWidth: 58 })}
        strong={reading.predominant}
        cursor={cursor}
      />
      <WaterLabel
        stair={stair}
        meanCharge={Number(reading.meanCharge)}
        cursor={cursor}
        width={numeralsWidth(`z${water}`, 13)}
      >
        {meanChargeSign}
        {water}
      </WaterLabel>
    </>
  );
}
