import { useMemo, useState, type Ref } from 'react';
import { StyleSheet, View } from 'react-native';
import { DataTable } from '../ui/data-table';
import { Disclosure } from '../ui/disclosure';
import { Skeleton } from '../ui/skeleton';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { CapacityFigure } from './capacity-figure';
import { conditionsInFigure } from './conditions-text';
import { describeCapacity } from './describe';
import { drawnCapacity, type DrawnCapacity } from './drawn-capacity';
import type { Mixture } from './use-mixture';
import { shownAmount } from './rounded';

interface CapacityPlotProps extends Pick<Mixture, 'capacity' | 'state'> {
  readonly height: number;
  readonly compact: boolean;
  readonly figure: Ref<View>;
}

/** The place of the capacity curve: as wide as it finds, as high as it is told. */
export function CapacityPlot({ capacity, state, height, compact, figure }: CapacityPlotProps) {
  const { curve, isFetching, error } = capacity;
  const [width, setWidth] = useState(0);
  const drawn = useMemo(() => curve && drawnCapacity(curve), [curve]);
  return (
    <View>
      <View
        onLayout={({ nativeEvent }) => setWidth(Math.floor(nativeEvent.layout.width))}
        style={[{ minHeight: height }, compact && styles.edge]}
      >
        {curve && drawn && width > 0 && (
          <CapacityFigure
            ref={figure}
            drawn={drawn}
            sentence={describeCapacity(drawn, curve.of)}
            width={width}
            height={height}
            compact={compact}
            caption={conditionsInFigure(curve.of)}
          />
        )}
        {!curve && isFetching && <Skeleton label="The capacity is being computed" lines={6} />}
        {!curve && error && <Words kind="help">The capacity curve could not be fetched.</Words>}
      </View>
      {state.air !== undefined && (
        <View style={compact ? undefined : styles.note}>
          <Words kind="help">Without what the air takes up or gives off.</Words>
        </View>
      )}
      {drawn && <CapacityNumbers drawn={drawn} />}
    </View>
  );
}

/** The figure's data as a table: a row each half pH unit. */
function CapacityNumbers({ drawn }: { readonly drawn: DrawnCapacity }) {
  const { pH, whole, parts } = drawn;
  const shown = (value: number | undefined) => shownAmount(String(value ?? 0));
  return (
    <Disclosure label="Show the numbers">
      <DataTable
        caption="Buffer capacity in mmol/L per pH, each half unit of pH."
        maxHeight={360}
        columns={[
          { key: 'pH', head: 'pH', numeric: true },
          { key: 'whole', head: 'all together', numeric: true },
          ...parts.map(({ title, series }) => ({
            key: `part${series}`,
            head: title,
            numeric: true,
          })),
        ]}
        rows={pH.flatMap((at, i) =>
          Number.isInteger(at * 2)
            ? {
                key: String(at),
                pH: at.toFixed(1),
                whole: shown(whole[i]),
                ...Object.fromEntries(
                  parts.map(({ series, values }) => [`part${series}`, shown(values[i])]),
                ),
              }
            : [],
        )}
      />
    </Disclosure>
  );
}

const styles = StyleSheet.create({
  // From gutter to gutter.
  edge: { marginHorizontal: -space[4] },
  note: { marginLeft: 36 },
});
