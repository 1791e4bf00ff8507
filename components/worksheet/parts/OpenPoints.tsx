import { StyleSheet, View } from 'react-native';
import { useMessages } from '../../i18n/useMessages';
import { rule, space } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { Text } from '../../ui';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { useGoTo } from './goTo';
import { FoldedPoints, PointsList } from './PointsList';

/** On a phone, above the lead's signature: what is left, or what is signed over. */
export function FoldedOpenPoints() {
  const { assessment } = useWorksheetForm();
  const { goToFinding } = useGoTo();
  return <FoldedPoints findings={assessment.findings} onGo={goToFinding} />;
}

/** Every stop, open point and caution of the worksheet; each leads to its place. */
export function OpenPoints() {
  const words = useMessages();
  const { colors } = useTheme();
  const { assessment } = useWorksheetForm();
  const { goToFinding } = useGoTo();
  const { findings } = assessment;
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
      <PointsList findings={findings} onGo={goToFinding} />
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
});
