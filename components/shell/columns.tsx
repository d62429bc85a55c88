import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '../ui/theme';

/** Columns of text side by side where they fit, below each other where not. */
export function Columns({ children }: { readonly children: ReactNode }) {
  return <View style={styles.columns}>{children}</View>;
}

const styles = StyleSheet.create({
  columns: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space[14], rowGap: space[8] },
});
