import type { ErrorBoundaryProps } from 'expo-router';
import { View } from 'react-native';
import { Button } from '../ui/button';
import { Notice } from '../ui/notice';
import { Words } from '../ui/words';
import { Page } from './page';
import { Prose } from './prose';

/** What stands in a place that failed: the rest of the app goes on. */
export function RouteError({ error, retry }: ErrorBoundaryProps) {
  return (
    <Page title="This page stopped" heading="This page stopped">
      <Prose>
        <Notice tone="bad" title="Something in this page went wrong">
          <Words>
            Nothing you saved is lost. Try again; if it stops again, tell us what it says here.
          </Words>
          <Words kind="help">{error.message}</Words>
        </Notice>
        <View style={{ flexDirection: 'row' }}>
          <Button kind="primary" label="Try again" onPress={() => void retry()} />
        </View>
      </Prose>
    </Page>
  );
}
