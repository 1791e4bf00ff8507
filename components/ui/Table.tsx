import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { rule, space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon } from './Icon';
import { Text } from './Text';
import { webProps } from './webProps';

export interface Column<Row> {
  key: string;
  label: string;
  /** Drawn instead of the label, which a screen reader still says: a ruler. */
  head?: ReactNode;
  /** px; without it the column takes its share of what is left. */
  width?: number;
  share?: number;
  /** As high as the row, so that its lines meet those of the next. */
  fill?: true;
  /** Text, or anything drawn. */
  cell: (row: Row) => ReactNode;
  /** Pressing the head sorts by it. */
  onSort?: () => void;
  sorted?: 'ascending' | 'descending';
}

export interface TableProps<Row> {
  /** What a screen reader calls the table. */
  label: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  /** Opens a row; the first cell is its button. */
  onOpen?: (row: Row) => void;
  selected?: string;
}

const sized = ({ width, share = 1 }: { width?: number; share?: number }) =>
  width === undefined
    ? { flexGrow: share, flexShrink: 1, flexBasis: 0, minWidth: 0 }
    : { width, flexShrink: 0 };

function HeadCell<Row>({ column }: { column: Column<Row> }) {
  const label = (
    <Text variant="label" weight="600">
      {column.label}
    </Text>
  );
  return (
    <View
      role="columnheader"
      {...webProps({
        'aria-sort': column.sorted,
        'aria-label': column.head === undefined ? undefined : column.label,
      })}
      style={[styles.cell, sized(column)]}
    >
      {column.onSort === undefined ? (
        (column.head ?? label)
      ) : (
        <Pressable role="button" onPress={column.onSort} style={styles.sort}>
          <Text variant="label" weight="600" color="blue">
            {column.label}
          </Text>
          {column.sorted !== undefined && (
            <Icon name={column.sorted === 'ascending' ? 'up' : 'down'} color="blue" size={18} />
          )}
        </Pressable>
      )}
    </View>
  );
}

function BodyRow<Row>({
  row,
  columns,
  rowKey,
  onOpen,
  selected,
}: { row: Row } & Omit<TableProps<Row>, 'rows' | 'label'>) {
  const { colors } = useTheme();
  const chosen = selected !== undefined && rowKey(row) === selected;
  const cells = columns.map((column, index) => {
    const inside = column.cell(row);
    const shown = typeof inside === 'string' ? <Text variant="note">{inside}</Text> : inside;
    return (
      <View
        key={column.key}
        role="cell"
        style={[styles.cell, sized(column), column.fill && styles.fill]}
      >
        {index === 0 && onOpen !== undefined ? (
          <Pressable
            role="button"
            {...webProps({ 'aria-current': chosen ? 'true' : undefined })}
            onPress={() => onOpen(row)}
            style={styles.opener}
          >
            {typeof inside === 'string' ? (
              <Text variant="strong" color="blue">
                {inside}
              </Text>
            ) : (
              shown
            )}
          </Pressable>
        ) : (
          shown
        )}
      </View>
    );
  });
  const look = [
    styles.row,
    { borderBottomColor: colors.hair, borderLeftColor: chosen ? colors.blue : 'transparent' },
    chosen && { backgroundColor: colors.tone },
  ];
  if (onOpen === undefined) {
    return (
      <View role="row" style={look}>
        {cells}
      </View>
    );
  }
  // The whole row answers a finger or the mouse; the keyboard uses the button in the first cell.
  return (
    <Pressable
      role="row"
      {...webProps({ tabIndex: -1 })}
      onPress={() => onOpen(row)}
      style={StyleSheet.flatten(look)}
    >
      {cells}
    </Pressable>
  );
}

/** Rows under a strong rule, for a tablet or wider; on a phone use `ListRow`. */
export function Table<Row>(props: TableProps<Row>) {
  const { colors } = useTheme();
  return (
    <View role="table" aria-label={props.label}>
      <View role="rowgroup">
        <View role="row" style={[styles.row, styles.head, { borderBottomColor: colors.ink }]}>
          {props.columns.map((column) => (
            <HeadCell key={column.key} column={column} />
          ))}
        </View>
      </View>
      <View role="rowgroup">
        {props.rows.map((row) => (
          <BodyRow key={props.rowKey(row)} {...props} row={row} />
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    minHeight: 60,
    paddingVertical: 8,
    borderBottomWidth: rule.fine,
    borderLeftWidth: 4,
    paddingLeft: space.xs,
    marginLeft: -space.sm,
  },
  head: {
    minHeight: touch.least,
    alignItems: 'flex-end',
    borderBottomWidth: rule.strong,
    borderLeftColor: 'transparent',
    paddingVertical: 6,
  },
  cell: { justifyContent: 'center' },
  fill: { alignSelf: 'stretch' },
  sort: { flexDirection: 'row', alignItems: 'flex-end', gap: 4, minHeight: touch.least },
  opener: { minHeight: touch.least, justifyContent: 'center' },
});
