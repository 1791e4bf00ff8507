import { Pressable, StyleSheet, View } from 'react-native';
import type { Finding } from '@/hazard';
import { findingWords } from '@/shared/messages';
import { placeOf } from '@/shared/sections';
import { useLocale, useUnits } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { rule, space, touch } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { Icon, StateSymbol, Text } from '../../ui';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { useGoTo } from './goTo';

const ORDER = { stop: 0, open: 1, caution: 2 } as const;

function Point({ finding }: { finding: Finding }) {
  const locale = useLocale();
  const units = useUnits();
  const { colors } = useTheme();
  const { goToFinding } = useGoTo();
  return (
    <Pressable
      role="link"
      onPress={() => goToFinding(finding)}
      style={[styles.row, { borderTopColor: colors.hair }]}
    >
      <StateSymbol state={finding.severity} size={18} />
      <Text variant="strong" style={styles.place}>
        {placeOf(finding)}
      </Text>
      <Text variant="answer" color="blue" style={styles.words}>
        {findingWords(locale, finding, units).title}
      </Text>
      <Icon name="right" color="blue" size={20} />
    </Pressable>
  );
}

/** Every stop, open point and caution, stops first; each leads to its place. */
export function OpenPoints() {
  const words = useMessages();
  const { colors } = useTheme();
  const { assessment } = useWorksheetForm();
  const findings = [...assessment.findings].sort(
    (one, other) => ORDER[one.severity] - ORDER[other.severity],
  );
  const count = findings.filter(({ severity }) => severity !== 'caution').length;
  return (
    <View style={[styles.box, { borderTopColor: colors.ink }]}>
      <View style={styles.head}>
        <Text variant="section" level={2}>
          {words.worksheet.openPoints}
        </Text>
        <Text variant="label">{String(count)}</Text>
      </View>
      {findings.length === 0 && <Text>{words.common.states.nothingOpen}</Text>}
      {findings.map((finding) => (
        <Point
          key={`${finding.code}${finding.path}${JSON.stringify(finding.params)}`}
          finding={finding}
        />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { borderTopWidth: rule.strong, paddingTop: space.sm },
  head: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'baseline',
    paddingBottom: space.xs,
  },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    minHeight: touch.control,
    paddingVertical: space.xs,
    borderTopWidth: 1,
  },
  place: { width: 32 },
  words: { flex: 1, minWidth: 0 },
});
