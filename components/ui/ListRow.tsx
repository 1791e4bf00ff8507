import { Link, type Href } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';
import type { ReactNode } from 'react';
import { space, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon } from './Icon';
import type { IconName } from './icons';
import { StateSymbol, type MarkState } from './StateMark';
import { Text } from './Text';

export interface ListRowProps {
  mark?: MarkState;
  icon?: IconName;
  title: string;
  note?: string;
  /** What pressing it does, in blue under the note: "Prove it dead". Without it the whole row leads on. */
  action?: string;
  href?: Href;
  onPress?: () => void;
  first?: boolean;
  /** Instead of the arrow. */
  end?: ReactNode;
}

/** One line of a list that leads somewhere: mark, name, what it is about, an arrow. */
export function ListRow({
  mark,
  icon,
  title,
  note,
  action,
  href,
  onPress,
  first,
  end,
}: ListRowProps) {
  const { colors } = useTheme();
  const leads = href !== undefined || onPress !== undefined;
  const box = StyleSheet.flatten([
    styles.row,
    { borderTopColor: colors.hair, borderTopWidth: first === true ? 0 : 1 },
  ]);
  const inside = (
    <>
      {(mark !== undefined || icon !== undefined) && (
        <View style={styles.mark}>
          {mark !== undefined ? (
            <StateSymbol state={mark} size={24} />
          ) : (
            icon && <Icon name={icon} />
          )}
        </View>
      )}
      <View style={styles.words}>
        <Text variant="value" style={styles.title}>
          {title}
        </Text>
        {note !== undefined && (
          <Text variant="note" color="ink2">
            {note}
          </Text>
        )}
        {action !== undefined && (
          <Text variant="strong" color="blue" style={styles.action}>
            {action}
          </Text>
        )}
      </View>
      {end ??
        (leads && (
          <View style={action !== undefined ? styles.arrowLow : styles.arrow}>
            <Icon name="right" color="blue" />
          </View>
        ))}
    </>
  );
  if (href !== undefined) {
    return (
      <Link href={href} asChild>
        <Pressable role="link" style={box}>
          {inside}
        </Pressable>
      </Link>
    );
  }
  if (onPress === undefined) return <View style={box}>{inside}</View>;
  return (
    <Pressable role="button" onPress={onPress} style={box}>
      {inside}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'stretch',
    minHeight: touch.control,
    paddingVertical: space.sm,
    gap: space.xs,
  },
  mark: { width: 40, paddingTop: 2 },
  words: { flex: 1, minWidth: 0, gap: 2 },
  title: { fontSize: 18, lineHeight: 26 },
  action: { marginTop: 4, lineHeight: 28 },
  arrow: { paddingTop: 2 },
  arrowLow: { justifyContent: 'flex-end', paddingBottom: 2 },
});
