import { Pressable, StyleSheet, View } from 'react-native';
import { SECTIONS, sectionNumber, sectionOf, type SectionId } from '@/shared/sections';
import type { Assessment } from '@/hazard';
import type { WorksheetRecord } from '@/shared/record';
import { useMessages } from '../../i18n/useMessages';
import { space, touch } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { StateMark, StateSymbol, Text, type MarkState } from '../../ui';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { useGoTo } from './goTo';
import { sectionState } from './sectionState';

const LEGEND: readonly MarkState[] = ['complete', 'open', 'stop', 'waits'];

/** The sections whose state does not follow from findings of their own. */
function ownState(
  section: SectionId,
  record: WorksheetRecord,
  assessment: Assessment,
): MarkState | undefined {
  if (section === 'boundaries') return assessment.boundaries === null ? 'waits' : undefined;
  if (section === 'closeOut') return record.closeOut === null ? 'waits' : 'complete';
  if (section !== 'signatures') return undefined;
  const countersigned = record.signatures.some(
    ({ meaning, revision }) => meaning === 'countersigned' && revision === record.revision,
  );
  return countersigned ? 'complete' : 'waits';
}

/** The twelve sections at the left of a wide screen, each with its state. */
export function SectionNav() {
  const words = useMessages();
  const { colors } = useTheme();
  const { assessment, record } = useWorksheetForm();
  const { goToSection } = useGoTo();
  return (
    <View role="navigation" aria-label={words.worksheet.sections} style={styles.nav}>
      {SECTIONS.map((section) => {
        const own = assessment.findings.filter((finding) => sectionOf(finding) === section);
        const found = sectionState(own, words);
        const state = ownState(section, record, assessment) ?? found.state;
        return (
          <Pressable
            key={section}
            role="link"
            onPress={() => goToSection(section)}
            style={[styles.row, { borderTopColor: colors.hair }]}
          >
            <Text variant="answer" style={styles.number}>
              {String(sectionNumber(section))}
            </Text>
            <Text variant="answer" weight="600" color="blue" style={styles.name}>
              {words.common.sections[section]}
            </Text>
            {found.caution !== undefined && <StateSymbol state="caution" size={18} />}
            <StateSymbol state={state} size={18} />
          </Pressable>
        );
      })}
      <View style={[styles.legend, { borderTopColor: colors.hair }]}>
        {LEGEND.map((state) => (
          <StateMark key={state} state={state} />
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  nav: { paddingTop: space.lg, paddingLeft: space.lg },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.xs,
    minHeight: touch.least,
    paddingVertical: space.xs,
    borderTopWidth: 1,
  },
  number: { width: 26 },
  name: { flex: 1, minWidth: 0 },
  legend: { borderTopWidth: 1, paddingTop: space.md, gap: space.xs },
});
