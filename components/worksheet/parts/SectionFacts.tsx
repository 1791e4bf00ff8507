import { View, StyleSheet } from 'react-native';
import { contentFacts } from '@/shared/contentFacts';
import type { SectionId } from '@/shared/sections';
import { useLocale, useUnits } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Facts, Text } from '../../ui';
import { useWorksheetForm } from '../form/WorksheetFormContext';

/** Every answered field of one section in words: how a record is read. */
export function SectionFacts({ section }: { section: SectionId }) {
  const words = useMessages();
  const locale = useLocale();
  const units = useUnits();
  const { content, record } = useWorksheetForm();
  const groups = contentFacts(content, {
    locale,
    units,
    timeZone: record.timeZone,
    siteName: record.siteName ?? undefined,
  }).filter((group) => group.section === section);
  if (groups.length === 0) return <Text color="ink2">{words.ui.notAnswered}</Text>;
  return (
    <>
      {groups.map(({ heading, facts }, index) => (
        <View key={heading ?? index} style={styles.group}>
          {heading !== undefined && <Text variant="value">{heading}</Text>}
          <Facts facts={facts.map(({ label, value }) => ({ label, value }))} />
        </View>
      ))}
    </>
  );
}

const styles = StyleSheet.create({ group: { gap: space.xxs } });
