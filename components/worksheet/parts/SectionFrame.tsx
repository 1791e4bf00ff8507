import { useAtom } from 'jotai';
import { useMemo, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { fieldLabel } from '@/shared/messages';
import { sectionNumber, sectionOf, fieldNameOf, type SectionId } from '@/shared/sections';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Section, StateMark, type MarkState } from '../../ui';
import { ShownFieldsProvider, useShownFields } from '../form/shownFields';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { openSectionsAtom, sectionAnchor } from '../worksheetAtoms';
import { FindingPanels, isUnanswered } from './FindingPanels';
import { SectionFacts } from './SectionFacts';
import { SectionPhotos } from './SectionPhotos';
import { sectionState } from './sectionState';

interface Props {
  section: SectionId;
  /** Set type that stands for the section while it is folded. */
  folded?: ReactNode;
  /** What follows the state's word: "3 of 4 open and held". */
  detail?: string;
  /** A state that does not follow from the findings: signatures and close-out wait. */
  state?: MarkState;
  /** What stands here when the worksheet is no draft of one's own; every answered field if left out. */
  readOnly?: ReactNode;
  children: ReactNode;
}

/** One of the twelve sections: its number, its state from the findings, its fold. */
export function SectionFrame({ section, folded, detail, state, readOnly, children }: Props) {
  const words = useMessages();
  const { assessment, record, editable } = useWorksheetForm();
  const [open, setOpen] = useAtom(openSectionsAtom);
  const key = `${record.id}/${section}`;
  const own = useMemo(
    () => assessment.findings.filter((finding) => sectionOf(finding) === section),
    [assessment, section],
  );
  const shown = sectionState(own, words);
  const isOpen = open[key] ?? false;
  return (
    <Section
      id={sectionAnchor(section)}
      number={sectionNumber(section)}
      title={words.common.sections[section]}
      state={state ?? shown.state}
      detail={detail ?? shown.detail}
      caution={shown.caution}
      open={isOpen}
      onToggle={() => setOpen((before) => ({ ...before, [key]: !isOpen }))}
      folded={folded}
    >
      <ShownFieldsProvider>
        <View style={styles.fields}>
          {editable ? children : (readOnly ?? <SectionFacts section={section} />)}
        </View>
        <HomelessFindings section={section} />
        <SectionPhotos record={record} section={section} />
      </ShownFieldsProvider>
    </Section>
  );
}

/** Findings of the section that no field on the screen shows: none is ever lost. */
function HomelessFindings({ section }: { section: SectionId }) {
  const words = useMessages();
  const locale = useLocale();
  const { assessment } = useWorksheetForm();
  const shown = useShownFields();
  const left = assessment.findings.filter(
    (finding) => sectionOf(finding) === section && !shown.has(fieldNameOf(finding.path)),
  );
  const missing = [
    ...new Set(left.filter(isUnanswered).map(({ path }) => fieldLabel(locale, path) ?? path)),
  ];
  return (
    <>
      {missing.length > 0 && (
        <StateMark state="open" word={words.ui.notAnswered} detail={missing.join(', ')} />
      )}
      <FindingPanels findings={left} />
    </>
  );
}

const styles = StyleSheet.create({ fields: { gap: space.lg } });
