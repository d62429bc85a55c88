import { useEffect, useRef } from 'react';
import { StyleSheet, View } from 'react-native';
import { useSystemSearch } from '../handbook/handbook-queries';
import { Button } from '../ui/button';
import { Failure } from '../ui/failure';
import { Field } from '../ui/field';
import { Notice } from '../ui/notice';
import { Skeleton } from '../ui/skeleton';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { useOnline } from '../ui/use-online';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import { countInWords } from './count-in-words';
import { NoMatch } from './no-match';
import { systemLinkId } from './system-link';
import { SystemCards } from './system-cards';
import { SystemsTable } from './systems-table';

const pageSize = 50;

type Search = ReturnType<typeof useSystemSearch>;

interface SystemsListProps {
  readonly text: string;
  readonly onText: (text: string) => void;
  /** Id of the system that is shown beside the list. */
  readonly chosen?: string | undefined;
}

/** Finds systems: a field, and what it found, page by page. */
export function SystemsList({ text, onText, chosen }: SystemsListProps) {
  const { rail } = useLayout();
  const online = useOnline();
  const search = useSystemSearch(text, pageSize);
  const { systems, query, error, isFetching, hasNextPage, isFetchingNextPage } = search;
  const retry = search.isFetchNextPageError ? search.fetchNextPage : search.refetch;
  const more = useMore(search);
  const List = rail ? SystemsTable : SystemCards;
  return (
    <View style={styles.list}>
      <Field
        label="Find a system"
        kind="words"
        inputMode="search"
        value={text}
        onChangeText={onText}
        help="By name, alias, formula or CAS number: tris, H3PO4, 77-92-9"
      />
      {!online && (
        <Notice tone="warn" title="You are offline">
          What is on screen stays. Searching goes on when the connection is back.
        </Notice>
      )}
      {online && error && !isFetching && <Failure error={error} onRetry={() => void retry()} />}
      {!systems && online && !error && <Skeleton label="Fetching the systems" lines={8} />}
      {systems?.length === 0 && <NoMatch query={query} />}
      {systems && systems.length > 0 && <List systems={systems} chosen={chosen} />}
      {systems && (
        <View style={styles.foot}>
          {hasNextPage && (
            <Button label={isFetchingNextPage ? 'Fetching more …' : 'Show more'} onPress={more} />
          )}
          <View role="status" style={systems.length === 0 && styles.said}>
            <Words kind="help">
              {isFetchingNextPage ? '' : countInWords(systems.length, hasNextPage, query)}
            </Words>
          </View>
        </View>
      )}
    </View>
  );
}

/**
 * Fetches the next page; once it is drawn the focus goes to the first of what came, not to where the
 * button was. What is awaited is the drawn row, not the answer: the row comes later.
 */
function useMore({ systems, query, isFetchingNextPage, fetchNextPage }: Search) {
  const awaited = useRef<number>(undefined);
  useEffect(() => {
    awaited.current = undefined;
  }, [query]);
  useEffect(() => {
    const fresh = awaited.current === undefined ? undefined : systems?.[awaited.current];
    if (!fresh) return;
    awaited.current = undefined;
    document.getElementById(systemLinkId(fresh.id))?.focus({ preventScroll: true });
  }, [systems]);
  return () => {
    if (isFetchingNextPage) return;
    awaited.current = systems?.length;
    void fetchNextPage();
  };
}

const styles = StyleSheet.create({
  list: { gap: space[3] },
  // The empty place says it already to those who see it.
  said: webStyle({ position: 'absolute', clipPath: 'inset(50%)' }),
  foot: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space[3] },
});
