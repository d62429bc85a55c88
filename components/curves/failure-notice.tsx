import { StyleSheet, View } from 'react-native';
import { ProblemError } from '../../shared/client';
import { conditionFaults, saidHere } from '../conditions/condition-faults';
import { Button } from '../ui/button';
import { Notice } from '../ui/notice';
import { space } from '../ui/theme';
import { Words } from '../ui/words';

interface FailureNoticeProps {
  readonly failure: Error;
  readonly isFetching: boolean;
  readonly refetch: () => unknown;
  /** What could not be had, where it is not the curve itself. */
  readonly title?: string;
  /** Has what is beyond a range computed all the same. */
  readonly onPass?: () => void;
}

const titleOf = (status: number) => (status === 429 ? 'Too many curves at once' : undefined);

/** Why a call failed, in the service's words, and what to do. */
export function FailureNotice(props: FailureNoticeProps) {
  const { failure, isFetching, refetch, title, onPass } = props;
  if (!(failure instanceof ProblemError)) throw failure;
  const { problem, retryAfter } = failure;
  const busy = problem.status === 429 || problem.status === 503;
  const reasons = problem.errors?.map(({ detail }) => detail) ?? [];
  const { passable } = conditionFaults(failure);
  const pass = passable ? onPass : undefined;
  const said = passable ? reasons : [...new Set([problem.detail, ...reasons])];
  return (
    <Notice
      tone={busy ? 'warn' : 'bad'}
      title={titleOf(problem.status) ?? title ?? (passable ? 'Not computed' : problem.title)}
      requestId={problem.requestId}
    >
      {busy ? (
        <Words>
          {isFetching
            ? `It is tried again by itself in ${retryAfter ?? 1} s.`
            : `Try again in ${retryAfter ?? 60} s.`}
        </Words>
      ) : (
        said.map((reason) => reason !== undefined && <Words key={reason}>{saidHere(reason)}</Words>)
      )}
      {!isFetching && (
        <View style={styles.again}>
          {pass ? (
            <Button label="Compute all the same" onPress={pass} />
          ) : (
            <Button label="Try again" onPress={() => void refetch()} />
          )}
        </View>
      )}
    </Notice>
  );
}

const styles = StyleSheet.create({
  again: { alignItems: 'flex-start', marginTop: space[2] },
});
