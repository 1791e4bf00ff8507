import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Button, Text } from '../ui';

interface Props {
  title: string;
  note: string;
  /** What ends it; without it the line is only read. */
  action?: { label: string; 'aria-label': string; onPress: () => void; busy?: boolean };
}

/** One device or sign-in, and what ends it at the right. */
export function LineWithAction({ title, note, action }: Props) {
  const { colors } = useTheme();
  return (
    <View role="listitem" style={[styles.line, { borderTopColor: colors.hair }]}>
      <View style={styles.words}>
        <Text variant="strong">{title}</Text>
        <Text variant="label" weight="400" color="ink2">
          {note}
        </Text>
      </View>
      {action !== undefined && <Button {...action} />}
    </View>
  );
}

const styles = StyleSheet.create({
  line: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: space.sm,
    borderTopWidth: 1,
    paddingVertical: space.sm,
    minHeight: 60,
  },
  words: { flexShrink: 1 },
});
