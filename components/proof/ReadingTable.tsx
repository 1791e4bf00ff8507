import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Text } from '../ui';

interface Props {
  label: string;
  columns: readonly string[];
  rows: readonly { label: string; cells: readonly ReactNode[] }[];
}

/** A matrix in a 2 px ink frame; a cell that is null is a pair that cannot be. */
export function ReadingTable({ label, columns, rows }: Props) {
  const { colors } = useTheme();
  const line = { borderLeftWidth: rule.fine, borderLeftColor: colors.ink };
  const narrow = columns.length > 3;
  const first = narrow ? styles.firstNarrow : styles.first;
  return (
    <View role="table" aria-label={label} style={[styles.table, { borderColor: colors.ink }]}>
      <View role="row" style={styles.row}>
        <View role="columnheader" style={first} />
        {columns.map((column) => (
          <View key={column} role="columnheader" style={[styles.head, line]}>
            <Text variant="label" style={styles.middle}>
              {column}
            </Text>
          </View>
        ))}
      </View>
      {rows.map((row) => (
        <View
          key={row.label}
          role="row"
          style={[styles.row, { borderTopWidth: rule.fine, borderTopColor: colors.ink }]}
        >
          <View role="rowheader" style={[first, styles.rowHead]}>
            <Text variant="label">{row.label}</Text>
          </View>
          {row.cells.map((cell, index) => (
            <View
              key={columns[index]}
              role="cell"
              style={[styles.cell, line, cell === null && { backgroundColor: colors.tone }]}
            >
              {cell}
            </View>
          ))}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  table: { borderWidth: rule.strong },
  row: { flexDirection: 'row', alignItems: 'stretch' },
  first: { width: 96, flexShrink: 0 },
  firstNarrow: { width: 74, flexShrink: 0 },
  rowHead: { justifyContent: 'center', paddingHorizontal: space.xs, minHeight: 60 },
  head: {
    flex: 1,
    minWidth: 0,
    minHeight: 42,
    justifyContent: 'center',
    alignItems: 'center',
    paddingHorizontal: 2,
    paddingVertical: 4,
  },
  cell: { flex: 1, minWidth: 0, minHeight: 60, justifyContent: 'center' },
  middle: { textAlign: 'center' },
});
