import type { Ref } from 'react';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { Empty } from '../ui/empty';
import { Skeleton } from '../ui/skeleton';
import { useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import { conditionsInFigure } from './conditions';
import { CurvesFigure } from './curves-figure';
import type { Layer } from './curves-state';
import type { Curves } from './use-curves';
import { useLong } from '../ui/use-settled';

interface CurvePlotProps {
  readonly curves: Curves;
  readonly layers: readonly Layer[];
  readonly height: number;
  readonly compact: boolean;
  readonly figure: Ref<View>;
}

/** The place of the figure: as wide as it finds, as high as it is told, whatever stands in it. */
export function CurvePlot({ curves, layers, height, compact, figure }: CurvePlotProps) {
  const { drawn, reading, curve, move } = curves;
  const { colours } = useTheme();
  const [width, setWidth] = useState(0);
  const late = useLong(curve.isFetching && drawn !== undefined);
  const full = { minHeight: height };
  return (
    <View
      onLayout={({ nativeEvent }) => setWidth(Math.floor(nativeEvent.layout.width))}
      style={full}
    >
      {layers.length === 0 && (
        <Empty title="Nothing is drawn">Choose a layer to draw it over the pH axis.</Empty>
      )}
      {drawn && reading && width > 0 && layers.length > 0 && (
        <CurvesFigure
          ref={figure}
          drawn={drawn}
          reading={reading}
          layers={layers}
          width={width}
          height={height}
          compact={compact}
          caption={conditionsInFigure(drawn)}
          onMove={move}
        />
      )}
      {!drawn && curve.isFetching && <Skeleton label="The curve is being computed" lines={6} />}
      {late && (
        <View role="status" style={[styles.late, { backgroundColor: colours.page }]}>
          <Words kind="help">The new curve is being computed</Words>
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  late: { position: 'absolute', top: 0, right: 16 },
});
