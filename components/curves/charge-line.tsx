import { memo, useMemo } from 'react';
import { ChargePanel } from '../chart/charge-panel';
import type { Rect } from '../chart/geometry';
import type { Scale } from '../chart/scale';
import { meanChargeSign } from '../chart/symbols';
import type { DrawnCurve } from './drawn-curve';
import { endCharges } from './drawn-curve';

interface ChargeLineProps {
  readonly drawn: DrawnCurve;
  readonly rect: Rect;
  readonly x: Scale;
  readonly compact: boolean;
}

/** The mean charge over pH. */
export const ChargeLine = memo(function ChargeLine({ drawn, rect, x, compact }: ChargeLineProps) {
  const points = useMemo(
    () => drawn.curve.pH.map((pH, i) => ({ pH, charge: drawn.curve.meanCharge[i] ?? 0 })),
    [drawn],
  );
  return (
    <ChargePanel
      rect={rect}
      x={x}
      charges={endCharges(drawn)}
      ranges={drawn.stair}
      points={points}
      inside={compact}
      head={compact ? undefined : <>{meanChargeSign} mean charge</>}
    />
  );
});
