import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import type { CrewMember } from '@/hazard';
import { pathOf } from '@/hazard';
import { timeText } from '@/shared/format';
import type { WorksheetRecord } from '@/shared/record';
import type { Locale } from '@/shared/user';
import { useUser } from '../api/session';
import { LanguageSwitch } from '../i18n/LanguageSwitch';
import { PreferencesProvider, useLocale, useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useToTop } from '../shell/useToTop';
import { Button, NotFoundScreen, Notice, Screen, StateMark, Text, webProps } from '../ui';
import { placeText, taskText } from '../signing/SigningFacts';
import { Stopped } from '../stop/Stopped';
import { StopReasons } from '../stop/StopReasons';
import { Questions } from '../worksheet/parts/Questions';
import { WithRecord } from '../worksheet/WithRecord';
import { AskForm } from './AskForm';
import { firstName, groundedInReach } from './brief';
import { CloseBlock } from './CloseBlock';
import { DoNots, Dos } from './DoLists';
import { Cautions, Emergency } from './EndBlocks';
import { BAR_COVERS, HelperBar } from './HelperBar';
import { HelperSign } from './HelperSign';
import { HurtBlock } from './HurtBlock';
import { useSeen } from './useSeen';

type Page = 'read' | 'ask' | 'refuse' | 'sign' | 'signed';

/** Once the end was on screen it need not be sought again after a question. */
interface ReadOnce {
  read: boolean;
  onRead: () => void;
}

function Block({ title, children }: { title: string; children: ReactNode }) {
  const { colors } = useTheme();
  return (
    <View style={[styles.block, { borderTopColor: colors.ink }]}>
      <Text variant="section" level={2}>
        {title}
      </Text>
      {children}
    </View>
  );
}

interface Shown {
  record: WorksheetRecord;
  member: CrewMember & { userId: string };
  page: Page;
  onPage: (page: Page) => void;
  asked: boolean;
  headerEnd: ReactNode;
}

function Reading({ record, member, onPage, asked, headerEnd, read, onRead }: Shown & ReadOnce) {
  const words = useMessages();
  const said = words.helper;
  const user = useUser();
  const { ref, seen } = useSeen(BAR_COVERS);
  const name = firstName(member.name ?? '');
  const leave = (page: Page) => {
    if (seen) onRead();
    onPage(page);
  };
  const signature = record.signatures.find(
    (each) => each.revision === record.revision && each.signer.id === member.userId,
  );
  const awaited = record.actions.includes('sign:acknowledged');
  const reason =
    signature !== undefined
      ? said.signed(timeText(signature.signedAt, record.timeZone))
      : !awaited
        ? said.notAwaited
        : seen || read
          ? undefined
          : said.readToEnd;
  const isCeiling = groundedInReach(record.content).includes('ceiling grid');
  return (
    <Screen
      title={(isCeiling ? said.titleCeiling : said.title)(name)}
      subtitle={`${taskText(record, words)} ${placeText(record, words)}. ${said.leads(record.leadName)}`}
      headerEnd={headerEnd}
      width="helper"
      bar={
        <HelperBar
          reason={reason}
          onAsk={() => leave('ask')}
          onRefuse={() => leave('refuse')}
          onUnderstand={() => leave('sign')}
        />
      }
    >
      {asked && (
        <Notice icon="sent" live>
          {said.asked}
        </Notice>
      )}
      <Questions record={record} />
      <Block title={said.canHurt}>
        <HurtBlock record={record} />
      </Block>
      <Block title={said.howClose}>
        <CloseBlock record={record} member={member} />
      </Block>
      <Block title={said.doNot}>
        <DoNots record={record} member={member} />
      </Block>
      <Block title={said.do}>
        <Dos record={record} member={member} />
      </Block>
      <View style={styles.end}>
        <Cautions record={record} />
        <Emergency record={record} />
        <View ref={ref} testID="briefing-end">
          <Text variant="label" color="ink2">
            {said.theEnd}
          </Text>
        </View>
        {user.id !== member.userId && (
          <Button
            label={said.giveBack}
            href={{ pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } }}
          />
        )}
      </View>
    </Screen>
  );
}

function Signed({ record, phoneOf }: { record: WorksheetRecord; phoneOf: string | undefined }) {
  const words = useMessages();
  const said = words.helper;
  const off = pathOf(record.content) === 'off';
  return (
    <View role="status" aria-live="polite" style={styles.signed}>
      <StateMark state="complete" word={said.signedTitle} />
      <Text variant="value">{off ? said.signedBody : said.signedBodyEnergized}</Text>
      <Button
        kind="primary"
        large
        label={
          phoneOf === undefined
            ? words.signing.backToWorksheet
            : said.giveBackSigned(firstName(phoneOf))
        }
        href={{ pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } }}
      />
    </View>
  );
}

