import { StyleSheet, View } from 'react-native';
import type { WorksheetRow } from '@/shared/record';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { ListRow, Text } from '../ui';
import { links } from './links';
import { inSentence, placeWords, rowMark, rowState, taskWords } from './rowWords';
import type { Waiting } from './waiting';
import type { ReactNode } from 'react';

/** A heading with its count under a strong rule. */
export function HomeSection({
  title,
  count,
  children,
}: {
  title: string;
  count?: string;
  children: ReactNode;
}) {
  const { colors } = useTheme();
  return (
    <View role="region" aria-label={title} style={[styles.section, { borderTopColor: colors.ink }]}>
      <View style={styles.head}>
        <Text variant="section" level={2}>
          {title}
        </Text>
        {count !== undefined && <Text variant="answer">{count}</Text>}
      </View>
      {children}
    </View>
  );
}

export function WaitingList({ items }: { items: readonly Waiting[] }) {
  return (
    <View role="list">
      {items.map((item, index) => (
        <View role="listitem" key={item.key}>
          <ListRow
            first={index === 0}
            mark={item.mark}
            icon={item.icon}
            title={item.title}
            note={item.note}
            action={item.action}
            href={item.href}
          />
        </View>
      ))}
    </View>
  );
}

export function RowList({ rows }: { rows: readonly WorksheetRow[] }) {
  const messages = useMessages();
  return (
    <View role="list">
      {rows.map((row, index) => (
        <View role="listitem" key={row.id}>
          <ListRow
            first={index === 0}
            mark={rowMark(row)}
            title={`${row.number}, ${inSentence(taskWords(row, messages))}`}
            note={`${placeWords(row, messages)}. ${rowState(row, messages)}`}
            href={links.worksheet(row.id)}
          />
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  section: { borderTopWidth: rule.strong, paddingBottom: space.md },
  head: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'baseline',
    gap: space.sm,
    paddingTop: space.sm,
    paddingBottom: 2,
  },
});
