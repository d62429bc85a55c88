import type { ReactNode } from 'react';
import { View } from 'react-native';
import { totalAsked } from '../conditions/asked-quantities';
import { QuantityField } from '../conditions/quantity-field';
import { Checkbox } from '../ui/checkbox';
import { Quantity } from '../ui/quantity';
import { Words } from '../ui/words';
import type { Layer } from './curves-state';
import { layers } from './curves-state';
import { whyNoPoint } from './isoelectric';
import type { Curves } from './use-curves';

const names: Readonly<Record<Layer, string>> = {
  fractions: 'Fractions',
  predominance: 'Predominance',
  charge: 'Mean charge',
  capacity: 'Buffer capacity',
  'lg-c': 'Logarithmic diagram',
  'isoelectric-point': 'Isoelectric point',
};
const symbols: Readonly<Record<Layer, ReactNode>> = {
  fractions: <Quantity of="alpha" size={12} tone="inkSoft" />,
  predominance: undefined,
  charge: <Quantity of="meanCharge" size={12} tone="inkSoft" />,
  capacity: <Quantity of="beta" size={12} tone="inkSoft" />,
  'lg-c': (
    <Words kind="help">
      lg <Quantity of="concentration" />
    </Words>
  ),
  'isoelectric-point': <Quantity of="isoelectricPoint" size={12} tone="inkSoft" />,
};

/** What is drawn over the one pH axis. */
export function LayerBoxes({ state, drawn, change }: Pick<Curves, 'state' | 'drawn' | 'change'>) {
  const shown = state.layers;
  const noPoint = drawn && whyNoPoint(drawn);
  return (
    <View>
      <View role="group" aria-label="Layers">
        <Words kind="label">Layers</Words>
        {layers.map((layer) => {
          const why = layer === 'isoelectric-point' ? noPoint : undefined;
          return (
            <Checkbox
              key={layer}
              label={names[layer]}
              note={why ?? symbols[layer]}
              disabled={why !== undefined}
              checked={shown.includes(layer) && why === undefined}
              onChange={(on) =>
                change({
                  layers: layers.filter((name) => (name === layer ? on : shown.includes(name))),
                })
              }
            />
          );
        })}
      </View>
      {(shown.includes('capacity') || shown.includes('lg-c')) && (
        <TotalField state={state} change={change} />
      )}
    </View>
  );
}

/** The total concentration that buffer capacity and lg c are drawn for. */
export function TotalField({ state, change }: Pick<Curves, 'state' | 'change'>) {
  return (
    <QuantityField
      label="Total concentration"
      asked={totalAsked}
      value={state.total}
      onChange={(total) => change({ total })}
      help="Of the system, for capacity and lg c."
    />
  );
}
