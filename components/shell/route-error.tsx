import type { ErrorBoundaryProps } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { Notice } from '../ui/notice';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { Page } from './page';

/**
 * What stands in a place that failed. It reloads rather than draws again: code that could not be
 * fetched stays missing until then, and the address brings the screen back as it was.
 */
export function RouteError({ error }: ErrorBoundaryProps) {
  return (
    <Page title="This page stopped">
      <View style={styles.content}>
        <Notice tone="bad" title="Something in this page went wrong">
          <Words>
            Reload it: what you entered is in the address and comes back. If it stops again, tell us
            what it says here.
          </Words>
          <Words kind="help">{error.message}</Words>
        </Notice>
        <Button kind="primary" label="Reload" onPress={() => window.location.reload()} />
      </View>
    </Page>
  );
}

const styles = StyleSheet.create({
  content: { alignItems: 'flex-start', gap: space[4], maxWidth: 480 },
});
