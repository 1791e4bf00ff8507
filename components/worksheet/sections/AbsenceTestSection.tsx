import { INSTRUMENTS, METER_CATEGORIES, pathOf } from '@/hazard';
import { dateTimeText, volts } from '@/shared/format';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { Button, StateMark, Text } from '../../ui';
import { FieldCrew } from '../form/crewFields';
import { FieldCheck } from '../form/FieldCheck';
import { FieldChoice, FieldNumber } from '../form/fields';
import { wordOf } from '../form/fieldWords';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { SectionFacts } from '../parts/SectionFacts';
import { SectionFrame } from '../parts/SectionFrame';

/** The proofs recorded so far, and the way to the next; only once the worksheet is in force. */
function Proofs() {
  const words = useMessages();
  const locale = useLocale();
  const { record, content } = useWorksheetForm();
  if (pathOf(content) !== 'off') return <Text>{words.worksheet.noProofEnergized}</Text>;
  if (record.state === 'draft' || record.state === 'briefing' || record.state === 'countersign') {
    return <Text>{words.worksheet.proofComes}</Text>;
  }
  return (
    <>
      {record.state === 'in-force' && <StateMark state={record.proved ? 'proved' : 'not-proved'} />}
      {record.proofs.map((proof) => (
        <Text key={proof.id} variant="answer">
          {words.worksheet.proofLine(
            dateTimeText(locale, proof.at, record.timeZone),
            proof.proof.readings?.length ?? 0,
            proof.assessment.verdict === 'ready',
          )}
        </Text>
      ))}
      {record.actions.includes('prove') && (
        <Button
          kind="primary"
          large
          icon="meter"
          label={words.worksheet.proveDead}
          href={{ pathname: '/worksheets/[worksheetId]/proof', params: { worksheetId: record.id } }}
        />
      )}
    </>
  );
}

function AbsenceTestSummary() {
  const words = useMessages();
  const locale = useLocale();
  const { content } = useWorksheetForm();
  const test = content.absenceTest ?? {};
  const parts = [
    test.instrument && wordOf(words, 'instrument', test.instrument),
    test.category && wordOf(words, 'category', test.category),
    test.ratedVolts === undefined ? undefined : volts(locale, test.ratedVolts),
  ];
  const tester = content.crew?.find(({ id }) => id !== undefined && id === test.byCrewId)?.name;
  return (
    <>
      <Text variant="answer">{parts.filter(Boolean).join(', ')}</Text>
      {tester !== undefined && <Text variant="answer">{words.worksheet.testedBy(tester)}</Text>}
      <Proofs />
    </>
  );
}

/** 5. With what, and by whom, it will be proved dead; the readings come once it is in force. */
export function AbsenceTestSection() {
  return (
    <SectionFrame
      section="absenceTest"
      folded={<AbsenceTestSummary />}
      readOnly={
        <>
          <SectionFacts section="absenceTest" />
          <Proofs />
        </>
      }
    >
      <FieldChoice name="absenceTest.instrument" values={INSTRUMENTS} group="instrument" />
      <FieldChoice name="absenceTest.category" values={METER_CATEGORIES} group="category" />
      <FieldNumber name="absenceTest.ratedVolts" unit="V" />
      <FieldCrew name="absenceTest.byCrewId" />
      <FieldCheck name="absenceTest.leadsInspected" />
      <Proofs />
    </SectionFrame>
  );
}
