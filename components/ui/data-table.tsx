import type { ReactNode } from 'react';
import { Pressable, StyleSheet } from 'react-native';
import { Icon } from './icon';
import { ScrollBox } from './scroll-box';
import { Numerals } from './numerals';
import { space, useTheme } from './theme';
import { useLayout } from './use-layout';
import { Words } from './words';

export interface Column {
  readonly key: string;
  readonly head: ReactNode;
  /** Set in numerals, at the right. */
  readonly numeric?: boolean;
  /** Its head sorts by it. */
  readonly sortable?: boolean;
}

/** By which column the rows are sorted, and which way. */
export interface Sorting {
  readonly key: string;
  readonly direction: 'ascending' | 'descending';
}

/** One row: a cell for each column's key, and a `key` of its own where its first cell is no id. */
export type Row = Readonly<Record<string, ReactNode>>;

interface DataTableProps {
  /** Says what the table holds; shown above it. */
  readonly caption: string;
  readonly columns: readonly Column[];
  readonly rows: readonly Row[];
  /** px; a longer table scrolls inside itself, its head staying. */
  readonly maxHeight?: number;
  readonly hideCaption?: boolean;
  readonly sorted?: Sorting;
  readonly onSort?: (key: string) => void;
}

/**
 * A table that a spreadsheet can paste and a screen reader can walk: real table elements, which
 * react-native-web has none of. Wider than its place, it scrolls inside itself.
 */
export function DataTable({
  caption,
  columns,
  rows,
  maxHeight,
  hideCaption,
  sorted,
  onSort,
}: DataTableProps) {
  const { colours } = useTheme();
  const { rail } = useLayout();
  // The outer cells end where the table ends: figures stand on the edge of their column of text.
  const cell = (column: Column): React.CSSProperties => ({
    textAlign: column.numeric ? 'right' : 'left',
    height: rail ? 32 : 40,
    paddingBlock: space[1],
    paddingLeft: column === columns[0] ? 0 : space[2],
    paddingRight: column === columns.at(-1) ? 0 : space[2],
    borderBottom: `1px solid ${colours.rule}`,
    whiteSpace: column.numeric ? 'nowrap' : undefined,
  });
  const head: React.CSSProperties = {
    position: 'sticky',
    top: 0,
    // A border would scroll away from under a sticky head; a shadow stays.
    boxShadow: `inset 0 -1px ${colours.edge}`,
    borderBottom: 'none',
    backgroundColor: colours.page,
  };
  return (
    <ScrollBox label={caption} maxHeight={maxHeight}>
      <table style={{ borderCollapse: 'separate', borderSpacing: 0, width: '100%' }}>
        <caption
          className={hideCaption ? 'only-said' : undefined}
          style={{ textAlign: 'left', paddingBottom: space[1] }}
        >
          <Words kind="help">{caption}</Words>
        </caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th
                key={column.key}
                scope="col"
                aria-sort={sorted?.key === column.key ? sorted.direction : undefined}
                style={{ ...cell(column), ...head }}
              >
                <Head column={column} sorted={sorted} onSort={onSort} />
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, index) => (
            <tr key={typeof row.key === 'string' ? row.key : index}>
              {columns.map((column) => (
                <td key={column.key} style={cell(column)}>
                  <Cell numeric={column.numeric}>{row[column.key]}</Cell>
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </ScrollBox>
  );
}

function Head({
  column,
  sorted,
  onSort,
}: { readonly column: Column } & Pick<DataTableProps, 'sorted' | 'onSort'>) {
  const direction = sorted?.key === column.key ? sorted.direction : undefined;
  const words = (
    <Words kind="label" tone={direction ? 'ink' : 'inkSoft'}>
      {column.head}
    </Words>
  );
  if (!column.sortable || !onSort) return words;
  return (
    <Pressable role="button" onPress={() => onSort(column.key)} style={styles.head}>
      {words}
      {direction && <Icon name={direction === 'ascending' ? 'arrow-up' : 'arrow-down'} size={16} />}
    </Pressable>
  );
}

function Cell({ numeric, children }: { readonly numeric?: boolean; readonly children: ReactNode }) {
  if (typeof children !== 'string' && typeof children !== 'number') return children;
  return numeric ? <Numerals size={14}>{children}</Numerals> : <Words>{children}</Words>;
}

const styles = StyleSheet.create({
  head: { flexDirection: 'row', alignItems: 'center', gap: space[1], minHeight: 32 },
});
