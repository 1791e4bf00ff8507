import { useAtom } from 'jotai';
import type { ReactNode } from 'react';
import { StyleSheet, View, type ViewStyle } from 'react-native';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Screen } from '../ui';
import { wordOf } from './form/fieldWords';
import { useWorksheetForm } from './form/WorksheetFormContext';
import { DistanceStrip } from './DistanceStrip';
import { OpenPoints } from './parts/OpenPoints';
import { RecordTitle } from './parts/RecordTitle';
import { SectionNav } from './parts/SectionNav';
import { WorksheetBar, WorksheetVerdict } from './parts/WorksheetBar';
import { SectionDrawing } from './SectionDrawing';
import { AbsenceTestSection } from './sections/AbsenceTestSection';
import { ArcFlashSection } from './sections/ArcFlashSection';
import { BoundariesSection, BoundaryList } from './sections/BoundariesSection';
import { CloseOutSection } from './sections/CloseOutSection';
import { CrewSection } from './sections/CrewSection';
import { DecisionSection } from './sections/DecisionSection';
import { JobSection } from './sections/JobSection';
import { ProtectiveEquipmentSection } from './sections/ProtectiveEquipmentSection';
import { SignaturesSection } from './sections/SignaturesSection';
import { SourcesSection } from './sections/SourcesSection';
import { SupplySection } from './sections/SupplySection';
import { SurroundingsSection } from './sections/SurroundingsSection';
import { drawingOpenAtom } from './worksheetAtoms';

interface Props {
  saved?: ReactNode;
  /** Notices between the title block and the first section. */
  beforeSections?: ReactNode;
}

/** React Native's types do not know `sticky`; elsewhere than on the web the strip scrolls along. */
const web = (style: Record<string, string | number>): ViewStyle => style;

/** The strip stays in view; pressed, it unfolds into the drawing below it. */
function Strip() {
  const { content, assessment } = useWorksheetForm();
  const [open, setOpen] = useAtom(drawingOpenAtom);
  const { margin } = useBreakpoint();
  const { colors } = useTheme();
  return (
    <View style={[styles.strip, { backgroundColor: colors.paper, marginHorizontal: -margin }]}>
      <DistanceStrip
        content={content}
        assessment={assessment}
        open={open}
        onPress={() => setOpen(!open)}
        controls="strip-drawing"
      />
      {open && (
        <View
          style={[
            styles.unfolded,
            {
              borderBottomColor: colors.ink,
              paddingHorizontal: margin,
              backgroundColor: colors.paper,
            },
          ]}
        >
          <SectionDrawing id="strip-drawing" content={content} assessment={assessment} />
        </View>
      )}
    </View>
  );
}

/** Beside the form on a wide screen: the verdict, the drawing, what is open. */
function Aside() {
  const { content, assessment } = useWorksheetForm();
  return (
    <View>
      <WorksheetVerdict />
      <View style={styles.aside}>
        <SectionDrawing content={content} assessment={assessment} />
        <BoundaryList />
        <OpenPoints />
      </View>
    </View>
  );
}

/** The single screen: title, strip, twelve sections, verdict. */
export function WorksheetLayout({ saved, beforeSections }: Props) {
  const words = useMessages();
  const { content, record } = useWorksheetForm();
  const { isWide, hasSectionList } = useBreakpoint();
  const task = content.job?.task;
  const title = task === undefined ? words.worksheet.newTitle : wordOf(words, 'task', task);
  const place = [content.job?.area, record.siteName].filter(Boolean).join(', ');
  return (
    <Screen
      title={title}
      subtitle={place === '' ? undefined : place}
      back={{ label: words.common.worksheets, href: '/' }}
      saved={saved}
      head={<RecordTitle />}
      bar={isWide ? undefined : <WorksheetBar />}
      nav={hasSectionList ? <SectionNav /> : undefined}
      aside={isWide ? <Aside /> : undefined}
    >
      {!isWide && <Strip />}
      {beforeSections !== undefined && <View style={styles.before}>{beforeSections}</View>}
      <View style={styles.sections}>
        <JobSection />
        <SupplySection />
        <SourcesSection />
        <DecisionSection />
        <AbsenceTestSection />
        <BoundariesSection />
        <ArcFlashSection />
        <ProtectiveEquipmentSection />
        <SurroundingsSection />
        <CrewSection />
        <SignaturesSection />
        <CloseOutSection />
      </View>
    </Screen>
  );
}

const styles = StyleSheet.create({
  strip: web({ position: 'sticky', top: 0, zIndex: 2 }),
  unfolded: web({
    borderBottomWidth: rule.strong,
    paddingBottom: space.sm,
    // Between the strip and the bar at the foot.
    maxHeight: 'calc(100vh - 244px)',
    overflowY: 'auto',
  }),
  aside: { padding: space.lg, gap: space.lg },
  before: { gap: space.md, paddingVertical: space.md },
  sections: { paddingTop: space.md },
});
