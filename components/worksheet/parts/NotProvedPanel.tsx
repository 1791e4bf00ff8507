import { StyleSheet, View } from 'react-native';
import type { WorksheetRecord } from '@/shared/record';
import { timeText } from '@/shared/format';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { Text } from '../../ui';

/**
 * A worksheet in force, at the head of its record: not proved dead, proved
 * dead, or energized. Solid ink, never a signal colour: it praises nothing.
 */
export function NotProvedPanel({ record }: { record: WorksheetRecord }) {
  const words = useMessages().worksheet;
  const { colors } = useTheme();
  const energized = record.content.decision?.mode === 'energized';
  const last = record.proofs.at(-1);
  const [title, body] = energized
    ? [words.energizedTitle, words.energizedBody]
    : record.proved && last !== undefined
      ? [words.provedTitle(timeText(last.at, record.timeZone)), words.provedBody]
      : [words.notProvedTitle, words.notProvedBody];
  const solid = energized || !record.proved;
  return (
    <View
      role="status"
      style={[styles.panel, { borderColor: colors.ink }, solid && { backgroundColor: colors.ink }]}
    >
      <View style={[styles.mark, { borderColor: solid ? colors.paper : colors.ink }]}>
        <View
          style={[
            styles.point,
            { backgroundColor: solid ? colors.paper : colors.ink },
            !solid && styles.whole,
          ]}
        />
      </View>
      <View style={styles.words}>
        <Text variant="section" weight="700" color={solid ? 'paper' : 'ink'}>
          {title}
        </Text>
        <Text color={solid ? 'paper' : 'ink'}>{body}</Text>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { flexDirection: 'row', gap: space.md, padding: space.md, borderWidth: 2 },
  mark: { width: 30, height: 30, borderWidth: 3, alignItems: 'center', justifyContent: 'center' },
  point: { width: 10, height: 10, borderRadius: 5 },
  whole: { width: 24, height: 24, borderRadius: 0 },
  words: { flex: 1, gap: space.xxs },
});
