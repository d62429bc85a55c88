import { StyleSheet, View } from 'react-native';
import { Numerals } from '../ui/numerals';
import { space } from '../ui/theme';

/** Constants side by side, digit under digit from row to row. */
export function ConstantValues({ pKa }: { readonly pKa: readonly string[] }) {
  return (
    <View style={styles.values}>
      {pKa.map((value, step) => (
        <View key={step} style={styles.value}>
          <Numerals size={14}>{value}</Numerals>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  values: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space[3], flexShrink: 1 },
  value: { minWidth: 52 },
});
