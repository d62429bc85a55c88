import { useMemo, useState } from 'react';
import type { ReactNode, Ref } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg from 'react-native-svg';
import type { CursorMove } from '../chart/cursor-keys';
import { CursorSlider } from '../chart/cursor-slider';
import { FigureCursor, tabCentre } from '../chart/figure-cursor';
import { PhAxis } from '../chart/ph-axis';
import { linearScale } from '../chart/scale';
import { usePlotDrag } from '../chart/use-plot-drag';
import { webStyle } from '../ui/web-style';
import { CapacityCurve } from './capacity-curve';
import { ChargeLine } from './charge-line';
import { CursorMarks } from './cursor-marks';
import { firstState, type Layer } from './curves-state';
import { describeFigure, describeReading } from './describe';
import type { DrawnCurve } from './drawn-curve';
import { noExtras, type FigureExtras } from './figure-extras';
import { figureLayout } from './figure-layout';
import type { Reading } from './follow-curve';
import { FractionLines } from './fraction-lines';
import { IsoelectricMark } from './isoelectric-mark';
import { LgCLines } from './lg-c-lines';
import { pHAt, pHEnd, pHStep } from './ph-steps';
import { PredominanceStair } from './predominance-stair';

interface CurvesFigureProps {
  readonly drawn: DrawnCurve;
  readonly reading: Reading;
  readonly layers: readonly Layer[];
  readonly extras?: FigureExtras;
  /** Total that lg c is drawn for, mol/L. */
  readonly total?: number;
  readonly width: number;
  readonly height: number;
  readonly compact: boolean;
  /** Conditions, printed under the axis. */
  readonly caption: ReactNode;
  readonly onMove: (pH: string) => void;
  readonly ref?: Ref<View>;
}

/** The layers on one pH axis, with the cursor over all of them. */
export function CurvesFigure(props: CurvesFigureProps) {
  const { drawn, reading, layers, width, height, compact, caption, onMove, ref } = props;
  const { extras = noExtras, total = Number(firstState.total) } = props;
  const { range } = drawn;
  const layout = useMemo(
    () => figureLayout({ width, height, layers, compact }),
    [width, height, layers, compact],
  );
  const x = useMemo(() => linearScale(range, [layout.left, layout.right]), [range, layout]);
  const cursor = x(Number(reading.pH));
  const placing = useCursorWhenDrawn(drawn, cursor);
  const drag = usePlotDrag((px) => onMove(pHAt(x.invert(px), range)));
  const step = (move: CursorMove) =>
    onMove('to' in move ? pHEnd(move.to, range) : pHStep(reading.pH, move.by, move.sign, range));
  const line = { x: cursor, top: 4, axis: layout.axis, width, text: reading.pH };
  const shared = { drawn, x, compact, strong: reading.predominant };
  const named = { ...shared, cursor, placing };
  const { panels } = layout;
  const { beside, capacity, isoelectricPoint } = extras;
  // Where the fractions are drawn, the names stand there.
  const lines = { ...shared, placing, named: panels.fractions === undefined };
  return (
    <View style={{ width, height: layout.height }}>
      <View ref={ref} role="img" aria-label={describeFigure(drawn, reading, layers, extras)}>
        <Svg width={width} height={layout.height} aria-hidden>
          {panels.predominance && (
            <PredominanceStair
              part="stone"
              rect={panels.predominance}
              reading={reading}
              drawn={drawn}
              x={x}
            />
          )}
          {panels.charge && <ChargeLine {...lines} beside={beside} rect={panels.charge} />}
          {panels.capacity && (
            <CapacityCurve {...lines} extras={extras} total={total} rect={panels.capacity} />
          )}
          {panels['lg-c'] && (
            <LgCLines {...named} rect={panels['lg-c']} total={total} capacity={capacity} />
          )}
          {panels.fractions && <FractionLines {...named} beside={beside} rect={panels.fractions} />}
          {isoelectricPoint !== undefined && layers.includes('isoelectric-point') && (
            <IsoelectricMark
              pH={isoelectricPoint}
              drawn={drawn}
              layout={layout}
              x={x(Number(isoelectricPoint))}
            />
          )}
          <PhAxis
            x={x}
            domain={range}
            y={layout.axis}
            tab={tabCentre(cursor, width)}
            titled={!compact}
            caption={compact ? undefined : caption}
          />
          <FigureCursor {...line} part="line" />
          {panels.predominance && (
            <PredominanceStair
              part="text"
              rect={panels.predominance}
              reading={reading}
              drawn={drawn}
              x={x}
            />
          )}
          <CursorMarks
            layout={layout}
            drawn={drawn}
            extras={extras}
            total={total}
            reading={reading}
            cursor={cursor}
          />
          <FigureCursor {...line} part="tab" />
        </Svg>
      </View>
      <View {...drag} style={[StyleSheet.absoluteFill, styles.plot]} />
      <CursorSlider
        label="pH cursor"
        x={cursor}
        axis={layout.axis}
        width={width}
        min={range[0]}
        max={range[1]}
        now={Number(reading.pH)}
        text={describeReading(drawn, reading)}
        onKey={step}
      />
    </View>
  );
}

/** Where the cursor stood when this curve first came. */
function useCursorWhenDrawn(drawn: DrawnCurve, cursor: number): number {
  const [placed, setPlaced] = useState({ drawn, cursor });
  if (placed.drawn === drawn) return placed.cursor;
  setPlaced({ drawn, cursor });
  return cursor;
}

const styles = StyleSheet.create({
  plot: webStyle({ touchAction: 'pan-y pinch-zoom', cursor: 'ew-resize', userSelect: 'none' }),
});
