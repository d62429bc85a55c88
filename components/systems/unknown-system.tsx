import { Link } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { Page } from '../shell/page';
import { Numerals } from '../ui/numerals';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { SystemColumn } from './system-column';

/** No system has this id. */
export function UnknownSystem({ id }: { readonly id: string }) {
  return (
    <SystemColumn>
      <Page title="No such system">
        <View style={styles.content}>
          <Words>
            No system has the id <Numerals>{id}</Numerals>. It may be mistyped, or belong to another
            organization. Ids of the handbook never change.
          </Words>
          <Link href="/systems" style={styles.link}>
            <Words kind="button" tone="well">
              Find a system
            </Words>
          </Link>
        </View>
      </Page>
    </SystemColumn>
  );
}

const styles = StyleSheet.create({
  content: { gap: space[2], maxWidth: 560 },
  link: { paddingVertical: 11, alignSelf: 'flex-start' },
});
