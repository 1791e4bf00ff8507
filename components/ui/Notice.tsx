import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon } from './Icon';
import type { IconName } from './icons';
import { Text } from './Text';

interface Props {
  children: string;
  title?: string;
  icon?: IconName;
  /** A `Button`. */
  action?: ReactNode;
  /** Read out at once when it appears. */
  live?: boolean;
}

/** Something to know about the record or the connection, framed in ink. It has no signal colour and no heading "Notice". */
export function Notice({ children, title, icon = 'document', action, live }: Props) {
  const { colors } = useTheme();
  return (
    <View
      role={live === true ? 'status' : 'note'}
      aria-live={live === true ? 'polite' : undefined}
      style={[styles.box, { borderColor: colors.ink }]}
    >
      <Icon name={icon} />
      <View style={styles.words}>
        {title !== undefined && <Text variant="strong">{title}</Text>}
        <Text>{children}</Text>
        {action}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  box: {
    flexDirection: 'row',
    gap: space.sm,
    borderWidth: 2,
    paddingHorizontal: 14,
    paddingVertical: space.sm,
  },
  words: { flex: 1, gap: space.xxs },
});
