import { StyleSheet, View } from 'react-native';
import type { Constant } from '../../shared/constant';
import { Icon } from '../ui/icon';
import { space } from '../ui/theme';
import { Words } from '../ui/words';

/** Whether a value is less than a measurement. */
export function ConstantFlags({
  estimate,
  approximate,
}: Pick<Constant, 'estimate' | 'approximate'>) {
  if (!estimate && !approximate) return null;
  return (
    <View style={styles.flag}>
      <Icon name="warning" size={16} tone="warn" />
      <Words kind="help" tone="warn">
        {estimate ? 'estimate, not measured' : 'approximate'}
      </Words>
    </View>
  );
}

const styles = StyleSheet.create({
  flag: { flexDirection: 'row', alignItems: 'center', gap: space[1] },
});
