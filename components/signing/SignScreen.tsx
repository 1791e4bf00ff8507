import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { pathOf } from '@/hazard';
import { list, timeText } from '@/shared/format';
import type { WorksheetRecord } from '@/shared/record';
import { useUser } from '../api/session';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useToTop } from '../shell/useToTop';
import { Button, Notice, Screen, StateMark, Text } from '../ui';
import { FindingPanels } from '../worksheet/parts/FindingPanels';
import { Questions } from '../worksheet/parts/Questions';
import { useAssessment } from '../worksheet/useAssessment';
import { WithRecord } from '../worksheet/WithRecord';
import { Exceptions } from './Exceptions';
import { SignBlock } from './SignBlock';
import { SignatureForm } from './SignatureForm';
import { SigningFacts } from './SigningFacts';
import { useHasUnsentDraft } from './useHasUnsentDraft';

export type OwnMeaning = 'prepared' | 'countersigned';

interface Props {
  worksheetId: string;
  meaning: OwnMeaning;
}

/** Crew members with an account who have not signed this revision, the lead aside. */
export function awaitedCrew({ content, leadId, signatures, revision }: WorksheetRecord) {
  const signed = new Set(
    signatures.filter((each) => each.revision === revision).map(({ signer }) => signer.id),
  );
  return (content.crew ?? []).flatMap(({ userId, name }) =>
    userId === undefined || userId === leadId || signed.has(userId)
      ? []
      : [{ id: userId, name: name ?? '' }],
  );
}

function AfterIt({ record, meaning }: { record: WorksheetRecord; meaning: OwnMeaning }) {
  const { after } = useMessages().signing;
  const locale = useLocale();
  const waiting = awaitedCrew(record).map(({ name }) => name);
  const ends = record.content.job?.endsAt;
  const until = ends === undefined ? '' : timeText(ends, record.timeZone);
  const text =
    meaning === 'countersigned'
      ? pathOf(record.content) === 'off'
        ? after.countersignedOff(until)
        : after.countersignedEnergized(until)
      : waiting.length > 0
        ? after.crew(list(locale, waiting))
        : after.supervisor;
  return <Text color="ink2">{text}</Text>;
}

interface SignedProps {
  record: WorksheetRecord;
  meaning: OwnMeaning;
  signedAt: string;
}

/** After signing: where it stands now and whose turn it is. */
function Signed({ record, meaning, signedAt }: SignedProps) {
  const words = useMessages();
  const locale = useLocale();
  const said = words.signing;
  const waiting = record.state === 'briefing' ? awaitedCrew(record) : [];
  const body =
    record.state === 'in-force'
      ? pathOf(record.content) === 'off'
        ? said.signedBody.inForceOff
        : said.signedBody.inForceEnergized
      : waiting.length > 0
        ? said.signedBody.crew(
            list(
              locale,
              waiting.map(({ name }) => name),
            ),
          )
        : said.signedBody.supervisor;
  const at = { worksheetId: record.id };
  return (
    <View role="status" aria-live="polite" style={styles.signed}>
      <StateMark state="complete" word={said.signedTitle(timeText(signedAt, record.timeZone))} />
      <Text variant="answer">{body}</Text>
      {waiting.map(({ id, name }) => (
        <Button
          key={id}
          kind="primary"
          large
          icon="phone"
          label={words.worksheet.handPhoneTo(name)}
          href={{
            pathname: '/worksheets/[worksheetId]/brief/[signerId]',
            params: { ...at, signerId: id },
          }}
        />
      ))}
      {meaning === 'countersigned' && (
        <Button kind="primary" large label={said.backToBoard} href="/board" />
      )}
      <Button
        label={said.backToWorksheet}
        href={{ pathname: '/worksheets/[worksheetId]', params: at }}
      />
    </View>
  );
}