/** One of the pages that an answer leads to; the briefing is one press back. */
function Answering(props: Shown & { onAsked: () => void }) {
  const { record, member, page, onPage, headerEnd } = props;
  const words = useMessages();
  const said = words.helper;
  const user = useUser();
  const name = member.name ?? '';
  const own = user.id === member.userId;
  const phoneOf = own ? undefined : user.name;
  const title = {
    ask: said.askTitle,
    refuse: said.refuseTitle,
    sign: said.signTitle(name),
    signed: said.signTitle(name),
  }[page === 'read' ? 'sign' : page];
  return (
    <Screen
      title={title}
      subtitle={own ? (page === 'sign' ? said.signOwn : undefined) : said.signOn(user.name)}
      back={
        page === 'signed' ? undefined : { label: said.readAgain, onPress: () => onPage('read') }
      }
      headerEnd={headerEnd}
      width="helper"
    >
      {page === 'ask' && (
        <AskForm
          record={record}
          askedBy={own ? undefined : name}
          onAsked={props.onAsked}
          onBack={() => onPage('read')}
        />
      )}
      {page === 'refuse' && (
        <View style={styles.refuse}>
          <Text variant="answer">{said.refuseBody}</Text>
          {record.actions.includes('stop') ? (
            <StopReasons
              record={record}
              first="I will not do this"
              written={own ? undefined : (reason) => said.refusedFor(name, reason)}
            />
          ) : (
            <Notice icon="refuse" title={words.stop.notHereTitle}>
              {words.stop.notHereBody(words.enumerations.state[record.state])}
            </Notice>
          )}
        </View>
      )}
      {page === 'sign' && (
        <HelperSign
          record={record}
          member={member}
          signer={{ id: member.userId, name }}
          phoneOf={phoneOf}
          hasNoPin={own && !user.hasPin}
          onAsk={() => onPage('ask')}
          onRefuse={() => onPage('refuse')}
          onSigned={() => onPage('signed')}
        />
      )}
      {page === 'signed' && <Signed record={record} phoneOf={phoneOf} />}
    </Screen>
  );
}

function Helper({ record, signerId }: { record: WorksheetRecord; signerId: string }) {
  const locale = useLocale();
  const units = useUnits();
  const [chosen, setChosen] = useState<Locale>(locale);
  const [page, setPage] = useState<Page>('read');
  const [asked, setAsked] = useState(false);
  const [read, setRead] = useState(false);
  useToTop(`${record.state === 'stopped'} ${page}`);
  const member = record.content.crew?.find(({ userId }) => userId === signerId);
  if (member === undefined) return <NotFoundScreen />;
  const shown: Shown = {
    record,
    member: { ...member, userId: signerId },
    page,
    onPage: setPage,
    asked,
    headerEnd: <LanguageSwitch value={chosen} onChange={setChosen} />,
  };
  return (
    <PreferencesProvider locale={chosen} units={units}>
      <View {...webProps({ lang: chosen })} style={styles.whole}>
        {record.state === 'stopped' ? (
          <StoppedPage shown={shown} />
        ) : page === 'read' ? (
          <Reading {...shown} read={read} onRead={() => setRead(true)} />
        ) : (
          <Answering
            {...shown}
            onAsked={() => {
              setAsked(true);
              setPage('read');
            }}
          />
        )}
      </View>
    </PreferencesProvider>
  );
}

function StoppedPage({ shown }: { shown: Shown }) {
  const words = useMessages().stop;
  return (
    <Screen title={words.stoppedTitle} hideTitle headerEnd={shown.headerEnd} width="helper">
      <View style={styles.signed}>
        <Stopped record={shown.record} />
      </View>
    </Screen>
  );
}

interface Props {
  worksheetId: string;
  /** The account of the person who is briefed. */
  signerId: string;
}

/**
 * The helper's page, on their own phone or on another's that was handed over:
 * read in one minute, then one of three answers. The language is the reader's,
 * whoever is signed in.
 */
export function HelperScreen({ worksheetId, signerId }: Props) {
  const words = useMessages().helper;
  return (
    <WithRecord worksheetId={worksheetId} loading={words.loading}>
      {(record) => <Helper record={record} signerId={signerId} />}
    </WithRecord>
  );
}

const styles = StyleSheet.create({
  whole: { flexGrow: 1 },
  block: {
    borderTopWidth: rule.strong,
    paddingTop: space.sm,
    paddingBottom: space.lg,
    gap: space.xs,
  },
  end: { gap: space.md, paddingBottom: space.md },
  signed: { gap: space.md, paddingTop: space.md },
  refuse: { gap: space.md },
});
