import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import type { Choice } from '../constants/choice';
import type { Layer } from '../curves/curves-state';
import { LiveFigure } from '../curves/live-figure';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';

const layers: readonly Layer[] = ['fractions', 'predominance'];
const heights = { phone: 386, wide: 400 } as const;

/** The curve that a system's preferred constants give. */
export function SystemFigure({ id }: { readonly id: string }) {
  const { rail } = useLayout();
  const choice = useMemo<Choice>(() => ({ kind: 'stored', id }), [id]);
  return (
    // On a phone the plot spans the window, as in Curves.
    <View style={!rail && styles.edge}>
      <LiveFigure
        choice={choice}
        layers={layers}
        height={heights[rail ? 'wide' : 'phone']}
        compact={!rail}
      />
    </View>
  );
}

const styles = StyleSheet.create({ edge: { marginHorizontal: -space[4] } });
