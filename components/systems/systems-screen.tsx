import Head from 'expo-router/head';
import { StyleSheet, View } from 'react-native';
import { Page } from '../shell/page';
import { Empty } from '../ui/empty';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { useScrollKept } from '../ui/use-scroll-kept';
import { SystemsList } from './systems-list';
import { useSearchText } from './use-search-text';

/** Systems: which constants do we use, and from where. */
export function SystemsScreen() {
  const { readOutAside: beside } = useLayout();
  return beside ? <Nothing /> : <ListPage />;
}

function ListPage() {
  const [text, setText] = useSearchText(true);
  useScrollKept();
  return (
    <Page title="Systems">
      <View style={styles.list}>
        <SystemsList text={text} onText={setText} />
      </View>
    </Page>
  );
}

/** Beside the list while no system is chosen. */
function Nothing() {
  return (
    <View style={styles.nothing}>
      <Head>
        <title>Systems · Stepwell</title>
      </Head>
      <Empty title="No system is chosen">
        Choose one from the list: its constants are shown here, each with its source.
      </Empty>
    </View>
  );
}

const styles = StyleSheet.create({
  list: { width: '100%', maxWidth: 760 },
  nothing: { padding: space[6], paddingTop: 76 },
});
