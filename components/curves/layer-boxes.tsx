import { View } from 'react-native';
import { Checkbox } from '../ui/checkbox';
import { Quantity } from '../ui/quantity';
import { Words } from '../ui/words';
import type { Layer } from './curves-state';
import { layers } from './curves-state';

const names: Readonly<Record<Layer, string>> = {
  fractions: 'Fractions',
  predominance: 'Predominance',
  charge: 'Mean charge',
};
const symbols = {
  fractions: <Quantity of="alpha" size={12} tone="inkSoft" />,
  predominance: undefined,
  charge: <Quantity of="meanCharge" size={12} tone="inkSoft" />,
} as const;

interface LayerBoxesProps {
  readonly shown: readonly Layer[];
  readonly onChange: (layers: readonly Layer[]) => void;
}

/** What is drawn over the one pH axis. */
export function LayerBoxes({ shown, onChange }: LayerBoxesProps) {
  return (
    <View role="group" aria-label="Layers">
      <Words kind="label">Layers</Words>
      {layers.map((layer) => (
        <Checkbox
          key={layer}
          label={names[layer]}
          note={symbols[layer]}
          checked={shown.includes(layer)}
          onChange={(on) =>
            onChange(layers.filter((name) => (name === layer ? on : shown.includes(name))))
          }
        />
      ))}
    </View>
  );
}
