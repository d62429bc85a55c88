import { StyleSheet, View } from 'react-native';
import { Icon } from '../ui/icon';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import type { KeyStanding } from './key-standing';

/** How a key stands: icon and word. */
export function KeyStatus({ icon, tone, word }: KeyStanding) {
  return (
    <View style={styles.status}>
      <Icon name={icon} size={16} tone={tone} />
      <Words kind="label" tone={tone} numberOfLines={1}>
        {word}
      </Words>
    </View>
  );
}

const styles = StyleSheet.create({
  status: { flexDirection: 'row', alignItems: 'center', gap: space[1] },
});
