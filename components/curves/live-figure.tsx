import './no-eval';
import { useState } from 'react';
import { View } from 'react-native';
import type { Choice } from '../constants/choice';
import { Skeleton } from '../ui/skeleton';
import { conditionsInFigure } from './conditions';
import { useCurve, useReading } from './curve-queries';
import { CurvesFigure } from './curves-figure';
import { firstState, type Layer } from './curves-state';

interface LiveFigureProps {
  /** The same object as long as the system is the same. */
  readonly choice: Choice;
  readonly layers: readonly Layer[];
  readonly height: number;
  readonly compact: boolean;
}

/** A curve outside Curves, alive: its cursor moves, and starts where Curves starts. */
export function LiveFigure({ choice, layers, height, compact }: LiveFigureProps) {
  const [pH, setPH] = useState(firstState.pH);
  const [width, setWidth] = useState(0);
  const { drawn, isFetching } = useCurve(choice);
  const reading = useReading(drawn, pH);
  return (
    <View
      onLayout={({ nativeEvent }) => setWidth(Math.floor(nativeEvent.layout.width))}
      style={{ minHeight: height }}
    >
      {drawn && reading && width > 0 && (
        <CurvesFigure
          drawn={drawn}
          reading={reading}
          layers={layers}
          width={width}
          height={height}
          compact={compact}
          caption={conditionsInFigure(drawn)}
          onMove={setPH}
        />
      )}
      {!drawn && isFetching && <Skeleton label="The curve is being computed" lines={6} />}
    </View>
  );
}
