import { memo, useMemo } from 'react';
import { ChargePanel, chargeScale } from '../chart/charge-panel';
import type { Rect } from '../chart/geometry';
import type { Scale } from '../chart/scale';
import { meanChargeSign } from '../chart/symbols';
import { BesideNames } from './beside-names';
import type { DrawnCurve } from './drawn-curve';
import { endCharges } from './drawn-curve';
import type { BesideCurve } from './figure-extras';

const chargesOf = ({ curve }: DrawnCurve) =>
  curve.pH.map((pH, i) => ({ pH, charge: curve.meanCharge[i] ?? 0 }));

interface ChargeLineProps {
  readonly drawn: DrawnCurve;
  readonly beside: readonly BesideCurve[];
  readonly rect: Rect;
  readonly x: Scale;
  readonly compact: boolean;
  readonly placing: number;
  /** Whether the curves beside are named here. */
  readonly named: boolean;
}

/** The mean charge over pH. */
export const ChargeLine = memo(function ChargeLine({
  drawn,
  beside,
  rect,
  x,
  compact,
  placing,
  named,
}: ChargeLineProps) {
  const points = useMemo(() => chargesOf(drawn), [drawn]);
  const ghosts = useMemo(
    () => beside.map(({ name, drawn: other }) => ({ key: name, points: chargesOf(other) })),
    [beside],
  );
  const lineOf = useMemo(() => {
    const y = chargeScale(endCharges(drawn), rect);
    const px = (curve: DrawnCurve) =>
      chargesOf(curve).map(({ pH, charge }) => ({ x: x(pH), y: y(charge) }));
    return {
      first: px(drawn),
      others: beside.map(({ name, drawn: other }) => ({ name, points: px(other) })),
    };
  }, [drawn, beside, rect, x]);
  return (
    <>
      <ChargePanel
        rect={rect}
        x={x}
        charges={endCharges(drawn)}
        ranges={drawn.stair}
        points={points}
        ghosts={ghosts}
        inside={compact}
        head={compact ? undefined : <>{meanChargeSign} mean charge</>}
      />
      {named && <BesideNames rect={rect} {...lineOf} placing={placing} />}
    </>
  );
});
