import { StyleSheet, View } from 'react-native';
import { pathOf } from '@/hazard';
import type { WorksheetRecord } from '@/shared/record';
import { useUser } from '../api/session';
import { useMessages } from '../i18n/useMessages';
import { StopReasons } from '../stop/StopReasons';
import { space } from '../theme/tokens';
import { Button, Notice, Screen, StateMark, Text } from '../ui';
import { AskForm } from './AskForm';
import { firstName } from './brief';
import type { HelperPageProps } from './helperPage';
import { HelperSign } from './HelperSign';

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
export function HelperAnswering(props: HelperPageProps & { onAsked: () => void }) {
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

const styles = StyleSheet.create({
  signed: { gap: space.md, paddingTop: space.md },
  refuse: { gap: space.md },
});
