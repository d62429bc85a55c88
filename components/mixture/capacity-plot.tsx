import { useMemo, useState, type Ref } from 'react';
import { StyleSheet, View } from 'react-native';
import { DataTable } from '../ui/data-table';
import { Disclosure } from '../ui/disclosure';
import { space } from '../ui/theme';
import { CapacityFigure } from './capacity-figure';
import { conditionsInFigure, ConditionsLine } from './conditions-text';
import { describeCapacity } from './describe';
import type { Answered } from './mixture-queries';
import { drawnCapacity, type DrawnCapacity } from './drawn-capacity';
import { shownAmount } from './rounded';

interface CapacityPlotProps {
  readonly answered: Answered;
  readonly height: number;
  readonly compact: boolean;
  readonly figure: Ref<View>;
}

/** The place of the capacity curve: as wide as it finds, as high as it is told. */
export function CapacityPlot({ answered, height, compact, figure }: CapacityPlotProps) {
  const [width, setWidth] = useState(0);
  const drawn = useMemo(() => drawnCapacity(answered), [answered]);
  return (
    <View>
      <View
        onLayout={({ nativeEvent }) => setWidth(Math.floor(nativeEvent.layout.width))}
        style={[{ minHeight: height }, compact && styles.edge]}
      >
        {width > 0 && (
          <CapacityFigure
            ref={figure}
            drawn={drawn}
            sentence={describeCapacity(drawn, answered)}
            width={width}
            height={height}
            compact={compact}
            caption={conditionsInFigure(answered)}
          />
        )}
      </View>
      {compact && <ConditionsLine answered={answered} />}
      <CapacityNumbers drawn={drawn} />
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
});
