import { View } from 'react-native';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { PhControl } from './ph-control';
import { ReadOut } from './read-out';
import type { Curves } from './use-curves';

interface SidePanelProps {
  readonly curves: Curves;
  readonly columns: boolean;
}

/** The pH and what is present at it, on a wide screen. */
export function SidePanel({ curves, columns }: SidePanelProps) {
  const { state, drawn, reading, shown, extras, move } = curves;
  if (!drawn || !reading) return null;
  return (
    <View style={{ gap: space[4] }}>
      <View style={{ gap: space[1], maxWidth: 320 }}>
        <PhControl pH={reading.pH} range={drawn.range} onMove={move} />
        <Words kind="help">Arrow keys move 0.01, Page keys 0.5</Words>
      </View>
      <ReadOut
        drawn={drawn}
        reading={reading}
        shown={shown}
        extras={extras}
        total={state.total}
        columns={columns}
      />
    </View>
  );
}
