import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { Failure } from '../ui/failure';
import { Notice } from '../ui/notice';
import { space } from '../ui/theme';
import { useOnline } from '../ui/use-online';
import { Words } from '../ui/words';
import type { Mixture } from './use-mixture';

/** What stands between the reader and the answer asked for. The last answer stays. */
export function MixtureNotices({ mixture }: { readonly mixture: Mixture }) {
  const { faulty, unread, call, faults, change } = mixture;
  const { passable } = faults.conditions;
  const online = useOnline();
  const failure = unread ?? call.error ?? call.failureReason;
  if (!faulty && online && !failure) return null;
  return (
    <View style={styles.notices}>
      {faulty && (
        <Notice tone="warn" title="Part of this address could not be used">
          What it left open is as in an empty flask.
        </Notice>
      )}
      {!online && (
        <Notice tone="warn" title="You are offline">
          The last answer stays. A new one comes when the connection is back.
        </Notice>
      )}
      {online && failure && passable && (
        <Notice tone="warn" title="Beyond what is trusted">
          <Words>The reason stands beside what it is about.</Words>
          <View style={styles.all}>
            <Button label="Compute all the same" onPress={() => change({ beyond: true })} />
          </View>
        </Notice>
      )}
      {online && failure && !passable && (
        <Failure
          error={failure}
          {...(!call.isFetching && { onRetry: () => void call.refetch() })}
        />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  notices: { gap: space[2] },
  all: { alignItems: 'flex-start', marginTop: space[2] },
});
