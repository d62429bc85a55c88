import { memo, useMemo } from 'react';
import { TSpan } from 'react-native-svg';
import { CapacityPanel, capacityScale, type CapacityLine } from '../chart/capacity-panel';
import { right, type Rect } from '../chart/geometry';
import type { Scale } from '../chart/scale';
import { betaSign, concentrationSign } from '../chart/symbols';
import { totalInWords } from './total-in-words';
import { fonts } from '../ui/theme';
import { BesideNames } from './beside-names';
import { capacityTop, expectedTop, type Capacity } from './capacity';
import type { FigureExtras } from './figure-extras';

interface CapacityCurveProps {
  readonly extras: FigureExtras;
  /** mol/L. */
  readonly total: number;
  readonly rect: Rect;
  readonly x: Scale;
  readonly compact: boolean;
  readonly placing: number;
  /** Whether the curves beside are named here. */
  readonly named: boolean;
}

/** Buffer capacity of the system at its total, over pH. */
export const CapacityCurve = memo(function CapacityCurve(props: CapacityCurveProps) {
  const { extras, total, rect, x, compact, placing, named } = props;
  const { capacity, beside } = extras;
  const lines = useMemo(() => {
    const ghosts = beside.flatMap(({ name, capacity: other }): CapacityLine[] =>
      other ? [{ key: name, pH: other.pH, values: other.values, kind: 'ghost' }] : [],
    );
    const whole: CapacityLine[] = capacity
      ? [{ key: 'whole', pH: capacity.pH, values: capacity.values, kind: 'whole' }]
      : [];
    return [...ghosts, ...whole];
  }, [capacity, beside]);
  const px = useMemo(() => {
    if (!capacity) return undefined;
    const y = capacityScale(rect, capacityTop(capacity));
    const pointsOf = ({ pH, values }: Capacity) =>
      values.map((value, i) => ({ x: x(pH[i] ?? 0), y: y(value) }));
    return {
      first: pointsOf(capacity),
      others: beside.flatMap(({ name, capacity: other }) =>
        other ? [{ name, points: pointsOf(other) }] : [],
      ),
    };
  }, [capacity, beside, rect, x]);
  return (
    <>
      <CapacityPanel
        rect={rect}
        x={x}
        top={capacity ? capacityTop(capacity) : expectedTop(total)}
        lines={lines}
        maxima={capacity?.maxima.filter(({ pH }) => x(pH) >= rect.x && x(pH) <= right(rect)) ?? []}
        inside={compact}
        head={
          <>
            {betaSign}
            {compact ? ' at ' : ' buffer capacity at '}
            {concentrationSign}
            {' = '}
            <TSpan fontFamily={fonts.numbers}>{totalInWords(capacity?.total ?? total)}</TSpan>
            {' mmol/L, in mmol/L per pH'}
          </>
        }
      />
      {named && px && <BesideNames rect={rect} {...px} placing={placing} />}
    </>
  );
});
