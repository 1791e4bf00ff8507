import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Text } from '../ui';

/** A part of a page that is signed, under a strong rule. */
export function SignBlock({ title, children }: { title?: string; children: ReactNode }) {
  const { colors } = useTheme();
  return (
    <View
      style={[styles.block, title === undefined && styles.roomy, { borderTopColor: colors.ink }]}
    >
      {title !== undefined && (
        <Text variant="section" level={2}>
          {title}
        </Text>
      )}
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  block: {
    borderTopWidth: rule.strong,
    paddingTop: space.sm,
    gap: space.sm,
    paddingBottom: space.lg,
  },
  roomy: { gap: space.md },
});