/** What stands against signing now, each with the way on; undefined where nothing does. */
function useBlocked(record: WorksheetRecord, meaning: OwnMeaning) {
  const words = useMessages();
  const user = useUser();
  const unsent = useHasUnsentDraft(user.id, record.id);
  const assessment = useAssessment(record.content, record.timeZone);
  const said = words.signing;
  const left = assessment.findings.filter(({ severity }) => severity !== 'caution');
  const question = record.questions.some(({ answer }) => answer === null);
  const toWorksheet = (
    <Button
      label={said.backToWorksheet}
      href={{ pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } }}
    />
  );
  if (!record.actions.includes(`sign:${meaning}`)) {
    return {
      reason: said.missing.state,
      notice: (
        <Notice title={said.notAwaited.title} action={toWorksheet}>
          {said.notAwaited.body(words.enumerations.state[record.state])}
        </Notice>
      ),
    };
  }
  if (meaning === 'prepared' && unsent) {
    return {
      reason: said.missing.notSent,
      notice: (
        <Notice icon="kept" title={said.unsentTitle} action={toWorksheet}>
          {said.unsentBody}
        </Notice>
      ),
    };
  }
  if (left.length > 0) {
    return {
      reason: said.missing.points(left.length),
      notice: (
        <>
          <Notice title={said.notReadyTitle} action={toWorksheet}>
            {said.notReadyBody}
          </Notice>
          <FindingPanels findings={left} />
        </>
      ),
    };
  }
  if (meaning === 'countersigned' && question) {
    return {
      reason: said.missing.question,
      notice: <Notice icon="question">{said.openQuestion}</Notice>,
    };
  }
  if (!user.hasPin) {
    return {
      reason: said.noPinTitle,
      notice: (
        <Notice title={said.noPinTitle} action={<Button label={said.toAccount} href="/account" />}>
          {said.noPinBody}
        </Notice>
      ),
    };
  }
  return undefined;
}

function Sign({ record, meaning }: { record: WorksheetRecord; meaning: OwnMeaning }) {
  const words = useMessages().signing;
  const user = useUser();
  const [signedAt, setSignedAt] = useState<string>();
  useToTop(signedAt ?? '');
  const blocked = useBlocked(record, meaning);
  const href = {
    pathname: '/worksheets/[worksheetId]',
    params: { worksheetId: record.id },
  } as const;
  return (
    <Screen
      title={words.title[meaning]}
      subtitle={words.asRole[meaning](user.name)}
      back={{ label: words.back, href }}
      width="helper"
    >
      {signedAt !== undefined ? (
        <Signed record={record} meaning={meaning} signedAt={signedAt} />
      ) : (
        <>
          {meaning === 'countersigned' && <Exceptions record={record} />}
          <SignBlock title={words.youSign}>
            <SigningFacts record={record} />
            <Button kind="quiet" icon="document" label={words.everyField} href={href} />
          </SignBlock>
          {meaning === 'prepared' && <Exceptions record={record} />}
          <Questions record={record} />
          <SignBlock title={words.itMeans}>
            <Text variant="value" weight="500">
              {words.meaning[meaning]}
            </Text>
            <AfterIt record={record} meaning={meaning} />
          </SignBlock>
          <SignBlock>
            {blocked?.notice}
            <SignatureForm
              record={record}
              meaning={meaning}
              signer={user}
              blocked={blocked?.reason}
              onSigned={setSignedAt}
            />
            <Text color="ink2">{words.fixed(record.revision)}</Text>
          </SignBlock>
        </>
      )}
    </Screen>
  );
}

/** The lead signs the plan, or the supervisor countersigns it, each in their own session. */
export function SignScreen({ worksheetId, meaning }: Props) {
  const words = useMessages().signing;
  return (
    <WithRecord worksheetId={worksheetId} loading={words.loading}>
      {(record) => <Sign record={record} meaning={meaning} />}
    </WithRecord>
  );
}

const styles = StyleSheet.create({
  signed: { gap: space.md, paddingTop: space.md },
});
