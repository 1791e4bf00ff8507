import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { layout, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Text } from './Text';

export interface Fact {
  label: string;
  value: ReactNode;
  note?: string;
}

/** Labels and what was answered, a hairline between: how a finished part reads. */
export function Facts({ facts }: { facts: readonly Fact[] }) {
  const { colors } = useTheme();
  return (
    <View role="list">
      {facts.map(({ label, value, note }, index) => (
        <View
          role="listitem"
          key={label}
          style={[styles.row, index > 0 && { borderTopWidth: 1, borderTopColor: colors.hair }]}
        >
          <Text variant="label" color="ink2" style={styles.label}>
            {label}
          </Text>
          <View style={styles.value}>
            {typeof value === 'string' ? <Text variant="answer">{value}</Text> : value}
            {note !== undefined && (
              <Text variant="label" weight="400" color="ink2">
                {note}
              </Text>
            )}
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space.sm, paddingVertical: 8 },
  label: { width: layout.labelColumn, flexShrink: 0, paddingTop: 2 },
  value: { flex: 1, minWidth: 0 },
});
