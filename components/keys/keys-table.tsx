import { View } from 'react-native';
import { Button } from '../ui/button';
import { DataTable, type Column } from '../ui/data-table';
import { Moment } from '../ui/moment';
import { Words } from '../ui/words';
import { keyElementId, MayDo, PublicPart } from './key-facts';
import { canRevoke, standingOf } from './key-standing';
import { KeyStatus } from './key-status';
import type { KeysViewProps } from './keys-view';
import type { KeyColumn, KeySorting } from './sort-keys';

const columns: readonly Column[] = [
  { key: 'name' satisfies KeyColumn, head: 'Key', sortable: true },
  { key: 'may', head: 'May' },
  { key: 'issued' satisfies KeyColumn, head: 'Issued', sortable: true },
  { key: 'used' satisfies KeyColumn, head: 'Last used', sortable: true },
  { key: 'ends' satisfies KeyColumn, head: 'Ends', sortable: true },
  { key: 'standing', head: 'State' },
  { key: 'revoke', head: <span className="only-said">Revoke</span> },
];

interface KeysTableProps extends KeysViewProps {
  readonly sorting: KeySorting;
  readonly onSort: (column: KeyColumn) => void;
}

/** Keys on a wide screen. */
export function KeysTable({ keys, now, onRevoke, sorting, onSort }: KeysTableProps) {
  return (
    <DataTable
      caption="API keys"
      hideCaption
      columns={columns}
      sorted={sorting}
      onSort={(column) => onSort(column as KeyColumn)}
      rows={keys.map((key) => ({
        key: key.id,
        name: (
          <View id={keyElementId(key)} tabIndex={-1}>
            <Words kind="button">{key.name}</Words>
            <PublicPart {...key} />
          </View>
        ),
        may: <MayDo {...key} />,
        issued: (
          <View>
            <Words numberOfLines={1}>{key.issuer.name}</Words>
            <Words kind="help">
              <Moment at={key.createdAt} now={now} />
            </Words>
          </View>
        ),
        used: (
          <Words numberOfLines={1}>
            {key.lastUsedAt === null ? 'never' : <Moment at={key.lastUsedAt} now={now} />}
          </Words>
        ),
        ends: (
          <Words numberOfLines={1}>
            <Moment at={key.revokedAt ?? key.expiresAt} now={now} />
          </Words>
        ),
        standing: <KeyStatus {...standingOf(key, now)} />,
        revoke: canRevoke(key) && (
          <Button size="small" label="Revoke" about={key.name} onPress={() => onRevoke(key)} />
        ),
      }))}
    />
  );
}
