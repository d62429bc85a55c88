import { useMemo, type ReactNode } from 'react';
import { Path } from 'react-native-svg';
import { useTheme, type SeriesStyle } from '../ui/theme';
import { clipCurve } from './clip-curve';
import type { Rect } from './geometry';
import { bottom } from './geometry';
import { ghostDash } from './ghost-dash';
import { linePath } from './line-path';
import { Marker } from './marker';
import { PanelFrame } from './panel-frame';
import type { Scale } from './scale';
import { linearScale } from './scale';
import { SeriesLine } from './series-line';

/** One line of capacity, mmol/L per pH. */
export interface CapacityLine {
  readonly key: string;
  readonly pH: readonly number[];
  readonly values: readonly number[];
  /** `ghost` for one that is compared with. */
  readonly kind: 'whole' | 'ghost';
  /** Of one component of a mixture, in place of the kind’s. */
  readonly style?: SeriesStyle;
}

interface CapacityPanelProps {
  readonly rect: Rect;
  readonly x: Scale;
  /** Where the axis ends, mmol/L per pH: what passes it is clipped. */
  readonly top: number;
  readonly lines: readonly CapacityLine[];
  readonly maxima?: readonly { readonly pH: number; readonly value: number }[];
  readonly head?: ReactNode;
  readonly inside?: boolean;
  /** Water under the whole. */
  readonly filled?: boolean;
}

export const capacityScale = (rect: Rect, top: number) =>
  linearScale([0, top], [bottom(rect), rect.y]);

/** A part below this share of the axis is not drawn: no bundle of dashes on the zero line. */
const penDown = 0.004;

const strokes = { whole: 2.25, ghost: 1.25 } as const;

/** Buffer capacity over pH, clipped at the top, with its maxima marked. */
export function CapacityPanel(props: CapacityPanelProps) {
  const { rect, x, top, lines, maxima = [], head, inside = false, filled = false } = props;
  const { colours } = useTheme();
  const y = useMemo(() => capacityScale(rect, top), [rect, top]);
  const paths = useMemo(() => {
    const ghosts = lines.filter(({ kind }) => kind === 'ghost');
    return lines.map((line) => {
      const { key, pH, values, kind, style } = line;
      const dash = kind === 'ghost' ? ghostDash(ghosts.indexOf(line)) : undefined;
      const points = values.map((value, i) => ({ x: x(pH[i] ?? 0), y: value }));
      const clipped = clipCurve(points, [style ? top * penDown : 0, top]);
      const d = linePath(clipped.map((point) => ({ ...point, y: y(point.y) })));
      return { key, kind, style, dash, d };
    });
  }, [lines, x, y, top]);
  const under = useMemo(() => {
    const whole = filled ? lines.find(({ kind, style }) => kind === 'whole' && !style) : undefined;
    if (!whole) return undefined;
    const edge = whole.values.map((value, i) => ({
      x: x(whole.pH[i] ?? 0),
      y: y(Math.min(value, top)),
      drawn: true,
    }));
    return `${linePath(edge)}V${y(0)}H${edge[0]?.x ?? rect.x}Z`;
  }, [filled, lines, x, y, top, rect]);
  return (
    <>
      {under !== undefined && <Path d={under} fill={colours.wash} />}
      <PanelFrame
        rect={rect}
        y={y}
        inside={inside}
        {...(head === undefined ? {} : { head })}
        lines={[0, top / 2, top].map((value) => ({
          value,
          label: inside && value === 0 ? '' : String(Number(value.toPrecision(3))),
          kind: value === 0 ? 'axis' : 'grid',
        }))}
      />
      {paths.map(({ key, kind, style, dash, d }) =>
        style ? (
          <SeriesLine key={key} d={d} style={style} casing={filled ? colours.page : undefined} />
        ) : (
          <Path
            key={key}
            d={d}
            stroke={kind === 'whole' ? colours.ink : colours.inkSoft}
            strokeWidth={strokes[kind]}
            strokeDasharray={dash}
            fill="none"
          />
        ),
      )}
      {maxima
        .filter(({ value }) => value <= top)
        .map(({ pH, value }) => (
          <Marker
            key={pH}
            shape="triangle-down"
            x={x(pH)}
            y={y(value) - 7}
            colour={colours.clay}
            ring={colours.page}
            scale={0.8}
          />
        ))}
    </>
  );
}
