import { useQuery } from '@tanstack/react-query';
import { StyleSheet, View } from 'react-native';
import { timeText } from '@/shared/format';
import type { WorksheetRecord } from '@/shared/record';
import { deviceZone } from '../home/clock';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Icon, Text, type IconName } from '../ui';
import { workedOutHash } from './contentCheck';
import { hashGroups } from './hashGroups';

interface Found {
  icon: IconName;
  title: string;
  body?: string;
  /** What was kept is not what was signed. */
  bad?: boolean;
}

function useFound(record: WorksheetRecord): Found {
  const words = useMessages().trail.unaltered;
  const { id, version, revision, content, attachments, contentHash } = record;
  const check = useQuery({
    queryKey: ['content-check', id, version, contentHash] as const,
    queryFn: async () =>
      (await workedOutHash({ worksheetId: id, revision, content, attachments })) ?? null,
    networkMode: 'always',
    gcTime: 0,
    staleTime: 0,
    retry: false,
  });
  const carrying = record.signatures.filter(
    (signature) => signature.revision === revision && signature.contentHash === contentHash,
  );
  const strange = record.signatures.some(
    (signature) =>
      signature.revision === revision &&
      signature.contentHash !== undefined &&
      signature.contentHash !== contentHash,
  );
  if (check.isError || check.data === null) {
    return { icon: 'question', title: words.unknownTitle, body: words.unknown };
  }
  if (check.data === undefined) return { icon: 'clock', title: words.waitTitle };
  if (check.data !== contentHash || strange) {
    return { icon: 'close', title: words.differsTitle, body: words.differs, bad: true };
  }
  if (carrying.length === 0) {
    return { icon: 'document', title: words.unsignedTitle, body: words.unsigned };
  }
  const at = timeText(new Date(check.dataUpdatedAt).toISOString(), deviceZone());
  return { icon: 'seal', title: words.title, body: words.body(carrying.length, at) };
}

/** Whether the record is what was signed: worked out again here, not only believed. */
export function UnalteredPanel({ record }: { record: WorksheetRecord }) {
  const { colors } = useTheme();
  const { trail } = useMessages();
  const { icon, title, body, bad } = useFound(record);
  const color = bad === true ? 'paper' : 'ink';
  return (
    <View role="status" style={[styles.box, { borderColor: colors.ink }]}>
      <View style={[styles.head, bad === true && { backgroundColor: colors.ink }]}>
        <Icon name={icon} size={28} color={color} strokeWidth={2.2} />
        <View style={styles.words}>
          <Text variant="strong" color={color}>
            {title}
          </Text>
          {body !== undefined && (
            <Text variant="label" weight="400" color={bad === true ? 'paper' : 'ink2'}>
              {body}
            </Text>
          )}
        </View>
      </View>
      <View style={[styles.hash, { borderTopColor: colors.ink }]}>
        <Text variant="label" weight="400" color="ink2">
          {trail.code}
        </Text>
        <Text variant="label" style={styles.groups}>
          {hashGroups(record.contentHash).join(' ')}
        </Text>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { borderWidth: rule.strong },
  head: { flexDirection: 'row', gap: space.sm, alignItems: 'center', padding: 14 },
  words: { flex: 1, minWidth: 0 },
  hash: { borderTopWidth: 1, paddingHorizontal: 14, paddingVertical: 10 },
  groups: { letterSpacing: 0.3 },
});
