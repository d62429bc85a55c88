import { useMemo, type ReactNode, type Ref } from 'react';
import { View } from 'react-native';
import Svg from 'react-native-svg';
import { CapacityPanel, capacityScale, type CapacityLine } from '../chart/capacity-panel';
import { FigureCursor, tabCentre } from '../chart/figure-cursor';
import { right, type Rect } from '../chart/geometry';
import { PhAxis } from '../chart/ph-axis';
import { linearScale } from '../chart/scale';
import { betaSign } from '../chart/symbols';
import { ValueDot, valueBox } from '../chart/value-dot';
import { useTheme } from '../ui/theme';
import { CapacityNames } from './capacity-names';
import type { DrawnCapacity } from './drawn-capacity';
import { shownPH } from './rounded';

interface CapacityFigureProps {
  readonly drawn: DrawnCapacity;
  /** The figure in words. */
  readonly sentence: string;
  readonly width: number;
  readonly height: number;
  readonly compact: boolean;
  /** Conditions, printed under the axis where there is room. */
  readonly caption: ReactNode;
  readonly ref?: Ref<View>;
}

const room = {
  wide: { left: 36, right: 14, top: 34, axis: 58 },
  compact: { left: 16, right: 16, top: 40, axis: 42 },
} as const;

/** Width of the numerals inside a compact panel, px. */
const numeralsRoom = 32;

/** Buffer capacity of the mixture around its pH: the whole, and the part of each system. */
export function CapacityFigure(props: CapacityFigureProps) {
  const { drawn, sentence, width, height, compact, caption, ref } = props;
  const { series } = useTheme();
  const own = room[compact ? 'compact' : 'wide'];
  const axis = height - own.axis;
  const rect = useMemo(
    () => ({
      x: own.left,
      y: own.top,
      width: width - own.left - own.right,
      height: axis - own.top,
    }),
    [own, width, axis],
  );
  const x = useMemo(() => linearScale(drawn.range, [rect.x, right(rect)]), [drawn, rect]);
  const y = useMemo(() => capacityScale(rect, drawn.top), [rect, drawn]);
  const lines = useMemo(
    () => [
      ...drawn.parts.map(({ series: index, values }): CapacityLine => ({
        key: String(index),
        pH: drawn.pH,
        values,
        kind: 'whole',
        style: series(index),
      })),
      { key: 'whole', pH: drawn.pH, values: drawn.whole, kind: 'whole' } as const,
    ],
    [drawn, series],
  );
  const cursor = x(drawn.at.pH);
  const isOnScale = drawn.at.value <= drawn.top;
  const dot = {
    x: cursor,
    y: isOnScale ? y(drawn.at.value) : undefined,
    top: rect.y,
    // On the side away from where the curve rises.
    limit: rises(drawn) ? cursor : right(rect),
    text: drawn.at.text,
  };
  const taken = useTaken(rect, compact, dot);
  const pH = shownPH(String(drawn.at.pH)).replace('-', '\u2212');
  const line = { x: cursor, top: own.top - 6, axis, width, text: pH };
  return (
    <View ref={ref} role="img" aria-label={sentence}>
      <Svg width={width} height={height} aria-hidden>
        <CapacityPanel
          rect={rect}
          x={x}
          top={drawn.top}
          lines={lines}
          filled
          inside={compact}
          head={
            <>
              {betaSign}
              {compact
                ? '  in mmol/L per pH'
                : '  buffer capacity of the mixture, in mmol/L per pH'}
            </>
          }
        />
        <PhAxis
          x={x}
          domain={drawn.range}
          y={axis}
          tab={tabCentre(cursor, width)}
          titled={!compact}
          caption={compact ? undefined : caption}
        />
        <FigureCursor {...line} part="line" />
        <CapacityNames drawn={drawn} rect={rect} x={x} y={y} cursor={cursor} taken={taken} />
        <ValueDot {...dot} />
        <FigureCursor {...line} part="tab" />
      </Svg>
    </View>
  );
}

/** Room of the value beside its dot, pH. */
const beside = 0.8;

/** Whether the whole stands higher just after the answer's pH than just before it. */
function rises({ pH, whole, at }: DrawnCapacity): boolean {
  const most = (from: number, to: number) =>
    Math.max(...whole.filter((_, i) => (pH[i] ?? 0) > from && (pH[i] ?? 0) < to));
  return most(at.pH, at.pH + beside) > most(at.pH - beside, at.pH);
}

/** What is written in the panel before names are: the value at the pH, numerals inside it. */
function useTaken(rect: Rect, compact: boolean, dot: Parameters<typeof valueBox>[0]) {
  const { x, y, width, height } = valueBox(dot);
  return useMemo(() => {
    const value = { x, y, width, height };
    return compact ? [value, { ...rect, width: numeralsRoom }] : [value];
  }, [x, y, width, height, rect, compact]);
}
