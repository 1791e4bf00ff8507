import { StyleSheet, View } from 'react-native';
import { findingWords } from '@/shared/messages';
import { placeOf } from '@/shared/sections';
import type { WorksheetRecord } from '@/shared/record';
import { useLocale, useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { StateMark, Text } from '../ui';
import { FindingPanels } from '../worksheet/parts/FindingPanels';

/** The stops that were cleared: they stay in sight, though they stop nothing now. */
function ClearedStops({ record }: { record: WorksheetRecord }) {
  const words = useMessages().signing;
  const locale = useLocale();
  const units = useUnits();
  if (record.clearedStops.length === 0) return null;
  return (
    <View style={styles.cleared}>
      <Text variant="strong">{words.clearedStops}</Text>
      {record.clearedStops.map(({ code, path }) => (
        <StateMark
          key={`${code} ${path}`}
          state="complete"
          word={findingWords(locale, { code, path, severity: 'stop', params: {} }, units).title}
          detail={placeOf({ code, path })}
        />
      ))}
    </View>
  );
}

/** What a signer looks at first: cautions, and the stops that were cleared before signing. */
export function Exceptions({ record }: { record: WorksheetRecord }) {
  const words = useMessages().signing;
  const { colors } = useTheme();
  const cautions = record.assessment.findings.filter(({ severity }) => severity === 'caution');
  const none = cautions.length === 0 && record.clearedStops.length === 0;
  return (
    <View style={[styles.box, { borderTopColor: colors.ink }]}>
      <Text variant="section" level={2}>
        {words.exceptions}
      </Text>
      {none && <Text color="ink2">{words.noExceptions}</Text>}
      <FindingPanels findings={cautions} />
      <ClearedStops record={record} />
    </View>
  );
}

const styles = StyleSheet.create({
  box: {
    borderTopWidth: rule.strong,
    paddingTop: space.sm,
    gap: space.sm,
    paddingBottom: space.md,
  },
  cleared: { gap: 6 },
});
