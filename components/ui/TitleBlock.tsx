import { StyleSheet, View } from 'react-native';
import { rule } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Text } from './Text';

export interface TitleCell {
  label: string;
  value: string;
}

/** The printed block under a record's name: two cells a line on a phone, all in one line beside it. */
export function TitleBlock({ cells }: { cells: readonly TitleCell[] }) {
  const { colors } = useTheme();
  const { isPhone } = useBreakpoint();
  const perRow = isPhone ? 2 : 4;
  const rows: TitleCell[][] = [];
  for (let at = 0; at < cells.length; at += perRow) rows.push(cells.slice(at, at + perRow));
  return (
    <View style={[styles.block, { borderColor: colors.ink }]}>
      {rows.map((row, index) => (
        <View
          key={row[0]?.label}
          style={[styles.row, index > 0 && { borderTopWidth: 1, borderTopColor: colors.ink }]}
        >
          {row.map((cell, column) => (
            <View
              key={cell.label}
              style={[
                styles.cell,
                column > 0 && { borderLeftWidth: 1, borderLeftColor: colors.ink },
              ]}
            >
              <Text variant="smallCaps" color="ink2">
                {cell.label}
              </Text>
              <Text variant="value" style={styles.value}>
                {cell.value}
              </Text>
            </View>
          ))}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  block: { borderWidth: rule.strong },
  row: { flexDirection: 'row' },
  cell: { flex: 1, minWidth: 0, paddingHorizontal: 10, paddingTop: 5, paddingBottom: 7 },
  value: { fontSize: 18, lineHeight: 24 },
});
