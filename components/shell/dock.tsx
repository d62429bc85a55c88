import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space, useTheme } from '../ui/theme';
import { webStyle } from '../ui/web-style';
import { barHeight } from './bar-item';

/** A phone's main action, at the thumb, over the bar; the page scrolls behind it. */
export function Dock({ children }: { readonly children: ReactNode }) {
  const { colours } = useTheme();
  return (
    <View style={[styles.dock, { backgroundColor: colours.page, borderTopColor: colours.rule }]}>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  dock: {
    marginTop: 'auto',
    paddingVertical: space[3],
    paddingHorizontal: space[4],
    borderTopWidth: 1,
    ...webStyle({
      position: 'sticky',
      bottom: `calc(${barHeight - 1}px + env(safe-area-inset-bottom))`,
      zIndex: 1,
    }),
  },
});
