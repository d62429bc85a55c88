import type { ReactNode } from 'react';
import { Path } from 'react-native-svg';
import { useTheme } from '../ui/theme';
import { clipCurve } from './clip-curve';
import type { Rect } from './geometry';
import { bottom } from './geometry';
import { ghostDash } from './ghost-dash';
import { linePath } from './line-path';
import { PanelFrame } from './panel-frame';
import type { Scale } from './scale';
import { linearScale } from './scale';
import type { StairRange } from './stair';
import { wholeSteps } from './whole-steps';

interface ChargePoint {
  readonly pH: number;
  readonly charge: number;
}

interface ChargePanelProps {
  readonly rect: Rect;
  readonly x: Scale;
  /** Charge of the fully protonated and of the fully deprotonated form. */
  readonly charges: readonly [number, number];
  readonly ranges: readonly StairRange[];
  readonly points: readonly ChargePoint[];
  /** Curves that are compared with, thin. */
  readonly ghosts?: readonly { readonly key: string; readonly points: readonly ChargePoint[] }[];
  readonly head?: ReactNode;
  readonly inside?: boolean;
}

export const chargeScale = ([first, last]: readonly [number, number], rect: Rect) =>
  linearScale([first, last], [rect.y, bottom(rect)]);

const minus = '\u2212';

/**
 * Mean charge over pH, with the predominance stair as a ghost under it: how far the two differ is
 * the buffer region.
 */
export function ChargePanel(props: ChargePanelProps) {
  const { rect, x, charges, ranges, points, ghosts = [], head, inside = false } = props;
  const { colours } = useTheme();
  const y = chargeScale(charges, rect);
  const ghost = ranges
    .map(({ charge, from, to }) => {
      const start = from === null ? rect.x : x(from);
      const end = to === null ? rect.x + rect.width : x(to);
      return `L${start} ${y(charge)}H${end}`;
    })
    .join('');
  const [least, most] = [Math.min(...charges), Math.max(...charges)];
  // A curve beside may carry charges that the axis of this one does not reach.
  const pathOf = (curve: readonly ChargePoint[]) =>
    linePath(
      clipCurve(
        curve.map(({ pH, charge }) => ({ x: x(pH), y: charge })),
        [least, most],
      ).map((point) => ({ ...point, y: y(point.y) })),
    );
  return (
    <>
      <PanelFrame
        rect={rect}
        y={y}
        head={head}
        inside={inside}
        lines={wholeSteps(charges, rect.height).map((value) => ({
          value,
          label: String(value).replace('-', minus),
          kind: value === 0 ? 'axis' : charges.includes(value) ? 'bound' : 'grid',
        }))}
      />
      <Path d={`M${ghost.slice(1)}`} stroke={colours.edge} strokeWidth={1} fill="none" />
      {ghosts.map(({ key, points: curve }, place) => (
        <Path
          key={key}
          d={pathOf(curve)}
          stroke={colours.inkSoft}
          strokeWidth={1.25}
          strokeDasharray={ghostDash(place)}
          fill="none"
        />
      ))}
      <Path d={pathOf(points)} stroke={colours.ink} strokeWidth={2.25} fill="none" />
    </>
  );
}
