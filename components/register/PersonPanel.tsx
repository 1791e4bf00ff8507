import { StyleSheet, View } from 'react-native';
import { calendarDate, dateText, list } from '@/shared/format';
import type { Site } from '@/shared/register';
import { accountState } from '@/shared/registerState';
import type { Person } from '@/shared/user';
import { useUser } from '../api/session';
import { deviceZone } from '../home/clock';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, describeFault, Facts, Notice, Text, type Fact } from '../ui';
import { useSaveRecord } from './registerMutations';
import { RetireForm } from './RetireForm';
import { UsedOn } from './UsedOn';
import type { RegisterViewControl } from './useRegisterView';

function usePersonFacts(person: Person, sites: readonly Site[]): Fact[] {
  const { register, account } = useMessages();
  const locale = useLocale();
  const words = register.people;
  const names = sites.filter(({ id }) => person.siteIds?.includes(id)).map(({ name }) => name);
  const state = accountState(person);
  const day = (at: string) => dateText(locale, calendarDate(at, deviceZone()));
  return [
    { label: words.email, value: person.email ?? '' },
    { label: words.sites, value: names.length > 0 ? list(locale, names) : register.noSite },
    {
      label: words.qualified,
      value:
        person.qualifiedThrough === null
          ? words.notQualified
          : dateText(locale, person.qualifiedThrough),
    },
    { label: words.language, value: account.languages[person.locale ?? 'en-US'] },
    { label: words.units, value: account.unitOptions[person.units ?? 'feet'] },
    {
      label: words.account,
      value: words.states[state],
      note:
        state === 'invited' && typeof person.invitedAt === 'string'
          ? words.invitedOn(day(person.invitedAt))
          : undefined,
    },
  ];
}

function Buttons({ person, view }: { person: Person; view: RegisterViewControl }) {
  const messages = useMessages();
  const { register } = messages;
  const me = useUser();
  const save = useSaveRecord('people', { id: person.id });
  if (person.retired === true) {
    return (
      <>
        {save.isError && <Text variant="strong">{describeFault(save.error, messages)}</Text>}
        <Button
          label={register.takeBack}
          busy={save.isPending}
          onPress={() => save.mutate({ retired: false })}
        />
      </>
    );
  }
  return (
    <View style={styles.buttons}>
      <Button
        kind="primary"
        icon="pen"
        label={register.edit}
        style={styles.grow}
        onPress={() => view.open({ id: person.id, act: 'edit' })}
      />
      <Button
        label={register.retire}
        style={styles.grow}
        reason={person.id === me.id ? register.people.notSelf : undefined}
        onPress={() => view.open({ id: person.id, act: 'retire' })}
      />
    </View>
  );
}

/** For whoever has not joined yet: the link of an invitation is short-lived. */
function InviteAgain({ person }: { person: Person }) {
  const messages = useMessages();
  const words = messages.register.people;
  const send = useSaveRecord('people', { id: person.id, part: 'invitation' });
  return (
    <View style={styles.invite}>
      {send.isSuccess && (
        <Notice live icon="sent">
          {words.invitedAgain(person.name)}
        </Notice>
      )}
      {send.isError && <Text variant="strong">{describeFault(send.error, messages)}</Text>}
      <Button label={words.inviteAgain} busy={send.isPending} onPress={() => send.mutate({})} />
      <Text variant="label" weight="400" color="ink2">
        {words.inviteNote}
      </Text>
    </View>
  );
}

interface Props {
  person: Person;
  sites: readonly Site[];
  today: string;
  view: RegisterViewControl;
}

/** What the register says of one person. */
export function PersonPanel({ person, sites, today, view }: Props) {
  const { register } = useMessages();
  const locale = useLocale();
  const words = register.people;
  const facts = usePersonFacts(person, sites);
  const through = person.qualifiedThrough;
  if (view.act === 'retire' && person.retired !== true) {
    return (
      <RetireForm
        subject="people"
        recordId={person.id}
        title={words.retireTitle(person.name)}
        body={words.retireBody}
        onDone={() => view.open({ id: person.id })}
        onCancel={() => view.open({ id: person.id })}
      />
    );
  }
  return (
    <>
      {view.done !== undefined && (
        <Notice live icon="sent">
          {view.done === 'added' ? words.invited(person.name) : register.saved}
        </Notice>
      )}
      {through !== null && through < today && person.retired !== true && (
        <Notice icon="clock" title={words.ranOutOn(person.name, dateText(locale, through))}>
          {words.ranOutTodo}
        </Notice>
      )}
      <Buttons person={person} view={view} />
      {person.retired !== true && accountState(person) !== 'signedIn' && (
        <InviteAgain person={person} />
      )}
      <Facts facts={facts} />
      <UsedOn by="person" id={person.id} />
    </>
  );
}

const styles = StyleSheet.create({
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
  invite: { gap: space.xs },
  grow: { flexGrow: 1, flexBasis: 150 },
});
