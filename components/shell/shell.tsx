import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { SessionEnded } from '../account/session-ended';
import { useTheme } from '../ui/theme';
import { ToastProvider } from '../ui/toast';
import { useLayout } from '../ui/use-layout';
import { webStyle } from '../ui/web-style';
import { Bar, barHeight } from './bar';
import { Rail } from './rail';
import { mainId, SkipLink } from './skip-link';

/**
 * The frame around every place. The document itself scrolls, so that keys, gestures and the
 * browser's memory of the position work as on any page; rail and bar stay in sight.
 */
export function Shell({ children }: { readonly children: ReactNode }) {
  const { colours } = useTheme();
  const { rail } = useLayout();
  return (
    <ToastProvider
      bottom={rail ? '24px' : `calc(${barHeight + 12}px + env(safe-area-inset-bottom))`}
    >
      <View
        style={[
          styles.shell,
          { flexDirection: rail ? 'row' : 'column', backgroundColor: colours.page },
        ]}
      >
        <SkipLink />
        {rail ? <Rail /> : null}
        <View id={mainId} role="main" tabIndex={-1} style={styles.main}>
          <SessionEnded />
          {children}
        </View>
        {rail ? null : <Bar />}
      </View>
    </ToastProvider>
  );
}

const styles = StyleSheet.create({
  shell: {
    flexGrow: 1,
    ...webStyle({
      minHeight: '100dvh',
      paddingTop: 'env(safe-area-inset-top)',
      paddingLeft: 'env(safe-area-inset-left)',
      paddingRight: 'env(safe-area-inset-right)',
    }),
  },
  main: { flexGrow: 1, flexShrink: 1, minWidth: 0 },
});
