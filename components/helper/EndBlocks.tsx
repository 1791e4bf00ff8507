import { StyleSheet, View } from 'react-native';
import { findingWords } from '@/shared/messages';
import type { WorksheetRecord } from '@/shared/record';
import { useLocale, useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { CautionPanel, FirstAidPanel, Text, type FirstAidRow } from '../ui';

/** Every caution of the plan, in one panel: known before signing, though it stops nothing. */
export function Cautions({ record }: { record: WorksheetRecord }) {
  const words = useMessages().helper;
  const locale = useLocale();
  const units = useUnits();
  const cautions = record.assessment.findings.filter(({ severity }) => severity === 'caution');
  const said = cautions.map((finding) => findingWords(locale, finding, units));
  if (said.length === 0) return null;
  return (
    <CautionPanel title={words.cautions}>
      <View style={styles.cautions}>
        {said.map(({ title, text }) => (
          <View key={title + text}>
            <Text variant="strong">{title}</Text>
            <Text>{text}</Text>
          </View>
        ))}
      </View>
    </CautionPanel>
  );
}

/** Who is called, what is opened, where the AED hangs: the only green of the page. */
export function Emergency({ record }: { record: WorksheetRecord }) {
  const { hurt } = useMessages().helper;
  const { briefing, supply } = record.content;
  const { contact, rescue, firstAid, aedAt } = briefing?.emergency ?? {};
  const panel = [supply?.panel, supply?.circuit].filter(Boolean).join(' / ');
  const rows: (FirstAidRow | null)[] = [
    { icon: 'close', text: hurt.noTouch },
    panel === '' ? null : { icon: 'breaker', text: hurt.open(panel) },
    contact === undefined ? null : { icon: 'phone', text: hurt.call(contact) },
    rescue === undefined ? null : { icon: 'person', text: hurt.rescue(rescue) },
    firstAid === undefined ? null : { icon: 'plus', text: hurt.firstAid(firstAid) },
    aedAt === undefined ? null : { icon: 'aed', text: hurt.aed(aedAt) },
  ];
  return <FirstAidPanel title={hurt.title} rows={rows.filter((row) => row !== null)} />;
}

const styles = StyleSheet.create({ cautions: { gap: space.sm, flexBasis: '100%' } });
