import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { WorksheetRecord } from '@/shared/record';
import { useLocale, useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Select, Text } from '../ui';
import { DifferenceList } from './DifferenceList';
import { factDifferences } from './factDifferences';
import type { RevisionDetail } from './trailQueries';

interface Props {
  record: WorksheetRecord;
  /** Those that have arrived, oldest first. */
  revisions: readonly RevisionDetail[];
}

/** Two revisions side by side, answer by answer: the last two unless others are chosen. */
export function Compare({ record, revisions }: Props) {
  const { trail, common } = useMessages();
  const locale = useLocale();
  const units = useUnits();
  const newest = revisions.at(-1)?.revision ?? 1;
  const [from, setFrom] = useState(newest - 1);
  const [to, setTo] = useState(newest);
  const options = revisions.map(({ revision }) => ({
    value: revision,
    label: common.revision(revision),
  }));
  const before = revisions.find(({ revision }) => revision === from);
  const after = revisions.find(({ revision }) => revision === to);
  if (revisions.length < 2) return <Text>{trail.oneOnly}</Text>;
  return (
    <View style={styles.box}>
      {revisions.length > 2 && (
        <View style={styles.choose}>
          <View style={styles.half}>
            <Select label={trail.from} options={options} value={from} onChange={setFrom} />
          </View>
          <View style={styles.half}>
            <Select label={trail.with} options={options} value={to} onChange={setTo} />
          </View>
        </View>
      )}
      {before !== undefined && after !== undefined && (
        <>
          <Text variant="strong">{trail.between(from, to)}</Text>
          <DifferenceList
            found={factDifferences(
              before.content,
              after.content,
              { locale, units, timeZone: record.timeZone, siteName: record.siteName ?? undefined },
              trail,
            )}
          />
        </>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: space.sm },
  choose: { flexDirection: 'row', gap: space.sm, alignItems: 'flex-start' },
  half: { flex: 1, minWidth: 0 },
});
