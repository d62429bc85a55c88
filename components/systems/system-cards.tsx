import { StyleSheet, View } from 'react-native';
import type { SystemSummary } from '../../shared/stored-system';
import { Quantity } from '../ui/quantity';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import { ConstantValues } from './constant-values';
import { SystemLink } from './system-link';
import { WrittenAs } from './written-as';

interface SystemCardsProps {
  readonly systems: readonly SystemSummary[];
  readonly chosen?: string | undefined;
}

/** Systems on a phone, parted by rules: the whole card leads to its system. */
export function SystemCards({ systems, chosen }: SystemCardsProps) {
  const { colours } = useTheme();
  return (
    <View role="list">
      {systems.map((system) => (
        <View
          key={system.id}
          role="listitem"
          style={[styles.card, { borderTopColor: colours.rule }]}
        >
          <SystemLink system={system} chosen={system.id === chosen} />
          <WrittenAs system={system} />
          <View style={styles.constants}>
            <Words kind="help">
              <Quantity of="pKa" />
            </Words>
            <ConstantValues pKa={system.pKa} />
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  card: { borderTopWidth: 1, paddingVertical: space[3], gap: 2 },
  constants: { flexDirection: 'row', alignItems: 'baseline', gap: space[2] },
});
