import { StyleSheet, View } from 'react-native';
import { dateTimeText } from '@/shared/format';
import type { Meaning, Signature } from '@/shared/record';
import { useUser } from '../../api/session';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { useBreakpoint } from '../../theme/useBreakpoint';
import { useTheme } from '../../theme/useTheme';
import { Button, StateMark, Text, type ButtonProps } from '../../ui';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { FoldedOpenPoints } from '../parts/OpenPoints';
import { SectionFrame } from '../parts/SectionFrame';

interface Line {
  key: string;
  name: string;
  meaning: Meaning;
  signature: Signature | undefined;
  action?: Pick<ButtonProps, 'label' | 'href' | 'icon' | 'kind'>;
}

function useLines(): Line[] {
  const words = useMessages();
  const user = useUser();
  const { record } = useWorksheetForm();
  const current = record.signatures.filter(({ revision }) => revision === record.revision);
  const of = (meaning: Meaning, signerId?: string) =>
    current.find(
      (each) => each.meaning === meaning && (signerId === undefined || each.signer.id === signerId),
    );
  const mayAcknowledge = record.actions.includes('sign:acknowledged');
  const lead: Line = {
    key: 'prepared',
    name: record.leadName,
    meaning: 'prepared',
    signature: of('prepared'),
  };
  const crew = (record.content.crew ?? [])
    .filter(({ userId }) => userId !== undefined && userId !== record.leadId)
    .map((member): Line => {
      const signature = of('acknowledged', member.userId);
      const own = member.userId === user.id;
      return {
        key: member.userId ?? '',
        name: member.name ?? words.worksheet.namelessMember,
        meaning: 'acknowledged',
        signature,
        action:
          mayAcknowledge && signature === undefined
            ? {
                label: own
                  ? words.worksheet.readAndSign
                  : words.worksheet.handPhoneTo(member.name ?? ''),
                icon: own ? 'pen' : 'phone',
                kind: 'primary',
                href: {
                  pathname: '/worksheets/[worksheetId]/brief/[signerId]',
                  params: { worksheetId: record.id, signerId: member.userId ?? '' },
                },
              }
            : undefined,
      };
    });
  const countersigned = of('countersigned');
  const supervisor: Line = {
    key: 'countersigned',
    name: countersigned?.signer.name ?? words.worksheet.aSupervisor,
    meaning: 'countersigned',
    signature: countersigned,
    action: record.actions.includes('sign:countersigned')
      ? {
          label: words.worksheet.countersign,
          icon: 'pen',
          kind: 'primary',
          href: {
            pathname: '/worksheets/[worksheetId]/sign/[meaning]',
            params: { worksheetId: record.id, meaning: 'countersigned' },
          },
        }
      : undefined,
  };
  return [lead, ...crew, supervisor];
}

function SignatureLine({ line }: { line: Line }) {
  const words = useMessages();
  const locale = useLocale();
  const { colors } = useTheme();
  const { record } = useWorksheetForm();
  const { name, meaning, signature, action } = line;
  return (
    <View role="listitem" style={[styles.line, { borderTopColor: colors.hair }]}>
      <View style={styles.words}>
        <Text variant="value">{name}</Text>
        <Text variant="label" color="ink2">
          {words.enumerations.meaning[meaning]}
        </Text>
        {signature === undefined ? (
          <StateMark state="waits" word={words.worksheet.notSigned} />
        ) : (
          <StateMark
            state="complete"
            word={words.worksheet.signedAt(
              dateTimeText(locale, signature.signedAt, record.timeZone),
            )}
            detail={
              signature.enteredById === signature.signer.id
                ? undefined
                : words.worksheet.enteredBy(signature.enteredByName ?? '')
            }
          />
        )}
      </View>
      {action !== undefined && <Button large {...action} />}
    </View>
  );
}

/** The lead signs once nothing is open and nothing stopped; until then the button says what is missing. */
function PrepareButton() {
  const words = useMessages().worksheet;
  const { record, assessment, faults } = useWorksheetForm();
  if (record.state !== 'draft' || !record.actions.includes('save')) return null;
  const left = assessment.findings.filter(({ severity }) => severity !== 'caution').length;
  const reason =
    faults.length > 0
      ? words.fieldsToMend(faults.length)
      : left > 0
        ? words.pointsLeft(left)
        : undefined;
  return (
    <Button
      kind="primary"
      large
      icon="pen"
      label={words.signPlan}
      reason={reason}
      href={{
        pathname: '/worksheets/[worksheetId]/sign/[meaning]',
        params: { worksheetId: record.id, meaning: 'prepared' },
      }}
    />
  );
}

/** 11. Lead, each of the crew, supervisor. */
export function SignaturesSection() {
  const words = useMessages().worksheet;
  const { assessment, editable } = useWorksheetForm();
  const { isWide } = useBreakpoint();
  const lines = useLines();
  const signed = lines.filter(({ signature }) => signature !== undefined).length;
  const left = assessment.findings.filter(({ severity }) => severity !== 'caution').length;
  const all = signed === lines.length;
  // A wide screen has them beside the form.
  const points = editable && !isWide && <FoldedOpenPoints />;
  const list = (
    <View role="list">
      {lines.map((line) => (
        <SignatureLine key={line.key} line={line} />
      ))}
    </View>
  );
  return (
    <SectionFrame
      section="signatures"
      state={all ? 'complete' : 'waits'}
      detail={
        all
          ? undefined
          : left > 0 && signed === 0
            ? words.waitsForPoints(left)
            : words.signedOf(signed, lines.length)
      }
      folded={
        <>
          {list}
          {points}
          <PrepareButton />
        </>
      }
      readOnly={list}
    >
      {list}
      {points}
      <PrepareButton />
    </SectionFrame>
  );
}

const styles = StyleSheet.create({
  line: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: space.sm,
    alignItems: 'center',
    paddingVertical: space.sm,
    borderTopWidth: 1,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 200, gap: 2 },
});
