import { StyleSheet, View } from 'react-native';
import { ProblemError } from '../../shared/client';
import { Button } from '../ui/button';
import { Notice } from '../ui/notice';
import { space } from '../ui/theme';
import { useOnline } from '../ui/use-online';
import { Words } from '../ui/words';
import type { Curves } from './use-curves';

/** What stands between the reader and the curve asked for. What is drawn stays. */
export function CurveNotices({
  faulty,
  unknown,
  curve,
}: Pick<Curves, 'faulty' | 'unknown' | 'curve'>) {
  const online = useOnline();
  const failure = curve.error ?? curve.failureReason;
  if (!faulty && unknown === undefined && online && !failure) return null;
  return (
    <View style={styles.notices}>
      {faulty && (
        <Notice tone="warn" title="Part of this address could not be used">
          What it left open is as on a first visit.
        </Notice>
      )}
      {unknown !== undefined && (
        <Notice tone="warn" title={`No system has the id ${unknown}`}>
          Phosphoric acid is drawn in its place. Find yours by name, formula or CAS number.
        </Notice>
      )}
      {!online && (
        <Notice tone="warn" title="You are offline">
          What is drawn stays. New curves come when the connection is back.
        </Notice>
      )}
      {online && failure && <FailureNotice {...curve} failure={failure} />}
    </View>
  );
}

function FailureNotice({
  failure,
  isFetching,
  refetch,
}: { readonly failure: Error } & Pick<Curves['curve'], 'isFetching' | 'refetch'>) {
  if (!(failure instanceof ProblemError)) throw failure;
  const { problem, retryAfter } = failure;
  const busy = problem.status === 429 || problem.status === 503;
  const reasons = problem.errors?.map(({ detail }) => detail) ?? [];
  return (
    <Notice
      tone={busy ? 'warn' : 'bad'}
      title={problem.status === 429 ? 'Too many curves at once' : problem.title}
      requestId={problem.requestId}
    >
      {busy ? (
        <Words>
          {isFetching
            ? `It is tried again by itself in ${retryAfter ?? 1} s.`
            : `Try again in ${retryAfter ?? 60} s.`}
        </Words>
      ) : (
        [...new Set([problem.detail, ...reasons])].map(
          (reason) => reason !== undefined && <Words key={reason}>{reason}</Words>,
        )
      )}
      {!isFetching && (
        <View style={styles.again}>
          <Button label="Try again" onPress={() => void refetch()} />
        </View>
      )}
    </Notice>
  );
}

const styles = StyleSheet.create({
  notices: { gap: space[2] },
  again: { alignItems: 'flex-start', marginTop: space[2] },
});
