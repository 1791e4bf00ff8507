import { StyleSheet, View } from 'react-native';
import type { IconName } from './icons';
import { Icon } from './Icon';
import { Text } from './Text';

interface Props {
  /** "Kept 10:41, not sent". */
  children: string;
  /** `kept` on this device only, `sent` when the server has it. */
  icon?: Extract<IconName, 'kept' | 'sent' | 'clock'>;
}

/** How the record stands on this device, in the header. */
export function SavedState({ children, icon = 'kept' }: Props) {
  return (
    <View role="status" style={styles.row}>
      <Icon name={icon} color="ink2" size={22} />
      <Text variant="label" weight="400" color="ink2" style={styles.words}>
        {children}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: 6, flexShrink: 1, minHeight: 48 },
  words: { flexShrink: 1 },
});
