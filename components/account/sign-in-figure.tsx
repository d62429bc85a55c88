import '../curves/no-eval';
import { useState } from 'react';
import { View } from 'react-native';
import { conditionsInFigure } from '../curves/conditions';
import { useCurve, useReading } from '../curves/curve-queries';
import { CurvesFigure } from '../curves/curves-figure';
import { firstState, type Layer } from '../curves/curves-state';
import { Skeleton } from '../ui/skeleton';

interface SignInFigureProps {
  readonly layers: readonly Layer[];
  readonly height: number;
  readonly compact: boolean;
}

/** The public curve, alive: what the work is about, before anybody signs in. */
export function SignInFigure({ layers, height, compact }: SignInFigureProps) {
  const { choice } = firstState;
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
          caption={conditionsInFigure(choice)}
          onMove={setPH}
        />
      )}
      {!drawn && isFetching && <Skeleton label="The curve is being computed" lines={6} />}
    </View>
  );
}
