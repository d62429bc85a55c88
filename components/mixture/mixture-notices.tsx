import { StyleSheet, View } from 'react-native';
import { ProblemError } from '../../shared/client';
import { isPassing } from '../answer/compute-client';
import { Button } from '../ui/button';
import { Failure } from '../ui/failure';
import { Notice } from '../ui/notice';
import { space } from '../ui/theme';
import { useOnline } from '../ui/use-online';
import { Words } from '../ui/words';
import type { Mixture } from './use-mixture';

/** What stands between the reader and the answer asked for. The last answer stays. */
export function MixtureNotices({ mixture }: { readonly mixture: Mixture }) {
  const { faulty, unread, call } = mixture;
  const online = useOnline();
  if (!faulty && online && !unread && !call.error && !call.failureReason) return null;
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
      {online && (unread ? <Unread failure={unread} /> : <Refused mixture={mixture} />)}
    </View>
  );
}

const besideIt = 'The reason stands beside what it is about.';

/** A stored system whose forms must be known, and could not be read. */
const Unread = ({ failure }: { readonly failure: ProblemError }) =>
  failure.problem.status === 404 ? (
    <Notice tone="bad" title="Not computed">
      {besideIt}
    </Notice>
  ) : (
    <Failure error={failure} />
  );

/** A call that was refused, or did not get through. */
function Refused({ mixture: { call, faults, change } }: { readonly mixture: Mixture }) {
  const failure = call.error ?? call.failureReason;
  if (!failure) return null;
  if (faults.conditions.passable) {
    return (
      <Notice tone="warn" title="Beyond what is trusted">
        <Words>{besideIt}</Words>
        <View style={styles.all}>
          <Button label="Compute all the same" onPress={() => change({ beyond: true })} />
        </View>
      </Notice>
    );
  }
  if (faults.allPlaced) {
    return (
      <Notice tone="bad" title="Not computed">
        {besideIt}
      </Notice>
    );
  }
  const mayPass = failure instanceof ProblemError && isPassing(failure) && !call.isFetching;
  return <Failure error={failure} {...(mayPass && { onRetry: () => void call.refetch() })} />;
}

const styles = StyleSheet.create({
  notices: { gap: space[2] },
  all: { alignItems: 'flex-start', marginTop: space[2] },
});
