import {
  ADDITIONAL_HAZARDS,
  INFEASIBLE_BECAUSE,
  MODES,
  REASONS,
  TEMPORARY_LIGHT,
  type Mode,
} from '@/hazard';
import { useMessages } from '../../i18n/useMessages';
import { Citation, Text } from '../../ui';
import { FieldChoice, FieldDateTime, FieldSelect, FieldText } from '../form/fields';
import { wordOf } from '../form/fieldWords';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { SectionFacts } from '../parts/SectionFacts';
import { SectionFrame } from '../parts/SectionFrame';

function PermitWords() {
  const { permit: words, worksheet } = useMessages();
  const { permit } = useWorksheetForm().assessment;
  const because: Readonly<Record<string, string>> = words.because;
  const exemptions: Readonly<Record<string, string>> = words.exemption;
  return (
    <>
      <Text variant="answer">
        {permit.required ? worksheet.permitNeeded : worksheet.noPermitNeeded}
      </Text>
      <Text>
        {[because[permit.because], permit.exemption === null ? '' : exemptions[permit.exemption]]
          .filter(Boolean)
          .join(' ')}
      </Text>
      <Citation citation={permit.citation} />
    </>
  );
}

function DecisionSummary() {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const decision = content.decision ?? {};
  return (
    <>
      {decision.mode !== undefined && (
        <Text variant="answer">{words.worksheet.modeSentence[decision.mode]}</Text>
      )}
      {decision.mode === 'energized' && decision.reason !== undefined && (
        <Text variant="answer">{wordOf(words, 'reason', decision.reason)}</Text>
      )}
      <PermitWords />
    </>
  );
}

function Justification() {
  const { content, assessment } = useWorksheetForm();
  const decision = content.decision ?? {};
  const permit = assessment.permit.required;
  return (
    <>
      <FieldSelect name="decision.reason" values={REASONS} group="reason" />
      {decision.reason === 'additional hazard' && (
        <FieldSelect name="decision.hazard" values={ADDITIONAL_HAZARDS} group="hazard" />
      )}
      {decision.hazard === 'illumination' && (
        <FieldChoice
          name="decision.temporaryLight"
          values={TEMPORARY_LIGHT}
          group="temporaryLight"
        />
      )}
      {decision.reason === 'infeasible' && (
        <FieldSelect
          name="decision.infeasibleBecause"
          values={INFEASIBLE_BECAUSE}
          group="infeasibleBecause"
        />
      )}
      <FieldText name="decision.explanation" multiline />
      {decision.reason !== 'below 50 V' && <FieldText name="decision.outageRefusedBy" />}
      {permit && (
        <>
          <FieldText name="decision.permit.number" exact />
          <FieldText name="decision.permit.approvedBy" />
          <FieldDateTime name="decision.permit.validUntil" />
        </>
      )}
    </>
  );
}

/** 4. Off, or the justification that the regulation asks for. */
export function DecisionSection() {
  const words = useMessages();
  const { content } = useWorksheetForm();
  return (
    <SectionFrame
      section="decision"
      folded={<DecisionSummary />}
      readOnly={
        <>
          <SectionFacts section="decision" />
          <PermitWords />
        </>
      }
    >
      <FieldChoice<Mode>
        name="decision.mode"
        values={MODES}
        wordFor={(mode) => words.worksheet.modeChoice[mode]}
        noteFor={(mode) => words.worksheet.modeNote[mode]}
      />
      {content.decision?.mode === 'energized' && <Justification />}
      <PermitWords />
    </SectionFrame>
  );
}
