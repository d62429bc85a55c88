import type { Ref } from 'react';
import { StyleSheet, View } from 'react-native';
import { Empty } from '../ui/empty';
import { space, useTheme } from '../ui/theme';
import { useLong } from '../ui/use-settled';
import { Words } from '../ui/words';
import type { Layer } from './curves-state';
import { MeasuredFigure } from './measured-figure';
import type { Curves } from './use-curves';

interface CurvePlotProps {
  readonly curves: Curves;
  readonly layers: readonly Layer[];
  readonly height: number;
  readonly compact: boolean;
  readonly figure: Ref<View>;
}

/** The figure of Curves, and what stands in its place. */
export function CurvePlot({ curves, layers, ...figure }: CurvePlotProps) {
  const { state, drawn, reading, extras, curve, move } = curves;
  const { colours } = useTheme();
  const late = useLong(curve.isFetching && drawn !== undefined);
  const empty = !layers.some((layer) => layer !== 'isoelectric-point');
  return (
    <MeasuredFigure
      {...figure}
      drawn={drawn}
      reading={reading}
      isFetching={curve.isFetching}
      layers={empty ? [] : layers}
      extras={extras}
      total={Number(state.total)}
      onMove={move}
    >
      <View style={figure.compact && styles.inside}>
        {empty && (
          <Empty title="Nothing is drawn">Choose a layer to draw it over the pH axis.</Empty>
        )}
        {!drawn && curve.error && !empty && (
          <Empty title="Nothing is drawn yet">
            The curve asked for was refused; change what is asked.
          </Empty>
        )}
      </View>
      {late && (
        <View role="status" style={[styles.late, { backgroundColor: colours.page }]}>
          <Words kind="help">The new curve is being computed</Words>
        </View>
      )}
    </MeasuredFigure>
  );
}

const styles = StyleSheet.create({
  inside: { marginHorizontal: space[4] },
  late: { position: 'absolute', top: 0, right: 16 },
});
