import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { useNow } from '../ui/use-now';
import { Words } from '../ui/words';
import { KeyCards } from './key-cards';
import { KeysTable } from './keys-table';
import type { KeysViewProps } from './keys-view';
import { newestFirst, sortedBy, sortKeys } from './sort-keys';

interface KeysListProps extends Pick<KeysViewProps, 'keys' | 'onRevoke'> {
  /** Fetches the next page; absent where all keys are shown. */
  readonly onMore: (() => void) | undefined;
  readonly fetchingMore: boolean;
}

/** All that was fetched so far: cards on a phone, a table on a wide screen. */
export function KeysList({ keys, onRevoke, onMore, fetchingMore }: KeysListProps) {
  const { rail } = useLayout();
  const now = useNow();
  const [sorting, setSorting] = useState(newestFirst);
  const isPartly = onMore !== undefined && sorting !== newestFirst;
  return (
    <View style={styles.list}>
      {rail ? (
        <KeysTable
          keys={sortKeys(keys, sorting)}
          now={now}
          onRevoke={onRevoke}
          sorting={sorting}
          onSort={(column) => setSorting(sortedBy(column, sorting))}
        />
      ) : (
        <KeyCards keys={keys} now={now} onRevoke={onRevoke} />
      )}
      <View style={styles.foot}>
        {onMore && (
          <Button label={fetchingMore ? 'Fetching more …' : 'Show more'} onPress={onMore} />
        )}
        <View role="status" style={styles.count}>
          <Words kind="help">
            {onMore
              ? `The newest ${keys.length} keys are shown${isPartly && rail ? ' and sorted' : ''}.`
              : keys.length === 1
                ? 'It is the only one.'
                : `All ${keys.length} are shown.`}
          </Words>
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space[4] },
  foot: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space[3] },
  count: { flexShrink: 1 },
});
