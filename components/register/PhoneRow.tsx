import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon, Text } from '../ui';

interface Props {
  title: string;
  note: string;
  /** How it stands, in a line of its own. */
  state?: ReactNode;
  /** A time bar across. */
  bar?: ReactNode;
  onPress: () => void;
}

/** One record of a list on a phone; the whole row opens it. */
export function PhoneRow({ title, note, state, bar, onPress }: Props) {
  const { colors } = useTheme();
  return (
    <Pressable
      role="button"
      onPress={onPress}
      style={StyleSheet.flatten([styles.row, { borderBottomColor: colors.hair }])}
    >
      <View style={styles.line}>
        <View style={styles.words}>
          <Text variant="value" color="blue">
            {title}
          </Text>
          <Text variant="note" color="ink2">
            {note}
          </Text>
          {state}
        </View>
        <Icon name="right" color="blue" />
      </View>
      {bar}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  row: { borderBottomWidth: 1, paddingVertical: space.sm, overflow: 'hidden' },
  line: { flexDirection: 'row', alignItems: 'center', gap: space.xs },
  words: { flex: 1, minWidth: 0, gap: 2 },
});
