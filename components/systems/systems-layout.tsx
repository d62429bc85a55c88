import '../curves/no-eval';
import { Slot, usePathname } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { space, useTheme } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import { SystemsList } from './systems-list';
import { useSearchText } from './use-search-text';

/**
 * From 1200 px the list stays beside the system that is read: it scrolls by itself, and keeps what
 * was searched for. Narrower, list and system are pages of their own.
 */
export function SystemsLayout() {
  const { readOutAside: beside } = useLayout();
  return beside ? <Beside /> : <Slot />;
}

function Beside() {
  const { colours } = useTheme();
  const pathname = usePathname();
  const isList = pathname === '/systems';
  const [text, setText] = useSearchText(isList);
  const chosen = isList ? undefined : decodeURIComponent(pathname.slice('/systems/'.length));
  return (
    <View style={styles.columns}>
      <View style={[styles.list, { borderRightColor: colours.rule }]}>
        <View style={styles.head}>
          <Words kind="title" heading={isList ? 1 : 2}>
            Systems
          </Words>
        </View>
        <SystemsList text={text} onText={setText} chosen={chosen} />
      </View>
      <View style={styles.detail}>
        <Slot />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  columns: { flexDirection: 'row', alignItems: 'flex-start' },
  list: {
    flexBasis: 592,
    flexShrink: 1,
    minWidth: 400,
    paddingHorizontal: space[6],
    paddingBottom: space[6],
    borderRightWidth: 1,
    ...webStyle({ position: 'sticky', top: 0, height: '100dvh', overflowY: 'auto' }),
  },
  head: { minHeight: 76, justifyContent: 'center' },
  detail: { flex: 1, minWidth: 520 },
});
