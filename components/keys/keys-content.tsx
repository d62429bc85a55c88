import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { ProblemError } from '../../shared/client';
import type { KeyAnswer } from '../../shared/keys';
import { Empty } from '../ui/empty';
import { Failure } from '../ui/failure';
import { Notice } from '../ui/notice';
import { Skeleton } from '../ui/skeleton';
import { useOnline } from '../ui/use-online';
import { Words } from '../ui/words';
import { KeysList } from './keys-list';
import type { useKeys } from './keys-queries';

interface KeysContentProps {
  readonly keys: ReturnType<typeof useKeys>;
  readonly onRevoke: (key: KeyAnswer) => void;
  /** The button that issues the first one. */
  readonly issue: ReactNode;
}

/** The list in whichever state it is; what is on screen stays while something is wrong. */
export function KeysContent({ keys, onRevoke, issue }: KeysContentProps) {
  const { data, error, isFetching, isFetchingNextPage, hasNextPage } = keys;
  const online = useOnline();
  const all = data?.pages.flatMap(({ items }) => items);
  // That the session is over, the shell has said already.
  const isTold = error instanceof ProblemError && error.problem.status === 401;
  const retry = isFetchingNextPage || (data && hasNextPage) ? keys.fetchNextPage : keys.refetch;
  return (
    <>
      {!online && (
        <Notice tone="warn" title="You are offline">
          What is on screen stays. It is brought up to date when the connection is back.
        </Notice>
      )}
      {online && error && !isFetching && !isTold && (
        <Failure error={error} onRetry={() => void retry()} />
      )}
      {!all && isTold && <Words>The keys come once you are signed in again.</Words>}
      {!all && online && !error && <Skeleton label="Fetching the keys" lines={6} />}
      {all?.length === 0 && (
        <View style={styles.empty}>
          <Empty title="No keys yet" action={issue}>
            A key lets a program call: a nightly import, a plate reader, a notebook.
          </Empty>
        </View>
      )}
      {all && all.length > 0 && (
        <KeysList
          keys={all}
          onRevoke={onRevoke}
          onMore={hasNextPage ? () => void keys.fetchNextPage() : undefined}
          fetchingMore={isFetchingNextPage}
        />
      )}
    </>
  );
}

const styles = StyleSheet.create({
  empty: { maxWidth: 560 },
});
